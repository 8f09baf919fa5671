type Account = { uid: number; gid: number };
export function clusterAccount(): Account | null;
export function clusterFolder(dir: string, account: Account | null): string;
export function canEnter(dir: string, account: Account): boolean;
export function mayPass(stat: { uid: number; gid: number; mode: number }, account: Account): boolean;
export function makeFolder(dir: string, account: Account | null): void;
