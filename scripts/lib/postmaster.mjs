import { existsSync, readFileSync, realpathSync, rmSync } from 'node:fs';
import path from 'node:path';
import { StartProblem } from './problem.mjs';
import { isAlive, workingFolder } from './process-info.mjs';
import { until } from './wait-for.mjs';

/**
 * Deals with what a crash left behind: a cluster still running in this folder is stopped cleanly, and a lock file
 * whose process is gone (or is now somebody else's number) is removed.
 * @param {string} data the cluster's data folder
 * @returns {Promise<'nothing' | 'stopped' | 'stale'>}
 */
export async function clearLeftOver(data) {
  const pid = readPid(data);
  if (pid === null) return 'nothing';
  if (!isAlive(pid) || !isOurs(pid, data)) {
    rmSync(path.join(data, 'postmaster.pid'), { force: true });
    return 'stale';
  }
  try {
    process.kill(pid, 'SIGINT'); // fast shutdown: open transactions roll back, a checkpoint is written
    await until(() => !isAlive(pid), 30_000);
  } catch (error) {
    throw new StartProblem(
      `A PostgreSQL server from an earlier start still runs on ${data} (process ${pid}) and does not stop: ${error.message}`,
      `End it with: kill -INT ${pid}\nthen try again.`,
    );
  }
  return 'stopped';
}

/** The first line of postmaster.pid is the process; null when there is no lock file or it says nothing. */
export function readPid(data) {
  const file = path.join(data, 'postmaster.pid');
  if (!existsSync(file)) return null;
  const pid = Number.parseInt(readFileSync(file, 'utf8'), 10);
  return Number.isInteger(pid) && pid > 1 ? pid : null;
}

/** A postmaster works in its data folder. Where we may not look, it is taken for ours rather than robbed of its lock. */
function isOurs(pid, data) {
  const folder = workingFolder(pid);
  return folder === null || folder === realpathSync(data);
}
