import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { StartProblem } from './problem.mjs';
import { attempt, lastLines } from './run.mjs';

/**
 * Brings node_modules to what the lock file says; does nothing when it stands so already.
 * @param {string} root the project's folder
 * @returns {Promise<boolean>} whether something was installed
 */
export async function ensureNodePackages(root) {
  const wanted = readJson(path.join(root, 'package-lock.json'));
  if (wanted && isInstalled(wanted, readJson(path.join(root, 'node_modules/.package-lock.json'))))
    return false;
  // Development packages are needed to run here too: the blob store and the client's build are among them.
  const { code, output } = await attempt('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], {
    cwd: root,
  });
  if (code === 0) return true;
  throw new StartProblem(
    `The npm packages could not be installed:\n${lastLines(output, 10)}`,
    'Check the network and npm’s settings, then try again. By hand: npm ci',
  );
}

/**
 * Whether the installed tree (npm's own note of it in node_modules) has every package of the lock file in its version.
 * Optional packages are for other systems where they are missing.
 */
export function isInstalled(wanted, installed) {
  if (!installed) return false;
  return Object.entries(wanted.packages).every(([place, entry]) => {
    if (place === '' || entry.link) return true;
    const found = installed.packages[place];
    return found ? found.version === entry.version : entry.optional === true || entry.devOptional === true;
  });
}

function readJson(file) {
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null;
}
