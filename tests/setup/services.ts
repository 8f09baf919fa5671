import { rmSync } from 'node:fs';
import path from 'node:path';
import pg from 'pg';
import type { TestProject } from 'vitest/node';
import { startAzurite } from '#scripts/lib/azurite.mjs';
import { startPostgres } from '#scripts/lib/postgres.mjs';
import { tempFolder } from '#scripts/lib/temp-folder.mjs';
import { migrate } from '#server/db/migrate.ts';
import { databaseUrl } from './database-url.ts';

export type TestServices = {
  /** Signs in as the owner; its database is never used itself. */
  readonly ownerUrl: string;
  /** Signs in as the application's role. */
  readonly appUrl: string;
  readonly storage: string;
  /** Migrated once; each test file works on a copy of it. */
  readonly template: string;
};

declare module 'vitest' {
  interface ProvidedContext {
    services: TestServices;
  }
}

/** A cluster and a blob store of the tests' own: those that the runner of all tests started, else new ones. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const stops: (() => Promise<unknown>)[] = [];
  const stop = async () => {
    for (const each of stops.splice(0).toReversed()) await each();
  };
  try {
    const { ownerUrl, appUrl, storage } = givenServices() ?? (await ownServices(stops));
    const template = `template_${project.name}_${process.pid}`.replaceAll(/\W/g, '_');
    await onServer(ownerUrl, `create database ${template}`);
    stops.push(() => onServer(ownerUrl, `drop database if exists ${template} with (force)`));
    await migrate(databaseUrl(ownerUrl, template));
    project.provide('services', { ownerUrl, appUrl, storage, template });
    return stop;
  } catch (error) {
    await stop();
    throw error;
  }
}

function givenServices() {
  const { TEST_DATABASE_URL: ownerUrl, TEST_DATABASE_APP_URL: appUrl, TEST_STORAGE: storage } = process.env;
  return ownerUrl && appUrl && storage ? { ownerUrl, appUrl, storage } : null;
}

async function ownServices(stops: (() => Promise<unknown>)[]) {
  const folder = tempFolder('upstand-vitest-');
  stops.push(async () => rmSync(folder, { recursive: true, force: true }));
  const cluster = await startPostgres({ dir: path.join(folder, 'pg'), durable: false });
  stops.push(() => cluster.stop());
  const blobs = await startAzurite({ dir: path.join(folder, 'blobs') });
  stops.push(() => blobs.stop());
  return { ownerUrl: cluster.url, appUrl: cluster.appUrl, storage: blobs.connectionString };
}

async function onServer(url: string, sql: string): Promise<void> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    await client.query(sql);
  } finally {
    await client.end();
  }
}
