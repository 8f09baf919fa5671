import { existsSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { installPackages } from './debian-packages.mjs';

const DEBIAN_ROOT = '/usr/lib/postgresql';

/** The folder with `initdb` and `postgres` of the newest version that is installed; null when there is none. */
export function findPostgres() {
  const onPath = (process.env.PATH ?? '').split(path.delimiter).filter((folder) => folder !== '');
  const versions = existsSync(DEBIAN_ROOT) ? newestFirst(readdirSync(DEBIAN_ROOT)) : [];
  const folders = [...versions.map((version) => path.join(DEBIAN_ROOT, version, 'bin')), ...onPath];
  return (
    folders.find((folder) =>
      ['initdb', 'postgres', 'psql'].every((tool) => existsSync(path.join(folder, tool))),
    ) ?? null
  );
}

/** Version folders, newest first: `15` before `9.6`. */
export function newestFirst(names) {
  return names.filter((name) => /^\d+(\.\d+)?$/.test(name)).sort((a, b) => Number(b) - Number(a));
}

/** The same, installed from Debian's packages when it is missing. */
export async function ensurePostgres(say = () => {}) {
  const found = findPostgres();
  if (found) return found;
  say('installed from Debian’s packages');
  await installPackages(['postgresql'], 'PostgreSQL is not installed on this machine.');
  const installed = findPostgres();
  if (!installed)
    throw new Error(`PostgreSQL was installed, but no initdb is to be found below ${DEBIAN_ROOT}.`);
  return installed;
}
