export function findPostgres(): string | null;
export function newestFirst(names: readonly string[]): string[];
export function ensurePostgres(say?: (note: string) => void): Promise<string>;
