import type { EntityManager } from '@mikro-orm/postgresql';
import type { Express } from 'express';
import supertest from 'supertest';
import { createApp } from '#server/app.ts';
import { createServices, type Services } from '#server/container.ts';
import { startCapture } from '#server/mail/capture-server.ts';
import { startWorker } from '#server/worker.ts';
import type { Actor, Role } from '#shared/permissions/ability.ts';
import { createOrganisation, createPerson, PASSWORD } from '#tests/factories/people.ts';
import { cloneDatabase, type TestDatabase } from './clone-database.ts';
import { drainJobs } from './drain-jobs.ts';
import { testConfig } from './test-config.ts';

export type Agent = ReturnType<typeof supertest.agent>;

export type Harness = {
  readonly app: Express;
  readonly services: Services;
  readonly database: TestDatabase;
  /** A fresh entity manager on the application's role. */
  em(): EntityManager;
  /** The organisation whose people the roles but `contractor` are. */
  owner(): Promise<{ id: string; name: string }>;
  /** A new person of the role; contractors in an organisation of their own unless `orgId` says which. */
  person(role: Role, options?: { orgId?: string }): Promise<Actor>;
  /** Signed in, with the CSRF token on every request; a role means a new person of it. */
  signIn(who: Role | Actor): Promise<Agent>;
  /** Works on every job that is due until none is left. */
  drain(): Promise<void>;
  close(): Promise<void>;
};

/** What factories need: a harness, or a server in a process of its own. */
export type Stage = Pick<Harness, 'em' | 'owner' | 'person' | 'signIn' | 'drain'>;

/** The whole server on a database of its own, without a port. Jobs rest until `drain`. */
export async function createHarness(
  options: { settings?: Readonly<Record<string, string>> } = {},
): Promise<Harness> {
  const database = await cloneDatabase();
  const { config, done } = await testConfig(database, options.settings);
  const services = await createServices(config);
  const web = createApp(services);
  const capture = await startCapture(services);
  const em = () => services.orm.em.fork();
  let owner: Promise<{ id: string; name: string }> | null = null;
  const harness: Harness = {
    app: web.app,
    services,
    database,
    em,
    owner: () => (owner ??= createOrganisation(em(), { kind: 'owner' })),
    person: async (role, { orgId } = {}) => {
      const home =
        orgId ??
        (role === 'contractor'
          ? await createOrganisation(em(), { kind: 'contractor' })
          : await harness.owner()
        ).id;
      return createPerson(em(), { role, orgId: home });
    },
    signIn: async (who) => {
      const actor = typeof who === 'string' ? await harness.person(who) : who;
      const agent = supertest.agent(web.app);
      const reply = await agent.post('/api/session').send({ email: actor.email, password: PASSWORD });
      if (reply.status !== 200)
        throw new Error(`${actor.email} could not sign in: ${reply.status} ${reply.text}`);
      const { csrfToken } = reply.body as { csrfToken: string };
      return agent.set('X-CSRF-Token', csrfToken) as Agent;
    },
    drain: async () => {
      const worker = await startWorker(services);
      try {
        await drainJobs(services.pool);
      } finally {
        await worker.stop();
      }
    },
    close: async () => {
      await capture?.close();
      web.stop();
      await services.close();
      await database.drop();
      done();
    },
  };
  return harness;
}
