import pg from 'pg';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { migrationFaults } from '#server/db/check-migrations.ts';
import { MIGRATIONS } from '#server/db/migrations-list.ts';
import { migrate } from '#server/db/migrate.ts';
import { databaseUrl } from '#tests/setup/database-url.ts';

const name = `migrations_${process.pid}`;
const url = () => databaseUrl(inject('services').ownerUrl, name);

async function onServer(sql: string): Promise<void> {
  const client = new pg.Client({ connectionString: inject('services').ownerUrl });
  await client.connect();
  await client.query(sql);
  await client.end();
}

beforeAll(() => onServer(`create database ${name}`));
afterAll(() => onServer(`drop database ${name} with (force)`));

it('two processes that start at once both end with a migrated database', async () => {
  const ran = await Promise.all([migrate(url()), migrate(url())]);
  expect(ran.map((names) => names.length).toSorted((a, b) => a - b)).toEqual([0, MIGRATIONS.length]);
});

it('migrations, snapshot, entities and database agree', async () => {
  expect(await migrationFaults(url())).toEqual([]);
});
