import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { createInterface } from 'node:readline';
import { fileURLToPath } from 'node:url';
import type { EntityManager } from '@mikro-orm/postgresql';
import pg from 'pg';
import { startAzurite } from '#scripts/lib/azurite.mjs';
import { freePort } from '#scripts/lib/free-port.mjs';
import { startPostgres } from '#scripts/lib/postgres.mjs';
import { serverFlags } from '#scripts/lib/server-flags.mjs';
import { tempFolder } from '#scripts/lib/temp-folder.mjs';
import { createOrm } from '#server/db/orm.ts';
import { migrate } from '#server/db/migrate.ts';
import { createOrganisation, createPerson } from '#tests/factories/people.ts';
import { drainJobs } from '#tests/setup/drain-jobs.ts';
import type { Stage } from '#tests/setup/api-harness.ts';
import { openClient, type Client } from './client.ts';

const ROOT = fileURLToPath(new URL('../../../', import.meta.url));

export type Bench = {
  /** A migrated database of the bench's own, as its owner. */
  readonly database: pg.Pool;
  readonly ownerUrl: string;
  readonly appUrl: string;
  readonly storage: string;
  em(): EntityManager;
  owner: Stage['owner'];
  person: Stage['person'];
  /** The whole server in a process of its own, once. */
  startServer(options?: {
    readonly settings?: Readonly<Record<string, string>>;
    readonly imports?: readonly string[];
  }): Promise<BenchServer>;
  stop(): Promise<void>;
};
export type BenchServer = {
  readonly url: string;
  readonly pid: number;
  signIn(email: string): Promise<Client>;
  drain(): Promise<void>;
};

/** PostgreSQL and a blob store of the bench's own on loopback, gone when it stops. */
export async function startBench(): Promise<Bench> {
  const stops: (() => unknown)[] = [];
  const stop = async (): Promise<void> => {
    for (const each of stops.splice(0).toReversed()) await each();
  };
  for (const signal of ['SIGINT', 'SIGTERM'] as const)
    process.once(signal, () => void stop().finally(() => process.exit(1)));
  try {
    const folder = tempFolder('upstand-bench-');
    stops.push(() => rmSync(folder, { recursive: true, force: true }));
    const cluster = await startPostgres({ dir: path.join(folder, 'pg'), durable: false });
    stops.push(() => cluster.stop());
    const blobs = await startAzurite({ dir: path.join(folder, 'blobs') });
    stops.push(() => blobs.stop());
    await migrate(cluster.url);
    const database = new pg.Pool({ connectionString: cluster.url, max: 2 });
    stops.push(() => database.end());
    const orm = await createOrm(cluster.appUrl);
    stops.push(() => orm.close(true));
    const em = () => orm.em.fork();
    let owner: ReturnType<Stage['owner']> | null = null;
    const bench: Bench = {
      database,
      ownerUrl: cluster.url,
      appUrl: cluster.appUrl,
      storage: blobs.connectionString,
      em,
      owner: () => (owner ??= createOrganisation(em(), { kind: 'owner' })),
      person: async (role, { orgId } = {}) => {
        const home = () =>
          role === 'contractor' ? createOrganisation(em(), { kind: 'contractor' }) : bench.owner();
        return createPerson(em(), { role, orgId: orgId ?? (await home()).id });
      },
      startServer: async ({ settings = {}, imports = [] } = {}) => {
        const server = await startServer(bench, { settings, imports });
        stops.push(server.stop);
        return { ...server, drain: () => drainJobs(database) };
      },
      stop,
    };
    return bench;
  } catch (error) {
    await stop();
    throw error;
  }
}

async function startServer(
  bench: Bench,
  options: { settings: Readonly<Record<string, string>>; imports: readonly string[] },
): Promise<Omit<BenchServer, 'drain'> & { stop: () => Promise<void> }> {
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const dataDir = mkdtempSync(path.join(tmpdir(), 'upstand-bench-data-'));
  const ending = new URL('../../lib/end-with-parent.mjs', import.meta.url).href;
  const imports = [ending, 'tsx', ...options.imports].flatMap((each) => ['--import', each]);
  const child = spawn(process.execPath, [...serverFlags, ...imports, 'server/index.ts'], {
    cwd: ROOT,
    env: {
      PATH: process.env['PATH'],
      TZ: 'UTC',
      PORT: String(port),
      PUBLIC_URL: url,
      DATABASE_URL: bench.ownerUrl,
      DATABASE_APP_URL: bench.appUrl,
      AZURE_STORAGE_CONNECTION_STRING: bench.storage,
      SMTP_URL: `smtp://127.0.0.1:${await freePort()}`,
      CAPTURE_MAIL: 'true',
      SESSION_SECRET: 'for measurements alone, and long enough to be taken',
      DATA_DIR: dataDir,
      LOG_LEVEL: 'error',
      ...options.settings,
    },
    stdio: ['pipe', 'pipe', 'inherit'],
  });
  const stop = async (): Promise<void> => {
    await end(child);
    rmSync(dataDir, { recursive: true, force: true });
  };
  try {
    await listening(child);
  } catch (error) {
    await stop();
    throw error;
  }
  return { url, pid: child.pid ?? 0, signIn: (email) => openClient(url, email), stop };
}

function listening(child: ChildProcess): Promise<void> {
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code) => reject(new Error(`The server ended before it listened, with ${code}.`)));
    if (!child.stdout) throw new Error('The server has no output.');
    createInterface(child.stdout).on('line', (line) => {
      if (line.startsWith('Upstand listens')) resolve();
      else console.log(line);
    });
  });
}

function end(child: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) return resolve();
    child.once('exit', () => resolve());
    child.kill('SIGTERM');
    return undefined;
  });
}
