import type { MikroORM } from '@mikro-orm/postgresql';
import pg from 'pg';
import { createOrm } from '#server/db/orm.ts';
import { cloneDatabase, type TestDatabase } from './clone-database.ts';

export type DataHarness = {
  readonly database: TestDatabase;
  /** On the application's role. */
  readonly orm: MikroORM;
  /** As the owner of the tables: for tampering, which the application cannot. */
  readonly owner: pg.Client;
  close(): Promise<void>;
};

/** A database of its own and no server. */
export async function createDataHarness(): Promise<DataHarness> {
  const database = await cloneDatabase();
  const orm = await createOrm(database.appUrl);
  const owner = new pg.Client({ connectionString: database.ownerUrl });
  await owner.connect();
  return {
    database,
    orm,
    owner,
    close: async () => {
      await orm.close(true);
      await owner.end();
      await database.drop();
    },
  };
}
