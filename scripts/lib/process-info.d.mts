export function isAlive(pid: number): boolean;
export function beganAt(pid: number): string | null;
export function afterName(stat: string): string[];
export function workingFolder(pid: number): string | null;
