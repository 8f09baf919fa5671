import { mkdtempSync, readdirSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { readSecrets } from '#scripts/lib/secrets.mjs';
import { loadConfig } from '#server/config/config.ts';

const folders = [1, 2].map(() => mkdtempSync(join(tmpdir(), 'upstand-secrets-')));
const [one = '', other = ''] = folders;
afterAll(() => folders.forEach((folder) => rmSync(folder, { recursive: true, force: true })));

const secretsOf = (dir: string) => {
  const { database, storageKey, demoPassword } = readSecrets(dir);
  const { sessionSecret } = loadConfig({
    DATABASE_URL: 'postgresql://owner@127.0.0.1:5432/upstand',
    AZURE_STORAGE_CONNECTION_STRING: 'UseDevelopmentStorage=true',
    DATA_DIR: dir,
  });
  return { owner: database.owner, app: database.app, storageKey, demoPassword, sessionSecret };
};

describe('secrets of an installation', () => {
  it('are all others in a second one', () => {
    const [mine, theirs] = [secretsOf(one), secretsOf(other)];
    const all = [...Object.values(mine), ...Object.values(theirs)];
    expect(new Set(all).size).toBe(10);
    // 18 random bytes in hexadecimal, 64 and 48 in base 64.
    expect([mine.owner.length, mine.app.length]).toEqual([36, 36]);
    expect(mine.storageKey.length).toBe(88);
    expect(mine.sessionSecret.length).toBe(64);
  });

  it('are kept over a second start', () => {
    expect(secretsOf(one)).toEqual(secretsOf(one));
  });

  it('lie in files that their owner alone reads', () => {
    secretsOf(one);
    const modes = readdirSync(one).map((file) => [file, statSync(join(one, file)).mode & 0o777]);
    expect(Object.fromEntries(modes)).toEqual({ 'secrets.json': 0o600, 'session-secret': 0o600 });
  });
});
