import { randomInt } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { newAccountKey } from './azurite.mjs';
import { newPasswords } from './postgres.mjs';

const WORDS =
  'amber auger birch brace cedar clamp copper crane ferry flint gravel hazel heron kestrel lantern ledger maple meadow orchard otter pebble plumb quarry ridge river saddle sorrel spruce thistle timber walnut willow'.split(
    ' ',
  );

/**
 * The secrets of this installation, made at the first start and kept in its data folder, readable by its owner only.
 * @returns {{database: {owner: string, app: string}, storageKey: string, demoPassword: string}}
 */
export function readSecrets(dir) {
  const file = path.join(dir, 'secrets.json');
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const secrets = {
    database: newPasswords(),
    storageKey: newAccountKey(),
    demoPassword: newDemoPassword(),
  };
  const half = `${file}.${process.pid}`;
  writeFileSync(half, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
  renameSync(half, file);
  return secrets;
}

/** Three words and four digits: to be typed by a person, on a server that listens on loopback. */
export function newDemoPassword() {
  const words = Array.from({ length: 3 }, () => WORDS[randomInt(WORDS.length)]);
  return `${words.join('-')}-${randomInt(1000, 10_000)}`;
}
