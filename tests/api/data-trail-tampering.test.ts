import fc from 'fast-check';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { appendTrail } from '#server/trail/append-trail.ts';
import { verifyTrail } from '#server/trail/verify-trail.ts';
import { createDataHarness, type DataHarness } from '#tests/setup/data-harness.ts';

/** Every single change of a chain of rows is found: each kind of it at every place, first and last row with the others. */

const ROWS = 6;
let data: DataHarness;

beforeAll(async () => {
  data = await createDataHarness();
  for (let n = 1; n <= ROWS; n += 1) {
    await data.orm.em.fork().transactional((tx) =>
      appendTrail(tx, {
        actor: { id: '0b9d2f5c-6f3e-4a55-9d7b-2f8f8a3f1c10', name: 'R. Ødegård', role: 'inspector' },
        action: `batch.step-${n}`,
        subject: { type: 'batch', id: '17-06', label: 'Batch 17-06' },
        payload: { n },
      }),
    );
  }
  await data.owner.query(
    'create table trail_kept as table trail; create table head_kept as table trail_head',
  );
});
afterAll(() => data?.close());

/** Behind the application's back, with the guards off; what a statement asks for is what an owner of the tables could do. */
async function tampered(...statements: readonly string[]): Promise<readonly string[]> {
  await data.owner.query('alter table trail disable trigger append_only');
  for (const statement of statements) await data.owner.query(statement);
  const { intact, faults } = await verifyTrail(data.orm.em.fork());
  await data.owner.query(
    'delete from trail; insert into trail table trail_kept; delete from trail_head; insert into trail_head table head_kept',
  );
  await data.owner.query('alter table trail enable always trigger append_only');
  expect(intact).toBe(faults.length === 0);
  return faults.map(({ seq, fault }) => `${seq} ${fault}`);
}

const rehash = (seq: number) => `update trail t set hash = trail_hash(t) where seq = ${seq}`;
const COLUMNS: readonly (readonly [column: string, value: string])[] = [
  ['at', `at + interval '1 microsecond'`],
  ['actor_id', 'gen_random_uuid()'],
  ['actor_id', 'null'],
  ['actor_name', `actor_name || ' '`],
  ['actor_role', `'engineer'`],
  ['action', `'batch.other'`],
  ['subject_type', `'line'`],
  ['subject_id', `'17-07'`],
  ['subject_label', 'null'],
  ['payload_text', `'{"n":99}'`],
  ['prev', `repeat('e', 64)`],
  ['hash', `repeat('e', 64)`],
];
const PLACES = Array.from({ length: ROWS }, (_, index) => index + 1);

it('holds as it is', async () => {
  expect(await tampered()).toEqual([]);
});

it.each(PLACES)('finds row %i with any one column changed, also with its hash made to fit', async (seq) => {
  const missed: string[] = [];
  for (const [column, value] of COLUMNS) {
    const change = `update trail set ${column} = ${value} where seq = ${seq}`;
    if (!(await tampered(change)).includes(`${seq} changed`)) missed.push(change);
    // A hash alone that is made again is the old one: nothing was done.
    if (column !== 'hash' && (await tampered(change, rehash(seq))).length === 0)
      missed.push(`${change}, hash too`);
  }
  expect(missed).toEqual([]);
});

it.each(PLACES)('finds row %i removed, also with those after it moved up', async (seq) => {
  expect(await tampered(`delete from trail where seq = ${seq}`)).not.toEqual([]);
  const moveUp = [
    `delete from trail where seq = ${seq}`,
    `update trail set seq = 1 - seq where seq > ${seq}`,
    'update trail set seq = -seq where seq <= 0',
  ];
  expect(await tampered(...moveUp)).not.toEqual([]);
});

it.each(PLACES)('finds the tail from row %i on removed', async (seq) => {
  expect(await tampered(`delete from trail where seq >= ${seq}`)).toContain(`${ROWS} end-differs`);
});

it.each([...PLACES, ROWS + 1])(
  'finds a row inserted at %i, with the hash and the link that fit there',
  async (seq) => {
    const makeRoom = [
      `update trail set seq = -seq where seq >= ${seq}`,
      'update trail set seq = 1 - seq where seq < 0',
    ];
    const insert = `insert into trail select ${seq}, at, actor_id, actor_name, actor_role, 'batch.invented', subject_type, subject_id,
    subject_label, payload_text, coalesce((select hash from trail where seq = ${seq - 1}), repeat('0', 64)), repeat('f', 64)
    from trail_kept where seq = 1`;
    expect(await tampered(...makeRoom, insert, rehash(seq))).not.toEqual([]);
  },
);

it('finds any two rows that changed places, and any new order, also with hashes made to fit', async () => {
  await fc.assert(
    fc.asyncProperty(
      fc.shuffledSubarray([...PLACES], { minLength: ROWS }),
      fc.boolean(),
      async (order, hashes) => {
        const moved = order.flatMap((seq, index) => (seq === index + 1 ? [] : [[seq, index + 1] as const]));
        if (moved.length === 0) return;
        const faults = await tampered(
          ...moved.map(([from, to]) => `update trail set seq = ${-to} where seq = ${from}`),
          'update trail set seq = -seq where seq < 0',
          ...(hashes ? moved.map(([, to]) => rehash(to)) : []),
        );
        expect(faults).not.toEqual([]);
      },
    ),
    { numRuns: 40 },
  );
});

// Who rewrites the whole chain and its kept end too is found by a head that was written down elsewhere.
it('tells another head after the chain and its end were written anew', async () => {
  const before = await verifyTrail(data.orm.em.fork());
  await data.owner.query('begin; alter table trail disable trigger append_only');
  await data.owner.query(`update trail set payload_text = '{"n":99}' where seq = ${ROWS}`);
  await data.owner.query(rehash(ROWS));
  await data.owner.query(`update trail_head set hash = (select hash from trail where seq = ${ROWS})`);
  await data.owner.query('alter table trail enable always trigger append_only; commit');
  const after = await verifyTrail(data.orm.em.fork());
  expect(after.headSeq).toBe(before.headSeq);
  expect(after.headHash).not.toBe(before.headHash);
});
