export function tempFolder(prefix: string): string;
