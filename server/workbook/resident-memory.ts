import { readFile } from 'node:fs/promises';

const PAGE_BYTES = 4096;

/** Resident memory of a process in bytes; null where the system does not tell (the heap limit still holds there). */
export async function residentMemory(pid: number): Promise<number | null> {
  try {
    const statm = await readFile(`/proc/${pid}/statm`, 'utf8');
    const pages = Number(statm.split(' ')[1]);
    return Number.isFinite(pages) ? pages * PAGE_BYTES : null;
  } catch {
    return null;
  }
}
