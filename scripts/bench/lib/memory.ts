import { readFileSync } from 'node:fs';

/** Resident memory of a process in MiB, as Linux tells it: now, and at its highest. */
export function memoryOf(pid: number): { now: number; peak: number } {
  const status = readFileSync(`/proc/${pid}/status`, 'utf8');
  const field = (name: string): number =>
    Number(new RegExp(`${name}:\\s+(\\d+) kB`).exec(status)?.[1]) / 1024;
  return { now: field('VmRSS'), peak: field('VmHWM') };
}
