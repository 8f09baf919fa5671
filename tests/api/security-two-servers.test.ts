import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createApp } from '#server/app.ts';
import { createServices, type Services } from '#server/container.ts';
import { PASSWORD } from '#tests/factories/people.ts';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';

/** Two servers on one database: what one of them counts or ends, the other knows. */

let first: Harness;
let services: Services;
let second: ReturnType<typeof createApp>;
beforeAll(async () => {
  first = await createHarness();
  services = await createServices(first.services.config);
  second = createApp(services);
});
afterAll(async () => {
  second?.stop();
  await services?.close();
  await first?.close();
});

const signIn = (at: 'first' | 'second', email: string, password: string) =>
  supertest(at === 'first' ? first.app : second.app)
    .post('/api/session')
    .send({ email, password });

describe('wrong passwords', () => {
  it('are counted together: four at each are the eight that an account may have', async () => {
    const { email } = await first.person('clerk');
    for (let turn = 1; turn <= 4; turn += 1) {
      expect((await signIn('first', email, `wrong ${turn}`)).status).toBe(401);
      expect((await signIn('second', email, `wrong again ${turn}`)).status).toBe(401);
    }
    for (const at of ['first', 'second'] as const) {
      const stopped = await signIn(at, email, PASSWORD);
      expect([stopped.status, stopped.body.code]).toEqual([429, 'sign-in.throttled']);
    }
    await first.services.pool.query('delete from throttles');
  });

  it('at once are counted before they are tried: no more than eight of twenty', async () => {
    const { email } = await first.person('clerk');
    const tries = Array.from({ length: 20 }, (_, n) =>
      signIn(n % 2 ? 'first' : 'second', email, `wrong ${n}`),
    );
    const statuses = (await Promise.all(tries)).map(({ status }) => status);
    expect(statuses.filter((status) => status === 401)).toHaveLength(8);
    expect(statuses.filter((status) => status === 429)).toHaveLength(12);
    await first.services.pool.query('delete from throttles');
  });

  it('are not told apart by an address that the caller claims', async () => {
    const { email } = await first.person('clerk');
    await signIn('first', email, 'wrong').set('X-Forwarded-For', '203.0.113.9');
    const { rows } = await first.services.pool.query<{ key: string }>(
      `select key from throttles where key like 'address:%'`,
    );
    expect(rows.map(({ key }) => key).join()).not.toContain('203.0.113.9');
    await first.services.pool.query('delete from throttles');
  });
});

describe('a session', () => {
  it('of one server is one of the other, and ended there it is ended here', async () => {
    const { email } = await first.person('clerk');
    const signed = await signIn('first', email, PASSWORD);
    const cookie = String(signed.headers['set-cookie']?.[0]).split(';')[0] ?? '';
    const at = supertest(second.app);
    expect((await at.get('/api/session').set('Cookie', cookie)).status).toBe(200);
    const csrf = (signed.body as { csrfToken: string }).csrfToken;
    const ended = await at.delete('/api/session').set('Cookie', cookie).set('X-CSRF-Token', csrf);
    expect(ended.status).toBe(204);
    expect((await supertest(first.app).get('/api/session').set('Cookie', cookie)).status).toBe(401);
  });
});
