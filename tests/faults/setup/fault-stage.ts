import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import pg from 'pg';
import supertest from 'supertest';
import { freePort } from '#scripts/lib/free-port.mjs';
import { createOrm } from '#server/db/orm.ts';
import { createBlobStore, type BlobStore } from '#server/storage/blob-store.ts';
import { createOrganisation, createPerson, PASSWORD } from '#tests/factories/people.ts';
import type { Agent, Stage } from '#tests/setup/api-harness.ts';
import { cloneDatabase } from '#tests/setup/clone-database.ts';
import { startMailServer, type MailServer } from './mail-server.ts';
import { startPart, type Part } from './part.ts';

export type FaultStage = Stage & {
  readonly mail: MailServer;
  /** Without a proxy between. */
  readonly blobs: BlobStore;
  /** The one web process; agents stay signed in when it is started again. */
  web(): Part;
  startWeb(): Promise<Part>;
  /** The newest worker. */
  worker(): Part;
  /** One more worker beside those that run. */
  startWorker(): Promise<Part>;
  /** What every process wrote of itself. */
  said(): string;
  /** Until no job waits, rests before a repeat or is worked on, and what was parked is told. */
  rest(): Promise<void>;
  close(): Promise<void>;
};

const POLL_MS = 100;

/** Database, blob store, mail server, and no process of the product yet. */
export async function createFaultStage(): Promise<FaultStage> {
  const database = await cloneDatabase();
  const mail = await startMailServer();
  const port = await freePort();
  const dataDir = mkdtempSync(path.join(tmpdir(), 'upstand-faults-data-'));
  const orm = await createOrm(database.appUrl);
  const pool = new pg.Pool({ connectionString: database.appUrl });
  pool.on('error', () => undefined);
  const blobs = await createBlobStore(database.storage);
  const parts: Part[] = [];
  const start = async (run: 'web' | 'worker'): Promise<Part> => {
    const part = await startPart({ run, database, port, smtpPort: mail.port, dataDir });
    parts.push(part);
    return part;
  };
  let web: Part | null = null;
  let worker: Part | null = null;
  let owner: ReturnType<Stage['owner']> | null = null;
  const em: Stage['em'] = () => orm.em.fork();
  const stage: FaultStage = {
    mail,
    blobs,
    em,
    owner: () => (owner ??= createOrganisation(em(), { kind: 'owner' })),
    person: async (role, { orgId } = {}) => {
      const makeHome = () =>
        role === 'contractor' ? createOrganisation(em(), { kind: 'contractor' }) : stage.owner();
      return createPerson(em(), { role, orgId: orgId ?? (await makeHome()).id });
    },
    signIn: async (who) => {
      const { email } = typeof who === 'string' ? await stage.person(who) : who;
      const agent = supertest.agent(`http://127.0.0.1:${port}`);
      const reply = await agent.post('/api/session').send({ email, password: PASSWORD });
      if (reply.status !== 200) throw new Error(`${email} could not sign in: ${reply.text}`);
      return agent.set('X-CSRF-Token', reply.body.csrfToken) as Agent;
    },
    web: () => {
      if (!web) throw new Error('No web process was started.');
      return web;
    },
    startWeb: async () => (web = await start('web')),
    worker: () => {
      if (!worker) throw new Error('No worker was started.');
      return worker;
    },
    startWorker: async () => (worker = await start('worker')),
    said: () => parts.map((part) => part.said()).join('\n'),
    rest: () => untilAtRest(pool),
    drain: () => untilAtRest(pool),
    close: async () => {
      await Promise.all(parts.map((part) => part.stop()));
      await mail.down();
      await pool.end();
      await orm.close(true);
      await database.drop();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
  return stage;
}

/** A test's own limit ends a wait that is in vain. */
async function untilAtRest(pool: pg.Pool): Promise<void> {
  for (;;) {
    const { rows } = await pool.query<{ open: number }>(
      `select count(*)::int as open from pgboss.job where singleton_key is distinct from 'every'
         and (state <= 'active' or (state = 'failed' and coalesce(output -> 'settled', 'false') <> 'true'))`,
    );
    if (rows[0]?.open === 0) return;
    await new Promise((resolve) => setTimeout(resolve, POLL_MS));
  }
}
