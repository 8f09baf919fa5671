export type BlobServer = {
  connectionString: string;
  port: number;
  pid: number | undefined;
  ended: Promise<void>;
  failure: () => Error | null;
  stop: () => Promise<void>;
};
export function startAzurite(options: {
  dir: string;
  /** A free port of the system's choice when left out. */
  port?: number;
  accountKey?: string;
  logFile?: string;
}): Promise<BlobServer>;
export function newAccountKey(): string;
