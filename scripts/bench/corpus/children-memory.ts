import { readFile } from 'node:fs/promises';

const EVERY_MS = 5;

async function highWater(pid: string): Promise<number> {
  try {
    const status = await readFile(`/proc/${pid}/status`, 'utf8');
    return Number(/^VmHWM:\s+(\d+) kB$/m.exec(status)?.[1] ?? 0) * 1024;
  } catch {
    // It ended meanwhile.
    return 0;
  }
}

/** Watches the child processes of this one; `stop` gives the most resident memory, in bytes, that one of them had (0 where the system does not tell). */
export function watchChildren(): { stop: () => Promise<number> } {
  let most = 0;
  const ended = new AbortController();
  const loop = (async () => {
    while (!ended.signal.aborted) {
      const children = await readFile(`/proc/self/task/${process.pid}/children`, 'utf8').catch(() => '');
      for (const pid of children.split(' ').filter(Boolean)) {
        const command = await readFile(`/proc/${pid}/cmdline`, 'utf8').catch(() => '');
        if (command.includes('reader-child')) most = Math.max(most, await highWater(pid));
      }
      await new Promise((resolve) => setTimeout(resolve, EVERY_MS));
    }
  })();
  return {
    stop: async () => {
      ended.abort();
      await loop;
      return most;
    },
  };
}
