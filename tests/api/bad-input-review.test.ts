import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Actor } from '#shared/permissions/ability.ts';
import { handIn, uploadLines, type HandedIn } from '#tests/factories/hand-in.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { startBatch } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

type Finding = { id: string; recordId: string; version: number };

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let holder: Agent;
let holderPerson: Actor;
let colleague: Agent;
let batch: HandedIn;
let finding: Finding;
const planned = Array.from({ length: 12 }, (_, n) => `L-${n}`);
let next = 0;

beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned });
  contractor = await harness.signIn(site.contractor);
  holderPerson = await harness.person('inspector');
  holder = await harness.signIn(holderPerson);
  colleague = await harness.signIn('inspector');
});
afterAll(() => harness?.close());
/** One line whose embedment is 0.5 ft short of the 6.0 ft due, handed in and taken. */
beforeEach(async () => {
  const set = [setRow(planned[next++] ?? '', { embedmentFt: 5.5 })];
  batch = await handIn(harness, { site, agent: contractor, set });
  const taken = await holder.post(`/api/batches/${batch.id}/take`);
  if (taken.status !== 200) throw new Error(`The batch was not taken: ${taken.text}`);
  const { body } = await holder.get(`/api/batches/${batch.id}/findings?code=embedment-short`);
  finding = body.items[0];
}, 60_000);

const EVIDENCE = { decision: 'approve', grounds: 'evidence', reason: 'The photograph reads 6 ft.' };
const REJECT = { decision: 'reject', action: 'rework', dueOn: '2099-05-11', reason: 'Half a foot short.' };
const decide = (agent: Agent, body: object, version = 0) =>
  agent.put(`/api/findings/${finding.id}/decision`).set('If-Match', `"${version}"`).send(body);
const now = async () =>
  (await holder.get(`/api/batches/${batch.id}/findings?code=embedment-short`)).body.items[0];
const trailOf = async (action: string): Promise<number> =>
  (
    await harness.services.pool.query(`select 1 from trail where action = $1 and subject_id = any($2)`, [
      action,
      [batch.id, finding.id],
    ])
  ).rowCount ?? 0;

describe('a batch that another inspector holds', () => {
  it('lets a colleague decide, undo, ask, approve, return, close and release nothing, and says who stands in the way', async () => {
    const record = `/api/records/${finding.recordId}/decision`;
    const tries = [
      await decide(colleague, EVIDENCE),
      await colleague.delete(`/api/findings/${finding.id}/decision`).set('If-Match', '"0"'),
      await colleague.post(`/api/findings/${finding.id}/concession`).send({ reason: 'Rock.' }),
      await colleague.put(record).set('If-Match', '"0"').send({ decision: 'return', reason: 'No.' }),
      await colleague.post(`/api/batches/${batch.id}/approve-clean`),
      await colleague.post(`/api/batches/${batch.id}/close-review`),
      await colleague.post(`/api/batches/${batch.id}/release`),
      await colleague.post(`/api/batches/${batch.id}/take`),
    ];
    expect(tries.map(({ status, body }) => [status, body.code])).toEqual(
      tries.map(() => [409, 'revision.taken']),
    );
    for (const { body } of tries) expect(body.detail).toMatch(/inspector/iu);
    expect(await now()).toMatchObject({ state: 'undecided', version: 0 });
    expect((await holder.get(`/api/batches/${batch.id}`)).body).toMatchObject({
      status: 'in-review',
      revision: { inspector: { id: holderPerson.id } },
    });
  });
});

describe('a decision on what somebody else changed', () => {
  it('is answered with the newer state, whole, and taken once it is made from that', async () => {
    expect((await decide(holder, REJECT)).body).toMatchObject({ state: 'rejected', version: 1 });
    const late = await decide(holder, EVIDENCE);
    expect([late.status, late.body.code]).toEqual([412, 'version.stale']);
    expect(late.body.current).toEqual(await now());
    expect(late.body.current.decision).toMatchObject({ reason: 'Half a foot short.', by: holderPerson.name });
    expect((await decide(holder, EVIDENCE, 1)).body).toMatchObject({ state: 'approved', version: 2 });
  });

  it('of three at once keeps one, and tells the two others', async () => {
    const replies = await Promise.all([
      decide(holder, EVIDENCE),
      decide(holder, REJECT),
      decide(holder, EVIDENCE),
    ]);
    expect(replies.map(({ status }) => status).toSorted((one, other) => one - other)).toEqual([
      200, 412, 412,
    ]);
    const kept = replies.find(({ status }) => status === 200)?.body;
    for (const { body } of replies.filter(({ status }) => status === 412))
      expect(body.current).toMatchObject({ state: kept.state, version: 1 });
    expect(await now()).toMatchObject({ state: kept.state, version: 1 });
  });
});

