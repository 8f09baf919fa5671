import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { createInterface } from 'node:readline';
import { fileURLToPath } from 'node:url';
import pg from 'pg';
import supertest from 'supertest';
import { ensureClientBuild } from '#scripts/lib/client-build.mjs';
import { freePort } from '#scripts/lib/free-port.mjs';
import { createOrm } from '#server/db/orm.ts';
import { createOrganisation, createPerson, PASSWORD } from '#tests/factories/people.ts';
import type { Agent, Stage } from '#tests/setup/api-harness.ts';
import { cloneDatabase } from '#tests/setup/clone-database.ts';
import { drainJobs } from '#tests/setup/drain-jobs.ts';

const ROOT = fileURLToPath(new URL('../../../', import.meta.url));

export type Server = Stage & {
  /** Without a slash at its end. */
  readonly url: string;
  stop(): Promise<void>;
};

/** The built client and the real server with its worker, in a process of its own, on a database of the test's own. */
export async function startServer(
  options: { settings?: Readonly<Record<string, string>> } = {},
): Promise<Server> {
  await ensureClientBuild(ROOT);
  const database = await cloneDatabase();
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const dataDir = mkdtempSync(path.join(tmpdir(), 'upstand-e2e-'));
  // Its standard input is ours: it ends with this process, however that ends.
  const ending = new URL('../../../scripts/lib/end-with-parent.mjs', import.meta.url).href;
  const child = spawn(process.execPath, ['--import', ending, '--import', 'tsx', 'server/index.ts'], {
    cwd: ROOT,
    env: {
      PATH: process.env['PATH'],
      TZ: 'UTC',
      PORT: String(port),
      PUBLIC_URL: url,
      DATABASE_URL: database.ownerUrl,
      DATABASE_APP_URL: database.appUrl,
      AZURE_STORAGE_CONNECTION_STRING: database.storage,
      SMTP_URL: `smtp://127.0.0.1:${await freePort()}`,
      CAPTURE_MAIL: 'true',
      SESSION_SECRET: 'for tests alone, and long enough to be taken',
      DATA_DIR: dataDir,
      LOG_LEVEL: 'error',
      CHECK_REPLIES: 'true',
      ...options.settings,
    },
    stdio: ['pipe', 'pipe', 'inherit'],
  });
  const orm = await createOrm(database.appUrl);
  const pool = new pg.Pool({ connectionString: database.appUrl });
  const em: Stage['em'] = () => orm.em.fork();
  let owner: ReturnType<Stage['owner']> | null = null;
  const server: Server = {
    url,
    em,
    owner: () => (owner ??= createOrganisation(em(), { kind: 'owner', name: 'Harrow Creek Electric' })),
    person: async (role, { orgId } = {}) => {
      const makeHome = () =>
        role === 'contractor' ? createOrganisation(em(), { kind: 'contractor' }) : server.owner();
      return createPerson(em(), { role, orgId: orgId ?? (await makeHome()).id });
    },
    signIn: async (who) => {
      const { email } = typeof who === 'string' ? await server.person(who) : who;
      const agent = supertest.agent(url);
      const reply = await agent.post('/api/session').send({ email, password: PASSWORD });
      if (reply.status !== 200) throw new Error(`${email} could not sign in: ${reply.text}`);
      return agent.set('X-CSRF-Token', reply.body.csrfToken) as Agent;
    },
    drain: () => drainJobs(pool),
    stop: async () => {
      await end(child);
      await pool.end();
      await orm.close(true);
      await database.drop();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
  try {
    await listening(child);
  } catch (error) {
    await server.stop();
    throw error;
  }
  return server;
}

/** Until it says that it listens; what else it says is passed on. */
function listening(child: ChildProcess): Promise<void> {
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code) => reject(new Error(`The server ended before it listened, with ${code}.`)));
    if (!child.stdout) throw new Error('The server has no output.');
    createInterface(child.stdout).on('line', (line) => {
      if (line.startsWith('Upstand listens')) resolve();
      else process.stderr.write(`${line}\n`);
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
