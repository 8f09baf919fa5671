import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { inject } from 'vitest';
import { databaseUrl } from './database-url.ts';

export type TestDatabase = {
  /** Signs in as the owner of the tables: for looking behind the application's back. */
  readonly ownerUrl: string;
  /** Signs in as the application does. */
  readonly appUrl: string;
  readonly storage: string;
  drop(): Promise<void>;
};

/** A database of the test file's own, copied from the migrated template. */
export async function cloneDatabase(): Promise<TestDatabase> {
  const { ownerUrl, appUrl, storage, template } = inject('services');
  const name = `test_${randomBytes(6).toString('hex')}`;
  const onServer = async (sql: string): Promise<void> => {
    const client = new pg.Client({ connectionString: ownerUrl });
    await client.connect();
    try {
      await client.query(sql);
    } finally {
      await client.end();
    }
  };
  await onServer(`create database ${name} template ${template}`);
  // Rights on the database itself are not copied.
  await onServer(`grant connect on database ${name} to upstand_app`);
  return {
    ownerUrl: databaseUrl(ownerUrl, name),
    appUrl: databaseUrl(appUrl, name),
    storage,
    drop: () => onServer(`drop database if exists ${name} with (force)`),
  };
}
