import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { StartProblem } from './problem.mjs';
import { beganAt, isAlive } from './process-info.mjs';

/**
 * Takes a data folder for this process, so that two starts never share one cluster. A lock whose process is gone is
 * taken over.
 * @param {string} dir
 * @param {{url?: string}} about told to whoever comes second
 * @returns {() => void} gives it back
 */
export function takeDataFolder(dir, about = {}) {
  const file = path.join(dir, 'start.lock');
  try {
    mkdirSync(dir, { recursive: true, mode: 0o711 });
    const holder = lockHolder(dir);
    if (holder) {
      throw new StartProblem(
        `Upstand is already running on ${dir} (process ${holder.pid}${holder.url ? `, ${holder.url}` : ''}).`,
        `End it with Ctrl-C where it runs, or: kill ${holder.pid}\nA second one beside it needs its own port and folder: PORT=4610 DATA_DIR=var2 npm start`,
      );
    }
    rmSync(file, { force: true });
    writeFileSync(file, JSON.stringify({ pid: process.pid, began: beganAt(process.pid), ...about }), {
      flag: 'wx',
      mode: 0o600,
    });
  } catch (error) {
    throw explain(error, dir);
  }
  return () => rmSync(file, { force: true });
}

/** Who holds a data folder just now; null when nobody does. */
export function lockHolder(dir) {
  try {
    const holder = JSON.parse(readFileSync(path.join(dir, 'start.lock'), 'utf8'));
    return isAlive(holder.pid) && beganAt(holder.pid) === holder.began ? holder : null;
  } catch (error) {
    if (error.code === 'ENOENT' || error instanceof SyntaxError) return null;
    throw error;
  }
}

function explain(error, dir) {
  switch (error.code) {
    case 'EACCES':
    case 'EPERM':
    case 'EROFS':
      return new StartProblem(
        `Nothing can be written in the data folder ${dir}.`,
        'Give this account the right to it, or choose another: DATA_DIR=~/upstand-data npm start',
      );
    case 'ENOTDIR':
    case 'EEXIST':
      return new StartProblem(
        `The data folder ${dir} is taken by a file, or by another start this very moment.`,
        'Try again, or choose another folder with DATA_DIR.',
      );
    case 'ENOSPC':
      return new StartProblem(
        `The disk with ${dir} is full.`,
        'Make room, or choose another folder with DATA_DIR.',
      );
    default:
      return error;
  }
}
