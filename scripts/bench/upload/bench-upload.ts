/**
 * A large workbook from upload to findings while others work: `npm run bench:upload -- [LINES] [RUNS]` (10,000 and 3).
 * Brings up its own database, blob store and server (web and worker in one process, as by default) on loopback. Prints the time of the whole,
 * the server's memory, its event loop's delay, and what other people's requests took during the check beside those at rest.
 */
import { setTimeout as sleep } from 'node:timers/promises';
import { type BenchSite, benchSite, benchWorkbookFile } from '#scripts/bench/lib/bench-site.ts';
import { checkBatchOverHttp } from '#scripts/bench/lib/check-batch-over-http.ts';
import type { Client } from '#scripts/bench/lib/client.ts';
import { memoryOf } from '#scripts/bench/lib/memory.ts';
import { startBench } from '#scripts/bench/lib/start-bench.ts';
import { median, spread } from '#scripts/bench/lib/stats.ts';
import { machine } from '#scripts/bench/machine.ts';

const [lines = 10_000, runs = 3] = process.argv.slice(2).map(Number);
const PAUSE_MS = 20;
const bench = await startBench();
try {
  const site = await benchSite(bench, { lines });
  const server = await bench.startServer({ imports: [new URL('./event-loop.mjs', import.meta.url).href] });
  const contractor = await server.signIn(site.contractor.email);
  const other = await server.signIn((await bench.person('auditor')).email);
  const small = await benchWorkbookFile(site, 10);
  const large = await benchWorkbookFile(site, lines);
  console.log(`${machine()}\n${lines} lines; ${runs} runs after a small one to warm up`);

  await checkOne(contractor, site, { workbook: small, lines: 10 });
  const atRest = await probe(other, () => sleep(2_000));
  const before = memoryOf(server.pid);
  console.log(`  other requests at rest           ${spread(atRest)}`);
  process.kill(server.pid, 'SIGUSR2');
  const times: number[] = [];
  let lowest = 0;
  for (let run = 0; run < runs; run += 1) {
    let highest = 0;
    const watch = setInterval(() => (highest = Math.max(highest, memoryOf(server.pid).now)), 50);
    const took = await probe(other, async () => {
      const began = performance.now();
      const counts = await checkOne(contractor, site, { workbook: large, lines });
      times.push(performance.now() - began);
      if (run === 0) console.log(`  ${JSON.stringify(counts)}`);
    });
    clearInterval(watch);
    lowest = memoryOf(server.pid).now;
    console.log(
      `  upload to findings ${((times.at(-1) ?? 0) / 1000).toFixed(2)} s; others meanwhile ${spread(took)}; server at most ${highest.toFixed(0)} MiB`,
    );
    process.kill(server.pid, 'SIGUSR2');
    await sleep(100);
  }
  console.log(
    `  median ${(median(times) / 1000).toFixed(2)} s; memory of the server ${before.now.toFixed(0)} MiB before, ${lowest.toFixed(0)} after, ${memoryOf(server.pid).peak.toFixed(0)} at its highest`,
  );
} finally {
  await bench.stop();
}

/** What requests of another person take while something goes on, one after the other. */
async function probe(client: Client, task: () => Promise<void>): Promise<number[]> {
  const times: number[] = [];
  const state = { going: true };
  const asking = (async () => {
    while (state.going) {
      times.push(await client.time('GET', '/api/nonconformities?limit=50'));
      await sleep(PAUSE_MS);
    }
  })();
  try {
    await task();
  } finally {
    state.going = false;
    await asking;
  }
  return times;
}

/** Checks a new batch and gives its counts. */
async function checkOne(
  client: Client,
  site: BenchSite,
  file: { workbook: string; lines: number },
): Promise<unknown> {
  const id = await checkBatchOverHttp(bench, client, { orderId: site.order.id, ...file });
  return (await client.get<{ counts: unknown }>(`/api/batches/${id}`)).counts;
}