describe('a concession', () => {
  it('is granted by no inspector, clerk or contractor, and stays asked', async () => {
    const made = await holder
      .post(`/api/findings/${finding.id}/concession`)
      .send({ reason: 'Rock at 5.5 ft.' });
    for (const agent of [holder, colleague, await harness.signIn('clerk'), contractor]) {
      const reply = await agent
        .put(`/api/concessions/${made.body.id}/decision`)
        .set('If-Match', '"1"')
        .send({ decision: 'grant', reason: 'Fine.' });
      expect([reply.status, reply.body.code]).toEqual([403, 'forbidden']);
    }
    expect((await holder.get(`/api/concessions/${made.body.id}`)).body).toMatchObject({
      state: 'asked',
      version: 1,
    });
    expect(await now()).toMatchObject({ state: 'concession-asked' });
  });
});

describe('a double click', () => {
  it('on take, on close and on a concession does it once', async () => {
    const set = [setRow(planned[next++] ?? '')];
    const other = await handIn(harness, { site, agent: contractor, set });
    const takes = await Promise.all([1, 2].map(() => colleague.post(`/api/batches/${other.id}/take`)));
    expect(takes.map(({ status }) => status)).toContain(200);
    const { rows } = await harness.services.pool.query(
      `select 1 from trail where subject_id = $1 and action = 'batch.taken'`,
      [other.id],
    );
    expect(rows).toHaveLength(1);

    const asks = await Promise.all(
      [1, 2].map(() =>
        holder
          .post(`/api/findings/${finding.id}/concession`)
          .set('Idempotency-Key', 'ask')
          .send({ reason: 'Rock.' }),
      ),
    );
    expect(asks.map(({ status, body }) => [status, body.id])).toEqual([
      [201, asks[0]?.body.id],
      [201, asks[0]?.body.id],
    ]);
    const closes = await Promise.all([1, 2].map(() => holder.post(`/api/batches/${batch.id}/close-review`)));
    expect(closes.map(({ status }) => status).toSorted((one, two) => one - two)).toEqual([200, 409]);
    expect(await trailOf('review.closed')).toBe(1);
  });

  it('on submit hands in once, with one message to each', async () => {
    const draft = await startBatch(contractor, site);
    const set = [setRow(planned[next++] ?? '')];
    await uploadLines(harness, { site, agent: contractor, set, batchId: draft.id });
    const clicks = await Promise.all([1, 2].map(() => contractor.post(`${draft.path}/submit`)));
    expect(clicks.map(({ status }) => status).toSorted((one, other) => one - other)).toEqual([200, 409]);
    expect(clicks.find(({ status }) => status === 409)?.body).toMatchObject({ code: 'revision.frozen' });
    const { rows } = await harness.services.pool.query(
      `select recipient, count(*)::int as n from outbox where template = 'batch-received' and data::text like $1
       group by recipient having count(*) > 1`,
      [`%${draft.number}%`],
    );
    expect(rows).toEqual([]);
  });
});

describe('a session that ends in the middle of a decision', () => {
  it('changes nothing, and the same decision is taken after signing in again', async () => {
    const ended = await harness.signIn(holderPerson);
    await harness.services.pool.query(`delete from sessions where sess #>> '{passport,user}' = $1`, [
      holderPerson.id,
    ]);
    const refused = await decide(ended, REJECT);
    expect([refused.status, refused.body.code]).toEqual([401, 'session.none']);
    expect(refused.body.detail).toMatch(/Sign in and try again/u);
    holder = await harness.signIn(holderPerson);
    expect(await now()).toMatchObject({ state: 'undecided', version: 0 });
    expect((await decide(holder, REJECT)).body).toMatchObject({ state: 'rejected', version: 1 });
  });
});
