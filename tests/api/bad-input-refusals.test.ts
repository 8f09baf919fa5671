import { afterAll, beforeAll, expect, it } from 'vitest';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness?.close());

const query = async <T>(sql: string, values: unknown[] = []): Promise<T[]> =>
  (await harness.services.pool.query(sql, values)).rows as T[];

it('one caller fills the table of refusals with a hundred rows an hour; the rest is counted', async () => {
  const person = await harness.person('auditor');
  const agent = await harness.signIn(person);
  const other = await harness.person('clerk');
  await query(
    `insert into refusal_counts (key, window_start, n) values ($1, date_trunc('hour', now()), 98)`,
    [`account:${person.id}`],
  );
  const statuses = new Set<number>();
  for (let n = 0; n < 5; n++)
    statuses.add((await agent.post('/api/organisations').send({ name: 'No' })).status);
  expect([...statuses]).toEqual([403]);
  expect(await query('select detail from refusals where user_id = $1 order by id', [person.id])).toEqual([
    { detail: null },
    { detail: 'Further refusals of this caller in this hour are counted, not kept.' },
  ]);
  expect(await query('select n from refusal_counts where key = $1', [`account:${person.id}`])).toEqual([
    { n: 103 },
  ]);
  const clerk = await harness.signIn(other);
  expect((await clerk.post('/api/organisations').send({ name: 'No' })).status).toBe(403);
  expect(await query('select code from refusals where user_id = $1', [other.id])).toEqual([
    { code: 'forbidden' },
  ]);
});
