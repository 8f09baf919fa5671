/**
 * The pages of a large batch through HTTP: `npm run bench:pages -- [LINES] [TIMES]` (10,000 and 40). Lines, findings and
 * the desk: first page, next page, filters, a decision and its undoing. Prints p50 and p95 of each.
 */
import { benchSite, benchWorkbookFile } from '#scripts/bench/lib/bench-site.ts';
import { checkBatchOverHttp } from '#scripts/bench/lib/check-batch-over-http.ts';
import { startBench } from '#scripts/bench/lib/start-bench.ts';
import { spread } from '#scripts/bench/lib/stats.ts';
import { machine } from '#scripts/bench/machine.ts';

type Page = { items: { id: string; version: number }[]; nextCursor: string | null };

const [lines = 10_000, times = 40] = process.argv.slice(2).map(Number);
const bench = await startBench();
try {
  const site = await benchSite(bench, { lines });
  const server = await bench.startServer();
  const contractor = await server.signIn(site.contractor.email);
  const inspector = await server.signIn((await bench.person('inspector')).email);
  const workbook = await benchWorkbookFile(site, lines);
  const id = await checkBatchOverHttp(bench, contractor, { orderId: site.order.id, workbook, lines });
  await contractor.send('POST', `/api/batches/${id}/submit`);
  await inspector.send('POST', `/api/batches/${id}/take`);
  console.log(`${machine()}\n${lines} lines; ${times} requests each`);

  const findings = `/api/batches/${id}/findings?limit=50`;
  const records = `/api/batches/${id}/records?limit=50`;
  for (const [name, path] of [
    ['batch', `/api/batches/${id}`],
    ['lines', records],
    ['findings', findings],
    ['findings, one rule', `${findings}&code=embedment-short`],
    ['findings, undecided', `${findings}&state=undecided`],
    ['findings, queries', `${findings}&severity=query`],
    ['queue of reviews', '/api/batches?limit=50&status=in-review'],
    ['home', '/api/home'],
  ] as const) {
    const page = await inspector.get<Partial<Page>>(path);
    console.log(`  ${name.padEnd(24)} first ${spread(await repeat(() => inspector.time('GET', path)))}`);
    if (!page.nextCursor) continue;
    const next = `${path}&cursor=${encodeURIComponent(page.nextCursor)}`;
    console.log(`  ${''.padEnd(24)} next  ${spread(await repeat(() => inspector.time('GET', next)))}`);
  }
  const open = await inspector.get<Page>(`/api/batches/${id}/findings?limit=200&code=embedment-short`);
  const decide: number[] = [];
  for (const finding of open.items.slice(0, times))
    decide.push(
      await inspector.time('PUT', `/api/findings/${finding.id}/decision`, {
        body: { decision: 'reject', action: 'rework', dueOn: '2099-01-01', reason: 'Set it deeper.' },
        headers: { 'if-match': `"${finding.version}"` },
      }),
    );
  console.log(`  ${'decide'.padEnd(24)}       ${spread(decide)}`);
} finally {
  await bench.stop();
}

async function repeat(task: () => Promise<number>): Promise<number[]> {
  await task();
  const list: number[] = [];
  for (let n = 0; n < times; n += 1) list.push(await task());
  return list;
}
