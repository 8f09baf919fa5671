import { createHash } from 'node:crypto';
import { chownSync, mkdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import { StartProblem } from './problem.mjs';

/**
 * The account that the cluster runs as: PostgreSQL refuses to run as root, so root hands it to `postgres`.
 * @returns {{uid: number, gid: number} | null} null: as ourselves
 */
export function clusterAccount() {
  if (process.getuid?.() !== 0) return null;
  const entry = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((line) => line.startsWith('postgres:'));
  const [, , uid, gid] = entry?.split(':') ?? [];
  if (!uid || !gid) {
    throw new StartProblem(
      'PostgreSQL refuses to run as root, and there is no account `postgres` to run it as.',
      'Start as an ordinary user, or make the account with: adduser --system --group postgres',
    );
  }
  return { uid: Number(uid), gid: Number(gid) };
}

/**
 * Where the cluster of a data folder lies. Below a folder that the account cannot enter (root's home, say) it lies
 * in a folder under /var/lib named by the data folder's path, so that it is found again.
 * @param {string} dir absolute
 * @param {{uid: number, gid: number} | null} account
 */
export function clusterFolder(dir, account) {
  if (!account || canEnter(dir, account)) return dir;
  const tag = createHash('sha256').update(dir).digest('hex').slice(0, 10);
  return path.join('/var/lib', `upstand-${tag}`);
}

/** Whether an account may pass through every folder above `dir`. Folders that do not exist yet will be made by us. */
export function canEnter(dir, { uid, gid }) {
  for (let folder = path.dirname(dir); ; folder = path.dirname(folder)) {
    const stat = statSync(folder, { throwIfNoEntry: false });
    if (stat && !mayPass(stat, { uid, gid })) return false;
    if (folder === path.dirname(folder)) return true;
  }
}

/** The execute bit that counts for this account: the owner's, the group's or the others'. */
export function mayPass(stat, { uid, gid }) {
  if (stat.uid === uid) return (stat.mode & 0o100) !== 0;
  if (stat.gid === gid) return (stat.mode & 0o010) !== 0;
  return (stat.mode & 0o001) !== 0;
}

/** Makes a folder that only the account may enter. */
export function makeFolder(dir, account) {
  mkdirSync(path.dirname(dir), { recursive: true });
  mkdirSync(dir, { recursive: true, mode: 0o700 });
  if (account) chownSync(dir, account.uid, account.gid);
}
