export function ensureClientBuild(root: string): Promise<boolean>;
export function hashOf(root: string, entries: readonly string[]): string;
