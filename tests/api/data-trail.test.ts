import { createHash } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { row, rows } from '#server/db/rows.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import { verifyTrail } from '#server/trail/verify-trail.ts';
import { createDataHarness, type DataHarness } from '#tests/setup/data-harness.ts';

let data: DataHarness;
beforeAll(async () => {
  data = await createDataHarness();
});
afterAll(() => data.close());

const actor = { id: '0b9d2f5c-6f3e-4a55-9d7b-2f8f8a3f1c10', name: 'R. Ødegård', role: 'inspector' } as const;

function tell(action: string, payload: Record<string, unknown> = {}) {
  return data.orm.em.fork().transactional((tx) =>
    appendTrail(tx, {
      actor,
      action,
      subject: { type: 'batch', id: '17-06', label: 'Batch 17-06' },
      payload,
    }),
  );
}

/** Behind the application's back: guards off, change, guards on. */
async function tamper(...statements: string[]): Promise<void> {
  await data.owner.query('alter table trail disable trigger append_only');
  for (const statement of statements) await data.owner.query(statement);
  await data.owner.query('alter table trail enable always trigger append_only');
}

describe('the trail', () => {
  beforeEach(async () => {
    await tamper('delete from trail', `update trail_head set seq = 0, hash = repeat('0', 64)`);
    for (const n of [1, 2, 3, 4, 5]) await tell(`batch.step-${n}`, { n });
  });

  it('holds as written', async () => {
    expect(await verifyTrail(data.orm.em.fork())).toMatchObject({
      intact: true,
      entries: 5,
      headSeq: 5,
      faults: [],
    });
  });

  it('chains by the canonical text that its documentation gives', async () => {
    const entry = await row<Record<string, string | null>>(
      data.orm.em.fork(),
      `select prev, seq::text, (extract(epoch from at) * 1000000)::bigint::text as at, actor_id::text, actor_name, actor_role,
         action, subject_type, subject_id, subject_label, payload_text, hash from trail where seq = 2`,
    );
    const { hash, ...fields } = entry ?? {};
    // Worked here by Node's own SHA-256 over length-prefixed fields, apart from the database's function.
    const text = Object.values(fields)
      .map((value) => (value === null ? '-\n' : `${Buffer.byteLength(value)}:${value}\n`))
      .join('');
    expect(hash).toBe(createHash('sha256').update(text).digest('hex'));
  });

  it('finds a changed row', async () => {
    await tamper(`update trail set payload_text = '{"n":33}' where seq = 3`);
    expect((await verifyTrail(data.orm.em.fork())).faults).toEqual([{ seq: 3, fault: 'changed' }]);
  });

  it('finds a row whose hash was made to fit its change', async () => {
    await tamper(
      `update trail set payload_text = '{"n":33}' where seq = 3`,
      `update trail t set hash = trail_hash(t) where seq = 3`,
    );
    expect((await verifyTrail(data.orm.em.fork())).faults).toEqual([{ seq: 4, fault: 'link-broken' }]);
  });

  it('finds a removed row', async () => {
    await tamper('delete from trail where seq = 2');
    expect((await verifyTrail(data.orm.em.fork())).faults).toEqual([{ seq: 3, fault: 'missing-before' }]);
  });

  it('finds the first and the last row removed', async () => {
    await tamper('delete from trail where seq in (1, 5)');
    expect((await verifyTrail(data.orm.em.fork())).faults).toEqual([
      { seq: 2, fault: 'missing-before' },
      { seq: 5, fault: 'end-differs' },
    ]);
  });

  it('finds an inserted row, also one that has the hash of its content', async () => {
    await tamper(
      'update trail set seq = -seq where seq > 3',
      `insert into trail select 4, at, actor_id, actor_name, actor_role, 'batch.invented', subject_type, subject_id, subject_label, payload_text, hash, repeat('f', 64) from trail where seq = 3`,
      `update trail t set hash = trail_hash(t) where seq = 4`,
      'update trail set seq = 1 - seq where seq < 0',
    );
    const { intact, faults } = await verifyTrail(data.orm.em.fork());
    expect(intact).toBe(false);
    expect(faults[0]).toEqual({ seq: 5, fault: 'changed' });
  });

  it('finds two rows that changed places', async () => {
    await tamper(
      'update trail set seq = -1 where seq = 2',
      'update trail set seq = 2 where seq = 3',
      'update trail set seq = 3 where seq = -1',
    );
    const { faults } = await verifyTrail(data.orm.em.fork());
    // 4 follows the old 3.
    expect(faults.map((fault) => fault.seq)).toEqual([2, 3, 4]);
  });

  it('keeps nothing of a transaction that was rolled back, and leaves no gap', async () => {
    const refused = data.orm.em.fork().transactional(async (tx) => {
      await appendTrail(tx, { actor, action: 'batch.lost', subject: { type: 'batch', id: '17-06' } });
      throw new Error('rolled back on purpose');
    });
    await expect(refused).rejects.toThrow('rolled back on purpose');
    await tell('batch.kept');
    const last = await row(data.orm.em.fork(), 'select seq, action from trail order by seq desc limit 1');
    expect(last).toEqual({ seq: 6, action: 'batch.kept' });
  });

  it('stays one chain when many write at once', async () => {
    await Promise.all(Array.from({ length: 30 }, (_each, n) => tell('batch.at-once', { n })));
    expect(await verifyTrail(data.orm.em.fork())).toMatchObject({ intact: true, entries: 35 });
  });

  it('keeps equal payloads as equal text, and what PostgreSQL cannot store as U+FFFD', async () => {
    await tell('batch.odd', { b: 'a\u0000b', a: '\ud800' });
    const [last] = await rows<{ payload_text: string }>(
      data.orm.em.fork(),
      'select payload_text from trail order by seq desc limit 1',
    );
    expect(last?.payload_text).toBe('{"a":"\uFFFD","b":"a\uFFFDb"}');
  });
});
