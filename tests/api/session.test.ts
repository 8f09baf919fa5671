import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';
import { createPerson, PASSWORD } from '#tests/factories/people.ts';

let harness: Harness;
beforeAll(async () => {
  harness = await createHarness({ settings: { DEMO: '1', DEMO_PASSWORD: PASSWORD } });
});
afterAll(() => harness?.close());

const signIn = (email: string, password: string) =>
  supertest(harness.app).post('/api/session').send({ email, password });

async function query<T>(sql: string, values: unknown[] = []): Promise<T[]> {
  return (await harness.services.pool.query(sql, values)).rows as T[];
}

describe('signing in', () => {
  it('answers with the person, their rights and a CSRF token, and a cookie that script cannot read', async () => {
    const inspector = await harness.person('inspector');
    const reply = await signIn(inspector.email, PASSWORD);
    expect(reply.status).toBe(200);
    expect(reply.body.user).toEqual({
      id: inspector.id,
      email: inspector.email,
      name: inspector.name,
      role: 'inspector',
      organisation: { id: inspector.orgId, name: inspector.orgName, kind: 'owner' },
    });
    expect(reply.body.abilities).toContainEqual(['review', 'Batch,Record,Finding,Concession']);
    expect(reply.body.csrfToken).toMatch(/^[\w-]{43}$/);
    expect(reply.headers['set-cookie']?.[0]).toMatch(/^upstand=.*; Path=\/; HttpOnly; SameSite=Lax$/);
    expect(reply.headers['cache-control']).toBe('no-store');
  });

  it('takes the address in any case', async () => {
    const clerk = await harness.person('clerk');
    expect((await signIn(clerk.email.toUpperCase(), PASSWORD)).status).toBe(200);
  });

  it('says the same for a wrong password, an unknown address and a closed account, and keeps each refusal', async () => {
    const { id: orgId } = await harness.owner();
    const open = await harness.person('clerk');
    const closed = await createPerson(harness.em(), { role: 'clerk', orgId, active: false });
    const replies = [
      await signIn(open.email, 'not the password'),
      await signIn('nobody@people.example', PASSWORD),
      await signIn(closed.email, PASSWORD),
    ];
    for (const reply of replies) {
      expect(reply.status).toBe(401);
      expect(reply.body).toEqual(replies[0]?.body);
      expect(reply.body.code).toBe('sign-in.wrong');
      expect(reply.headers['set-cookie']).toBeUndefined();
    }
    const kept = await query<{ email: string; code: string }>(
      `select email, code from refusals where email = any($1) order by id`,
      [[open.email, 'nobody@people.example', closed.email]],
    );
    expect(kept).toEqual([
      { email: open.email, code: 'sign-in.wrong' },
      { email: 'nobody@people.example', code: 'sign-in.wrong' },
      { email: closed.email, code: 'sign-in.wrong' },
    ]);
  });

  it('leaves a trail entry', async () => {
    const engineer = await harness.person('engineer');
    await harness.signIn(engineer);
    expect(await query('select action, actor_id from trail where subject_id = $1', [engineer.id])).toEqual([
      { action: 'session.signed-in', actor_id: engineer.id },
    ]);
  });

  it('gives a new session: one planted before is worth nothing after', async () => {
    const auditor = await harness.person('auditor');
    const first = await signIn(auditor.email, PASSWORD);
    const cookie = String(first.headers['set-cookie']?.[0]).split(';')[0] ?? '';
    const second = await supertest(harness.app)
      .post('/api/session')
      .set('Cookie', cookie)
      .send({ email: auditor.email, password: PASSWORD });
    expect(String(second.headers['set-cookie']?.[0]).split(';')[0]).not.toBe(cookie);
    expect((await supertest(harness.app).get('/api/session').set('Cookie', cookie)).status).toBe(401);
  });

  it('names what is missing', async () => {
    const reply = await supertest(harness.app).post('/api/session').send({ email: 'a@b.example' });
    expect(reply.status).toBe(400);
    expect(reply.body.errors).toEqual([
      { pointer: '/password', code: 'required', detail: 'This is missing.' },
    ]);
  });
});

