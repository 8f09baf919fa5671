/**
 * The peak memory of issuing a small and a large transmittal, each in a fresh process: `npm run bench:transmittal -- [SMALL] [LARGE]`
 * (1,000 and 50,000 lines). Seeds a register of its own by COPY. Prints time, size and peak resident memory of each.
 */
import { spawn } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { fileURLToPath } from 'node:url';
import { serverFlags } from '#scripts/lib/server-flags.mjs';
import { seedRegister } from '#scripts/bench/lib/seed-register.ts';
import { startBench, type Bench } from '#scripts/bench/lib/start-bench.ts';
import { machine } from '#scripts/bench/machine.ts';

const [small = 1_000, large = 50_000] = process.argv.slice(2).map(Number);
const APART_MB = 64;
type Issued = { ms: number; size: number; rows: number; peakMb: number };

const bench = await startBench();
try {
  await seedRegister(bench, large);
  console.log(machine());
  const peaks: number[] = [];
  for (const lines of [small, large]) {
    const { ms, size, rows, peakMb } = await issue(bench, lines);
    peaks.push(peakMb);
    console.log(
      `  ${String(rows).padStart(6)} lines  ${(ms / 1000).toFixed(1).padStart(6)} s  ${(size / 1e6).toFixed(1).padStart(5)} MB  at most ${peakMb.toFixed(0).padStart(4)} MiB`,
    );
  }
  const apart = (peaks[1] ?? 0) - (peaks[0] ?? 0);
  console.log(`  ${apart.toFixed(0)} MiB apart, at most ${APART_MB}`);
  if (apart > APART_MB) process.exitCode = 1;
} finally {
  await bench.stop();
}

/** A transmittal of the first so many versions, issued by the job's own handler in a process that does nothing else. */
async function issue(bench: Bench, lines: number): Promise<Issued> {
  const id = randomUUID();
  await bench.database.query(
    `insert into transmittals (id, scope, title) values ($1, '{"filter":{}}', 'Measured')`,
    [id],
  );
  await bench.database.query(
    `insert into transmittal_items (transmittal_id, version_id, ordinal)
     select $1, id, row_number() over (order by structure_number) from (
       select id, structure_number from register_versions order by structure_number limit $2
     ) v`,
    [id, lines],
  );
  return new Promise((resolve, reject) => {
    const child = spawn(
      process.execPath,
      [...serverFlags, '--import', 'tsx', fileURLToPath(new URL('./issue-child.ts', import.meta.url)), id],
      {
        env: {
          PATH: process.env['PATH'],
          TZ: 'UTC',
          DATABASE_URL: bench.ownerUrl,
          DATABASE_APP_URL: bench.appUrl,
          AZURE_STORAGE_CONNECTION_STRING: bench.storage,
          SESSION_SECRET: 'for measurements alone, and long enough to be taken',
          LOG_LEVEL: 'error',
        },
        stdio: ['ignore', 'pipe', 'inherit'],
      },
    );
    let said = '';
    child.stdout.on('data', (part: Buffer) => (said += part.toString()));
    child.once('error', reject);
    child.once('close', (code) => {
      if (code === 0) resolve(JSON.parse(said) as Issued);
      else reject(new Error(`Issuing ${lines} lines ended with ${code}.`));
    });
  });
}
