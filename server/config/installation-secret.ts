import { randomBytes } from 'node:crypto';
import { chmodSync, linkSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/**
 * A secret of this installation, made at the first start and kept in `DATA_DIR`, readable by its owner alone.
 * Two processes that start at once get the same one: the file appears whole, and the first wins.
 * @throws when the folder cannot be written
 */
export function installationSecret(dataDir: string, name: string): string {
  const path = join(dataDir, name);
  const found = readSecret(path);
  if (found) return found;
  mkdirSync(dataDir, { recursive: true });
  const draft = join(dataDir, `.${name}-${process.pid}-${randomBytes(4).toString('hex')}`);
  writeFileSync(draft, randomBytes(48).toString('base64url'), { mode: 0o600, flag: 'wx' });
  try {
    linkSync(draft, path);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
  } finally {
    rmSync(draft, { force: true });
  }
  return readFileSync(path, 'utf8').trim();
}

function readSecret(path: string): string | null {
  try {
    const secret = readFileSync(path, 'utf8').trim();
    if (secret.length < 32) return null;
    chmodSync(path, 0o600);
    return secret;
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null;
    throw error;
  }
}
