import { mkdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { startAzurite } from './lib/azurite.mjs';
import { ensureChromium } from './lib/chromium.mjs';
import { ensureClientBuild } from './lib/client-build.mjs';
import { ensureNodePackages } from './lib/node-packages.mjs';
import { startPostgres } from './lib/postgres.mjs';
import { printProblem } from './lib/problem.mjs';
import { attempt, endRunning } from './lib/run.mjs';
import { runningServices } from './lib/services-running.mjs';
import { step } from './lib/step.mjs';
import { tempFolder } from './lib/temp-folder.mjs';
import { runProject } from './lib/vitest-project.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const only = process.argv.slice(2);
const limitMs = 15 * 60_000;
const node = process.execPath;
const bin = (name) => path.join(root, 'node_modules/.bin', name);

/** Checks that pass or fail as a whole; each counts as one. */
const CHECKS = [
  ['lint', bin('oxlint'), ['--type-aware', '--deny-warnings']],
  ['format', bin('oxfmt'), ['--check', '.']],
  ['types', bin('tsc'), ['--noEmit', '-p', 'tsconfig.json']],
  ['generated', node, ['--import', 'tsx', 'scripts/generate/generate.ts', '--check']],
  ['migrations', node, ['--import', 'tsx', 'server/db/check-migrations.ts']],
];
const PROJECTS = ['unit', 'far-zone', 'client', 'reference', 'api', 'pipeline', 'faults', 'e2e'];

const total = { passed: 0, failed: 0 };
const services = runningServices();
const folder = tempFolder('upstand-test-');
let ended = null;

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.on(signal, () => {
    console.error(`\nEnded by ${signal} before all was run.`);
    total.failed += 1;
    void finish();
  });
}
await main().catch((error) => {
  printProblem(error);
  total.failed += 1;
});
await finish();

async function main() {
  const began = performance.now();
  await step('npm packages', async (say) => say((await ensureNodePackages(root)) ? 'installed' : 'in place'));
  const env = await setUp();
  for (const [name, command, args] of CHECKS)
    if (wanted(name))
      await check(name, () => attempt(command, args, { cwd: root, env, timeoutMs: limitMs, group: true }));
  if (wanted('build') || wanted('e2e')) await check('build', buildClient);
  for (const name of PROJECTS) if (wanted(name)) await project(name, env);
  console.log(`\nAll of it took ${Math.round((performance.now() - began) / 1000)} s.`);
}

/** A name on the command line runs that part alone: `npm test -- unit lint`. */
function wanted(name) {
  return only.length === 0 || only.includes(name);
}

/** A cluster and a blob store of the tests' own: never the demo's, never what the environment names. */
async function setUp() {
  const env = { ...process.env, TZ: 'UTC', CI: '1' };
  for (const name of [
    'DATABASE_URL',
    'DATABASE_APP_URL',
    'AZURE_STORAGE_CONNECTION_STRING',
    'SMTP_URL',
    'DATA_DIR',
    'PORT',
    'PUBLIC_URL',
    'SESSION_SECRET',
    'DEMO_PASSWORD',
    'NODE_ENV',
  ])
    delete env[name];
  if (!['migrations', 'api', 'pipeline', 'e2e'].some(wanted)) return env;
  const database = await step('PostgreSQL', async (say) =>
    services.add(await startPostgres({ dir: path.join(folder, 'pg'), durable: false, log: say })),
  );
  const blobs = await step('Azurite', async () =>
    services.add(await startAzurite({ dir: path.join(folder, 'blobs') })),
  );
  if (wanted('e2e')) await step('Chromium', async (say) => say((env.CHROMIUM = await ensureChromium())));
  return {
    ...env,
    TEST_DATABASE_URL: database.url,
    TEST_DATABASE_APP_URL: database.appUrl,
    TEST_STORAGE: blobs.connectionString,
  };
}

async function check(name, work) {
  const { code, output } = await step(name, async (say) => {
    const result = await work();
    say(result.code === 0 ? 'passed' : 'FAILED');
    return result;
  });
  total[code === 0 ? 'passed' : 'failed'] += 1;
  if (code !== 0) console.log(output);
}

async function buildClient() {
  try {
    await ensureClientBuild(root);
    return { code: 0, output: '' };
  } catch (error) {
    return { code: 1, output: error.message };
  }
}

async function project(name, env) {
  mkdirSync(path.join(folder, 'results'), { recursive: true });
  const result = await step(name, async (say) => {
    const counts = await runProject({
      name,
      root,
      env,
      timeoutMs: limitMs,
      resultFile: path.join(folder, 'results', `${name}.json`),
    });
    say(`${counts.passed} passed, ${counts.failed} failed`);
    return counts;
  });
  total.passed += result.passed;
  total.failed += result.failed;
  if (result.failed > 0) console.log([result.output, ...result.reasons].join('\n'));
}

async function finish() {
  ended ??= (async () => {
    endRunning('SIGKILL');
    await services.stopAll().catch(printProblem);
    rmSync(folder, { recursive: true, force: true });
    console.log(`\n${total.passed} passed, ${total.failed} failed`);
    process.exit(total.failed === 0 && total.passed > 0 ? 0 : 1);
  })();
  await ended;
}
