import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, mkdtempSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { build } from 'esbuild';

/** Within the project, so that the programs find its packages. */
const CACHE = 'node_modules/.cache/upstand-children';

/**
 * Puts each program that the server runs in a process of its own into one plain file with its source map: it starts
 * sooner, and its inner functions lose the names that a loader keeps at a cost. Made anew at each start, in a folder named
 * by its contents: another start neither meets an older one nor changes it beneath a server that runs.
 * @param {string} root the project's folder
 * @returns {Promise<string>} the folder, for the server's CHILD_PROGRAMS
 */
export async function buildChildPrograms(root) {
  const programs = JSON.parse(readFileSync(path.join(root, 'server/children/programs.json'), 'utf8'));
  const { outputFiles } = await build({
    absWorkingDir: root,
    entryPoints: Object.entries(programs).map(([out, entry]) => ({ in: entry, out })),
    outdir: path.join(root, CACHE, 'any'),
    outExtension: { '.js': '.mjs' },
    bundle: true,
    packages: 'external',
    platform: 'node',
    format: 'esm',
    target: 'node20',
    sourcemap: true,
    write: false,
    logLevel: 'silent',
  });
  const hash = createHash('sha256');
  for (const file of outputFiles) hash.update(`${path.basename(file.path)}\0`).update(file.contents);
  const folder = path.join(root, CACHE, hash.digest('hex').slice(0, 16));
  if (existsSync(folder)) return folder;
  mkdirSync(path.join(root, CACHE), { recursive: true });
  const made = mkdtempSync(path.join(root, CACHE, 'new-'));
  for (const file of outputFiles) writeFileSync(path.join(made, path.basename(file.path)), file.contents);
  try {
    renameSync(made, folder);
  } catch (error) {
    rmSync(made, { recursive: true, force: true });
    // Another start was quicker with the very same.
    if (!existsSync(folder)) throw error;
  }
  return folder;
}
