import { existsSync, readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { createInterface } from 'node:readline/promises';
import { fileURLToPath } from 'node:url';
import { clusterAccount, clusterFolder } from './lib/cluster-account.mjs';
import { clearLeftOver } from './lib/postmaster.mjs';
import { StartProblem, printProblem } from './lib/problem.mjs';
import { lockHolder } from './lib/start-lock.mjs';
import { readStartSettings } from './lib/start-settings.mjs';

/** What `npm start` makes in its data folder; whatever else lies there is not ours to remove. */
const OURS = ['postgres', 'blobs', 'mail', 'uploads', 'logs', 'secrets.json', 'session-secret', 'start.lock'];
const root = fileURLToPath(new URL('..', import.meta.url));

try {
  await reset();
} catch (error) {
  printProblem(error);
  process.exitCode = 1;
}

async function reset() {
  const { dataDir } = readStartSettings(process.env, root);
  const holder = lockHolder(dataDir);
  if (holder) {
    throw new StartProblem(
      `Upstand is running on ${dataDir} (process ${holder.pid}).`,
      `End it first with Ctrl-C, or: kill ${holder.pid}`,
    );
  }
  const wanted = path.join(dataDir, 'postgres');
  const cluster = existsSync('/usr/lib/postgresql') ? clusterFolder(wanted, clusterAccount()) : wanted;
  const places = [...OURS.map((name) => path.join(dataDir, name)), cluster].filter(
    (place, n, all) => existsSync(place) && all.indexOf(place) === n,
  );
  if (places.length === 0) {
    console.log(`There is nothing to remove in ${dataDir}.`);
    return;
  }
  console.log(
    `This removes the database, the stored files and the secrets of this installation:\n  ${places.join('\n  ')}`,
  );
  if (!(await agreed())) {
    console.log('Nothing was removed.');
    process.exitCode = 1;
    return;
  }
  if (existsSync(path.join(cluster, 'data'))) await clearLeftOver(path.join(cluster, 'data'));
  for (const place of places) rmSync(place, { recursive: true, force: true });
  if (readdirSync(dataDir).length === 0) rmSync(dataDir, { recursive: true });
  console.log('Removed. npm start begins anew.');
}

async function agreed() {
  if (process.argv.includes('--yes')) return true;
  if (!process.stdin.isTTY) {
    throw new StartProblem('There is nobody here to ask.', 'If it shall be removed: npm run reset -- --yes');
  }
  const ask = createInterface({ input: process.stdin, output: process.stdout });
  const answer = await ask.question('Type yes to remove them: ');
  ask.close();
  return answer.trim().toLowerCase() === 'yes';
}
