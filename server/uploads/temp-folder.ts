import { mkdtemp, readdir, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** No job works on one folder for so long: what is older was left by a process that was killed. */
const LEFT_BEHIND_MS = 3_600_000;

/** A folder of the task's own, gone when the task ends; takes away what killed processes left under the same prefix. */
export async function withTempFolder<T>(prefix: string, task: (folder: string) => Promise<T>): Promise<T> {
  await sweep(prefix, Date.now() - LEFT_BEHIND_MS);
  const folder = await mkdtemp(join(tmpdir(), prefix));
  try {
    return await task(folder);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

async function sweep(prefix: string, before: number): Promise<void> {
  const names = await readdir(tmpdir()).catch(() => []);
  for (const name of names) {
    if (!name.startsWith(prefix)) continue;
    const path = join(tmpdir(), name);
    const found = await stat(path).catch(() => null);
    if (found && found.mtimeMs < before)
      await rm(path, { recursive: true, force: true }).catch(() => undefined);
  }
}
