import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { attempt } from './run.mjs';

const INPUTS = [
  'src',
  'shared',
  'schemas',
  'index.html',
  'tailwind.config.ts',
  'vite.config.ts',
  'scripts/lib/initial-budget.mjs',
  'package.json',
  'package-lock.json',
];

/**
 * Builds the client unless what was built came from these very sources.
 * @param {string} root the project's folder
 * @returns {Promise<boolean>} whether it was built
 */
export async function ensureClientBuild(root) {
  const stamp = path.join(root, 'node_modules/.cache/upstand-client');
  const page = path.join(root, 'dist/index.html');
  const sources = hashOf(root, INPUTS);
  const current = () => `${sources} ${hashOf(root, ['dist/index.html'])}`;
  if (existsSync(page) && existsSync(stamp) && readFileSync(stamp, 'utf8') === current()) return false;
  const { code, output } = await attempt(
    process.execPath,
    ['node_modules/vite/bin/vite.js', 'build', '--logLevel', 'warn'],
    // Whoever asks (tests say NODE_ENV=test): what is served is never React's development build.
    { cwd: root, env: { ...process.env, NODE_ENV: 'production' } },
  );
  if (code !== 0 || !existsSync(page)) throw new Error(`The client could not be built.\n${output}`);
  mkdirSync(path.dirname(stamp), { recursive: true });
  writeFileSync(stamp, current());
  return true;
}

/** One hash over the names and contents of files and folders, whatever order the disk lists them in. */
export function hashOf(root, entries) {
  const hash = createHash('sha256');
  for (const file of entries.flatMap((entry) => filesBelow(root, entry)).sort()) {
    hash.update(`${file}\0`);
    hash.update(readFileSync(path.join(root, file)));
    hash.update('\0');
  }
  return hash.digest('hex');
}

function filesBelow(root, entry) {
  const stat = statSync(path.join(root, entry), { throwIfNoEntry: false });
  if (!stat) return [];
  if (!stat.isDirectory()) return [entry];
  return readdirSync(path.join(root, entry)).flatMap((name) => filesBelow(root, path.join(entry, name)));
}
