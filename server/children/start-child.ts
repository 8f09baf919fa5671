import { fork, type ChildProcess, type ForkOptions } from 'node:child_process';
import { createRequire } from 'node:module';
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import programs from './programs.json' with { type: 'json' };

export type ChildName = keyof typeof programs;

const ROOT = fileURLToPath(new URL('../../', import.meta.url));

/**
 * Where `npm start` has just put the programs in one file each, for this run; from the sources otherwise. A file left
 * by an earlier build is so never met.
 */
const BUILT = 'CHILD_PROGRAMS';

function programOf(name: ChildName): { file: string; flags: readonly string[] } {
  const built = process.env[BUILT];
  if (built) return { file: path.join(built, `${name}.mjs`), flags: ['--enable-source-maps'] };
  const loader = pathToFileURL(createRequire(import.meta.url).resolve('tsx')).href;
  return { file: path.join(ROOT, programs[name]), flags: ['--import', loader] };
}

/** Starts a program of `programs.json` in a process of its own that speaks by messages alone; `flags` are Node's. */
export function startChild(
  name: ChildName,
  options: {
    args?: readonly string[];
    flags: readonly string[];
    serialization?: ForkOptions['serialization'];
  },
): ChildProcess {
  const { args = [], flags, serialization } = options;
  const program = programOf(name);
  return fork(program.file, [...args], {
    execArgv: [...flags, ...program.flags],
    // Nothing of the server's settings (database, secrets) is within reach of code that reads a stranger's file.
    env: { TZ: 'UTC', PATH: process.env['PATH'] ?? '', NODE_ENV: 'production' },
    stdio: ['ignore', 'ignore', 'ignore', 'ipc'],
    ...(serialization ? { serialization } : {}),
  });
}
