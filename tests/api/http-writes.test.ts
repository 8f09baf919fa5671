import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness?.close());

async function query<T>(sql: string, values: unknown[] = []): Promise<T[]> {
  return (await harness.services.pool.query(sql, values)).rows as T[];
}

describe('Idempotency-Key', () => {
  it('gives the first answer again and makes one thing', async () => {
    const agent = await harness.signIn('administrator');
    const post = () =>
      agent.post('/api/organisations').set('Idempotency-Key', 'once').send({ name: 'Made once' });
    const first = await post();
    const again = await post();
    expect([first.status, again.status]).toEqual([201, 201]);
    expect(again.body).toEqual(first.body);
    expect(again.headers.etag).toBe(first.headers.etag);
    expect(first.headers['idempotency-replayed']).toBeUndefined();
    expect(again.headers['idempotency-replayed']).toBe('true');
  });

  it('makes one thing of ten sent at once', async () => {
    const agent = await harness.signIn('administrator');
    const replies = await Promise.all(
      Array.from({ length: 10 }, () =>
        agent.post('/api/organisations').set('Idempotency-Key', 'ten-at-once').send({ name: 'Made of ten' }),
      ),
    );
    expect(new Set(replies.map(({ status }) => status))).toEqual(new Set([201]));
    expect(new Set(replies.map(({ body }) => body.id)).size).toBe(1);
    expect(await query(`select count(*) as n from organisations where name = 'Made of ten'`)).toEqual([
      { n: 1 },
    ]);
    expect(await query(`select count(*) as n from trail where subject_label = 'Made of ten'`)).toEqual([
      { n: 1 },
    ]);
  });

  it('refuses another request under the same key', async () => {
    const agent = await harness.signIn('administrator');
    await agent.post('/api/organisations').set('Idempotency-Key', 'k').send({ name: 'First of k' });
    const reply = await agent
      .post('/api/organisations')
      .set('Idempotency-Key', 'k')
      .send({ name: 'Second of k' });
    expect([reply.status, reply.body.code]).toEqual([422, 'idempotency.reused']);
  });

  it('belongs to one person', async () => {
    const names = ['One of two', 'Two of two'];
    for (const name of names) {
      const agent = await harness.signIn('administrator');
      expect(
        (await agent.post('/api/organisations').set('Idempotency-Key', 'shared').send({ name })).status,
      ).toBe(201);
    }
  });

  it('does not keep a refusal: the same key may be tried again', async () => {
    const agent = await harness.signIn('administrator');
    await agent.post('/api/organisations').send({ name: 'Taken' });
    const refused = await agent
      .post('/api/organisations')
      .set('Idempotency-Key', 'later')
      .send({ name: 'Taken' });
    expect(refused.status).toBe(409);
    await query(`update organisations set name = 'Given free' where name = 'Taken'`);
    const made = await agent
      .post('/api/organisations')
      .set('Idempotency-Key', 'later')
      .send({ name: 'Taken' });
    expect(made.status).toBe(201);
  });

  it('must be one that can be kept', async () => {
    const agent = await harness.signIn('administrator');
    const reply = await agent
      .post('/api/organisations')
      .set('Idempotency-Key', 'x'.repeat(201))
      .send({ name: 'Long key' });
    expect([reply.status, reply.body.code]).toEqual([400, 'idempotency.unreadable']);
  });
});

describe('If-Match', () => {
  it('is needed, must be a version, and must be the newest', async () => {
    const agent = await harness.signIn('administrator');
    const person = await harness.person('clerk');
    const patch = (version: string | null) => {
      const request = agent.patch(`/api/people/${person.id}`);
      return (version === null ? request : request.set('If-Match', version)).send({
        name: `After ${version}`,
      });
    };
    const missing = await patch(null);
    expect([missing.status, missing.body.code]).toEqual([428, 'version.required']);
    const unreadable = await patch('"three"');
    expect([unreadable.status, unreadable.body.code]).toEqual([400, 'version.unreadable']);

    const changed = await patch('"1"');
    expect([changed.status, changed.headers.etag, changed.body.version]).toEqual([200, '"2"', 2]);
    const stale = await patch('"1"');
    expect([stale.status, stale.body.code]).toEqual([412, 'version.stale']);
    expect(stale.body.current).toMatchObject({ id: person.id, name: 'After "1"', version: 2 });
    expect((await patch('2')).status).toBe(200);
  });
});
