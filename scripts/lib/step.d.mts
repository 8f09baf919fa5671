export function step<T>(title: string, work: (say: (note: string) => void) => Promise<T>): Promise<T>;
export function formatSeconds(seconds: number): string;
