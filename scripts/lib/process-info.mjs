import { readFileSync, readlinkSync } from 'node:fs';

/** Whether a process of this number lives (also one of another account). */
export function isAlive(pid) {
  try {
    process.kill(pid, 0);
  } catch (error) {
    if (error.code !== 'EPERM') return false;
  }
  return processState(pid) !== 'Z';
}

function processState(pid) {
  try {
    return afterName(readFileSync(`/proc/${pid}/stat`, 'utf8'))[0];
  } catch {
    return null;
  }
}

/**
 * When a process began, in clock ticks since boot. Number and beginning together know a process again: numbers
 * are reused, above all where a container starts anew. Null where the system does not tell.
 */
export function beganAt(pid) {
  try {
    return afterName(readFileSync(`/proc/${pid}/stat`, 'utf8'))[19] ?? null;
  } catch {
    return null;
  }
}

/** The fields of /proc/PID/stat after the name, which may itself hold blanks and brackets. */
export function afterName(stat) {
  return stat.slice(stat.lastIndexOf(')') + 2).split(' ');
}

/** A process's working folder, where this account may see it. */
export function workingFolder(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`);
  } catch {
    return null;
  }
}
