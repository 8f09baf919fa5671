export function portOwner(port: number): string | null;
export function listeningInode(table: string, port: number): string | null;
