import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';
import { ROLES } from '#shared/permissions/ability.ts';

let harness: Harness;
beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness?.close());

describe('home', () => {
  it.each(ROLES)('is empty for a new %s when nothing waits', async (role) => {
    const reply = await (await harness.signIn(role)).get('/api/home');
    expect([reply.status, reply.body]).toEqual([200, { items: [], recent: [] }]);
  });

  it('counts what waits, one and many in their own words', async () => {
    const admin = await harness.signIn('administrator');
    const { id: organisationId } = await harness.owner();
    const titles: string[] = [];
    for (const email of ['one@people.example', 'two@people.example']) {
      await admin.post('/api/people').send({ email, name: email, role: 'clerk', organisationId });
      const [item] = (await admin.get('/api/home')).body.items as {
        count: number;
        title: string;
        to: string;
      }[];
      titles.push(`${item?.count} ${item?.title} ${item?.to}`);
    }
    expect(titles).toEqual(['1 Invitation not taken up /people', '2 Invitations not taken up /people']);
  });

  it('shows a contractor their own work orders and nobody else’s', async () => {
    const mine = await harness.person('contractor');
    const other = await harness.person('contractor');
    for (const { orgId } of [mine, mine, other]) {
      await harness.services.pool.query(
        `insert into work_orders (number, title, contractor_id, zone, batch_prefix)
         select 'W-' || n, 'Order', $1, 'America/Chicago', 'B' || n from (select count(*) as n from work_orders) c`,
        [orgId],
      );
    }
    const counts = [];
    for (const actor of [mine, other]) {
      const { body } = await (await harness.signIn(actor)).get('/api/home');
      counts.push((body.items as { key: string; count: number }[]).map(({ key, count }) => [key, count]));
    }
    expect(counts).toEqual([[['work-orders', 2]], [['work-orders', 1]]]);
  });
});
