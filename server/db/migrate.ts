import { pathToFileURL } from 'node:url';
import pg from 'pg';
import { grantToApp } from '#server/db/grants.ts';
import { createOrm } from '#server/db/orm.ts';
import { migrateQueues } from '#server/db/queue-schema.ts';

/** Any fixed number: two processes that start at once take turns on it. */
const MIGRATION_LOCK = 5_550_117;

/**
 * Brings a database to this version: migrations, the queue's schema and queues, the rights of the application's role.
 * `databaseUrl` signs in as the owner of the tables. Repeatable, and safe when two start at once. Returns the names of
 * the migrations that ran.
 */
export async function migrate(
  databaseUrl: string,
  options: { appPassword?: string } = {},
): Promise<string[]> {
  const client = new pg.Client({ connectionString: databaseUrl, application_name: 'upstand-migrate' });
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [MIGRATION_LOCK]);
    const orm = await createOrm(databaseUrl, { max: 2, applicationName: 'upstand-migrate' });
    let ran: string[];
    try {
      ran = (await orm.getMigrator().up()).map((migration) => migration.name);
    } finally {
      await orm.close();
    }
    await migrateQueues(databaseUrl);
    await grantToApp(client, options.appPassword);
    return ran;
  } finally {
    await client.end();
  }
}

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const url = process.env['DATABASE_URL'];
  if (url === undefined || url === '') {
    console.error(
      'DATABASE_URL is not set. Set it to the address of the database, signing in as the owner of its tables.',
    );
    process.exit(2);
  }
  try {
    const ran = await migrate(url, { appPassword: process.env['DATABASE_APP_PASSWORD'] });
    console.warn(
      ran.length === 0 ? 'The database is up to date.' : `Ran ${ran.length} migrations: ${ran.join(', ')}.`,
    );
  } catch (error) {
    console.error(
      `The database could not be migrated: ${error instanceof Error ? error.message : String(error)}`,
    );
    process.exit(1);
  }
}
