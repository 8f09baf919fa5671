export function takeDataFolder(dir: string, about?: { url?: string }): () => void;
export function lockHolder(dir: string): { pid: number; url?: string } | null;
