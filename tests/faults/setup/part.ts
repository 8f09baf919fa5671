import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';
import type { TestDatabase } from '#tests/setup/clone-database.ts';
import { startBlobProxy, type BlobProxy } from './blob-proxy.ts';
import { startDatabaseProxy, type DatabaseProxy } from './database-proxy.ts';

const ROOT = fileURLToPath(new URL('../../../', import.meta.url));
const ENDING = new URL('../../../scripts/lib/end-with-parent.mjs', import.meta.url).href;

export type PartSettings = {
  readonly run: 'web' | 'worker';
  readonly database: TestDatabase;
  readonly port: number;
  readonly smtpPort: number;
  readonly dataDir: string;
};

/** One process of the product, as it is deployed, with its stores at the far end of proxies of its own. */
export type Part = {
  readonly database: DatabaseProxy;
  readonly blobs: BlobProxy;
  /** What it wrote of itself; shown when a test fails. */
  said(): string;
  /** SIGKILL: nothing of it runs any more. */
  kill(): Promise<void>;
  stop(): Promise<void>;
};

export async function startPart(settings: PartSettings): Promise<Part> {
  const { run, database: stores } = settings;
  const database = await startDatabaseProxy(Number(new URL(stores.appUrl).port));
  const blobs = await startBlobProxy(Number(/:(\d+)\//.exec(stores.storage)?.[1]));
  const child = spawn(process.execPath, ['--import', ENDING, '--import', 'tsx', 'server/index.ts'], {
    cwd: ROOT,
    env: {
      PATH: process.env['PATH'],
      TZ: 'UTC',
      RUN: run,
      PORT: String(settings.port),
      PUBLIC_URL: `http://127.0.0.1:${settings.port}`,
      DATABASE_URL: stores.ownerUrl,
      DATABASE_APP_URL: database.through(stores.appUrl),
      AZURE_STORAGE_CONNECTION_STRING: blobs.through(stores.storage),
      SMTP_URL: `smtp://127.0.0.1:${settings.smtpPort}`,
      SESSION_SECRET: 'for tests alone, and long enough to be taken',
      DATA_DIR: settings.dataDir,
      LOG_LEVEL: 'fatal',
      CHECK_REPLIES: 'true',
    },
    stdio: ['pipe', 'pipe', 'pipe'],
  });
  let said = '';
  for (const stream of [child.stdout, child.stderr])
    stream?.on('data', (chunk: Buffer) => (said = (said + chunk.toString('utf8')).slice(-20_000)));
  await ready(child, () => said);
  const end = async (signal: NodeJS.Signals): Promise<void> => {
    if (child.exitCode === null && child.signalCode === null) {
      const gone = once(child, 'exit');
      child.kill(signal);
      await gone;
    }
    await Promise.all([database.close(), blobs.close()]);
  };
  return { database, blobs, said: () => said, kill: () => end('SIGKILL'), stop: () => end('SIGTERM') };
}

/** Until it says that it listens, or works. */
function ready(child: ChildProcess, said: () => string): Promise<void> {
  return new Promise((resolve, reject) => {
    child.once('exit', (code) => reject(new Error(`A process ended at its start, with ${code}: ${said()}`)));
    child.stdout?.on('data', () => {
      if (/Upstand (?:listens|works)/.test(said())) resolve();
    });
  });
}
