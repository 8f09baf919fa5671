/**
 * Register and nonconformities with many records: `npm run bench:register -- [RECORDS] [TIMES] [NAME]` (200,000 and 40;
 * NAME: only filters whose name holds it). Seeds a database of its own by COPY. Prints for each filter p50 and p95 of the
 * first page and of the next one through HTTP, and of the very same SQL through `pg` alone, in milliseconds.
 */
import pg from 'pg';
import { recordedSql, type Statement } from '#scripts/bench/lib/recorded-sql.ts';
import { seedRegister } from '#scripts/bench/lib/seed-register.ts';
import { startBench } from '#scripts/bench/lib/start-bench.ts';
import { quantile } from '#scripts/bench/lib/stats.ts';
import { machine } from '#scripts/bench/machine.ts';
import { VALUE_TYPES } from '#server/db/value-types.ts';
import { filtersOf } from './filters.ts';

const [records = 200_000, times = 40] = process.argv.slice(2, 4).map(Number);
const only = process.argv[4] ?? '';
/** Above this the first page of a filter is too slow. */
const LIMIT_MS = 50;

const bench = await startBench();
const pool = new pg.Pool({ connectionString: bench.appUrl, max: 1 });
try {
  const began = performance.now();
  const seeded = await seedRegister(bench, records);
  console.log(machine());
  console.log(
    `${records} records, seeded in ${((performance.now() - began) / 1000).toFixed(0)} s; ${times} requests each`,
  );
  const server = await bench.startServer();
  const auditor = await server.signIn((await bench.person('auditor')).email);
  const contractor = await server.signIn(
    (await bench.person('contractor', { orgId: seeded.contractors[0]! })).email,
  );
  console.log(`${''.padEnd(44)} first page p50   p95   next page p50   p95   SQL p50   p95`);
  const slow: string[] = [];
  for (const filter of filtersOf(seeded)) {
    if (!filter.name.includes(only)) continue;
    const client = filter.by === 'contractor' ? contractor : auditor;
    const page = await client.get<{ nextCursor?: string | null }>(filter.path);
    const first = await repeat(() => client.time('GET', filter.path));
    const cursor = page.nextCursor;
    const next = cursor
      ? await repeat(() => client.time('GET', `${filter.path}&cursor=${encodeURIComponent(cursor)}`))
      : [];
    const statements = await recordedSql(() => filter.run(bench.em()));
    const sql = await repeat(() => replay(statements));
    const figures = [first, next, sql].flatMap((list) =>
      list.length > 0 ? [quantile(list, 0.5), quantile(list, 0.95)] : [null, null],
    );
    console.log(
      `  ${filter.name.padEnd(42)} ${figures.map((each, n) => (each === null ? '–' : each.toFixed(1)).padStart([14, 6, 16, 6, 10, 6][n] ?? 6)).join('')}`,
    );
    if (quantile(first, 0.95) > LIMIT_MS) slow.push(filter.name);
  }
  console.log(
    slow.length === 0
      ? `  every first page under ${LIMIT_MS} ms at p95`
      : `  first page over ${LIMIT_MS} ms at p95: ${slow.join(', ')}`,
  );
} finally {
  await pool.end();
  await bench.stop();
}

async function repeat(task: () => Promise<number>): Promise<number[]> {
  await task();
  const list: number[] = [];
  for (let n = 0; n < times; n += 1) list.push(await task());
  return list;
}

async function replay(statements: readonly Statement[]): Promise<number> {
  const began = performance.now();
  for (const { text, values } of statements)
    await pool.query({ text, values: [...values], types: VALUE_TYPES });
  return performance.now() - began;
}