describe('throttling', () => {
  it('stops an account after eight wrong passwords, even for the right one, and says how long', async () => {
    const person = await harness.person('clerk');
    for (let attempt = 1; attempt <= 8; attempt += 1) {
      expect((await signIn(person.email, `wrong ${attempt}`)).status).toBe(401);
    }
    const stopped = await signIn(person.email, PASSWORD);
    expect(stopped.status).toBe(429);
    expect(stopped.body.code).toBe('sign-in.throttled');
    expect(Number(stopped.headers['retry-after'])).toBeGreaterThan(0);
    expect(Number(stopped.headers['retry-after'])).toBeLessThanOrEqual(900);

    // Counted in the database: another account is free, and the count ends with its window.
    expect((await signIn((await harness.person('clerk')).email, PASSWORD)).status).toBe(200);
    await query('delete from throttles where key = $1', [`account:${person.email}`]);
    expect((await signIn(person.email, PASSWORD)).status).toBe(200);
  });

  it('stops an address that tries many accounts', async () => {
    await query(`update throttles set n = 60 where key like 'address:%'`);
    const reply = await signIn('someone@people.example', 'whatever');
    expect(reply.status).toBe(429);
    await query(`delete from throttles`);
  });

  it('counts only wrong ones against an address', async () => {
    await query(`delete from throttles`);
    await harness.signIn('clerk');
    await harness.signIn('clerk');
    expect(await query(`select n from throttles where key like 'address:%'`)).toEqual([{ n: 0 }]);
  });
});

describe('a session', () => {
  it('is told by GET, and by 401 with its own code when there is none', async () => {
    const agent = await harness.signIn('auditor');
    const told = await agent.get('/api/session');
    expect(told.status).toBe(200);
    expect(told.body.user.role).toBe('auditor');
    const none = await supertest(harness.app).get('/api/session');
    expect(none.status).toBe(401);
    expect(none.body.code).toBe('session.none');
  });

  it('ends on sign-out, for good', async () => {
    const agent = await harness.signIn('auditor');
    expect((await agent.delete('/api/session')).status).toBe(204);
    expect((await agent.get('/api/session')).status).toBe(401);
  });

  it('ends when it was idle too long', async () => {
    const person = await harness.person('auditor');
    const agent = await harness.signIn(person);
    await query(
      `update sessions set expire = now() - interval '1 second' where sess #>> '{passport,user}' = $1`,
      [person.id],
    );
    expect((await agent.get('/api/session')).body.code).toBe('session.none');
  });

  it('has thirty minutes more after each request', async () => {
    const person = await harness.person('auditor');
    const agent = await harness.signIn(person);
    const ofPerson = `from sessions where sess #>> '{passport,user}' = $1`;
    await query(
      `update sessions set expire = now() + interval '1 minute' where sess #>> '{passport,user}' = $1`,
      [person.id],
    );
    await agent.get('/api/session');
    expect(
      await query(`select expire > now() + interval '29 minutes' as later ${ofPerson}`, [person.id]),
    ).toEqual([{ later: true }]);
  });

  it('ends at its twelfth hour, however busy', async () => {
    const person = await harness.person('auditor');
    const agent = await harness.signIn(person);
    await query(
      `update sessions set sess = jsonb_set(sess::jsonb, '{signedInAt}', to_jsonb($2::bigint))::json
       where sess #>> '{passport,user}' = $1`,
      [person.id, Date.now() - 12 * 3_600_000],
    );
    expect((await agent.get('/api/session')).status).toBe(401);
    expect(await query(`select 1 from sessions where sess #>> '{passport,user}' = $1`, [person.id])).toEqual(
      [],
    );
  });

  it('is worth nothing once the account is closed', async () => {
    const person = await harness.person('auditor');
    const agent = await harness.signIn(person);
    await query('update users set active = false where id = $1', [person.id]);
    expect((await agent.get('/api/session')).status).toBe(401);
  });

  it('is not made for a visitor who does not sign in', async () => {
    const before = await query('select count(*) from sessions');
    const reply = await supertest(harness.app).get('/api/app');
    expect(reply.headers['set-cookie']).toBeUndefined();
    expect(await query('select count(*) from sessions')).toEqual(before);
  });
});

describe('what the sign-in page is told', () => {
  it('has the owner, the demo’s password, and whether somebody is signed in', async () => {
    const { name } = await harness.owner();
    const visitor = await supertest(harness.app).get('/api/app');
    expect(visitor.body).toEqual({
      owner: name,
      demo: { password: PASSWORD, accounts: [] },
      signedIn: false,
    });
    const agent = await harness.signIn('clerk');
    expect((await agent.get('/api/app')).body.signedIn).toBe(true);
  });
});
