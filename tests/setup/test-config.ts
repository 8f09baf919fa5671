import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { freePort } from '#scripts/lib/free-port.mjs';
import { loadConfig, type Config } from '#server/config/config.ts';
import type { TestDatabase } from './clone-database.ts';

/** The settings of a test's own server. `done` takes its folder away. */
export async function testConfig(
  database: TestDatabase,
  settings: Readonly<Record<string, string>> = {},
): Promise<{ config: Config; done: () => void }> {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'upstand-data-'));
  const config = loadConfig({
    DATABASE_URL: database.ownerUrl,
    DATABASE_APP_URL: database.appUrl,
    AZURE_STORAGE_CONNECTION_STRING: database.storage,
    SMTP_URL: `smtp://127.0.0.1:${await freePort()}`,
    CAPTURE_MAIL: 'true',
    PUBLIC_URL: 'http://127.0.0.1:4600',
    SESSION_SECRET: 'for tests alone, and long enough to be taken',
    DATA_DIR: dataDir,
    LOG_LEVEL: 'silent',
    CHECK_REPLIES: 'true',
    ...settings,
  });
  return { config, done: () => rmSync(dataDir, { recursive: true, force: true }) };
}
