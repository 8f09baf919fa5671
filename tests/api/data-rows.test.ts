import { afterAll, beforeAll, expect, it } from 'vitest';
import { insertRows, insertRowsReturning } from '#server/db/insert-rows.ts';
import { row, rows, run } from '#server/db/rows.ts';
import { createDataHarness, type DataHarness } from '#tests/setup/data-harness.ts';

let data: DataHarness;
beforeAll(async () => {
  data = await createDataHarness();
});
afterAll(() => data.close());
const em = () => data.orm.em.fork();

it('columns come back as they go over the wire', async () => {
  expect(
    await row(
      em(),
      `select timestamptz(3) '2026-03-08 01:59:59.123-06' as instant, date '2026-03-08' as day, 12::bigint as whole,
         1.25::numeric as decimal, 0.1::float8 as float, '{"a":[1]}'::jsonb as json, array['b','c'] as list, null::text as nothing`,
    ),
  ).toEqual({
    instant: '2026-03-08T07:59:59.123Z',
    day: '2026-03-08',
    whole: 12,
    decimal: 1.25,
    float: 0.1,
    json: { a: [1] },
    list: ['b', 'c'],
    nothing: null,
  });
});

it('a whole number that JavaScript cannot keep is an error, not another number', async () => {
  await expect(rows(em(), 'select 9007199254740993::bigint as n')).rejects.toThrow(RangeError);
});

it('a statement runs in the transaction of its manager and is gone with it', async () => {
  const refused = em().transactional(async (tx) => {
    await run(tx, `insert into structures (number) values ('P-900')`);
    expect(await rows(tx, `select number from structures where number = 'P-900'`)).toHaveLength(1);
    expect(await rows(em(), `select number from structures where number = 'P-900'`)).toHaveLength(0);
    throw new Error('rolled back on purpose');
  });
  await expect(refused).rejects.toThrow('rolled back on purpose');
  expect(await rows(em(), `select number from structures where number = 'P-900'`)).toHaveLength(0);
});

it('inserts more rows than one statement has parameters for, with defaults for what is left out', async () => {
  const list = Array.from({ length: 70_000 }, (_each, n) => ({ band: n % 4, value: n, sha256: `s${n}` }));
  await insertRows(em(), 'photo_bands', list);
  expect(await row(em(), 'select count(*) as n, max(value) as most from photo_bands')).toEqual({
    n: 70_000,
    most: 69_999,
  });
  const made = await insertRowsReturning<{ id: string; number: string }>(em(), {
    table: 'structures',
    list: [{ number: 'P-1' }, { number: 'P-2' }],
    returning: ['id', 'number'],
  });
  expect(made.map((each) => each.number).toSorted()).toEqual(['P-1', 'P-2']);
  expect(made[0]?.id).toMatch(/^[0-9a-f-]{36}$/);
});

it('keeps text that PostgreSQL refuses as U+FFFD, and a backslash before u0000 as it is', async () => {
  await insertRows(em(), 'installation', [
    { key: 'odd', value: { a: 'NUL\u0000', b: 'lone \ud83d', c: String.raw`\u0000`, d: '😀' } },
  ]);
  expect(await row(em(), `select value from installation where key = 'odd'`)).toEqual({
    value: { a: 'NUL\uFFFD', b: 'lone \uFFFD', c: String.raw`\u0000`, d: '😀' },
  });
});

it('a name of a table or column is never what somebody typed', async () => {
  await expect(insertRows(em(), 'structures; drop table lines', [{ number: 'P-3' }])).rejects.toThrow(
    'not a name',
  );
  await expect(insertRows(em(), 'structures', [{ 'number") select 1 --': 'P-3' }])).rejects.toThrow(
    'not a name',
  );
});
