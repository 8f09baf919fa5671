import { readdirSync } from 'node:fs';
import { pathToFileURL } from 'node:url';
import type { MikroORM } from '@mikro-orm/postgresql';
import pg from 'pg';
import { migrate } from '#server/db/migrate.ts';
import { MIGRATIONS } from '#server/db/migrations-list.ts';
import { createOrm } from '#server/db/orm.ts';
import { rows } from '#server/db/rows.ts';

/** The catalogue's names for the types that entities use. */
const TYPE_NAMES: Readonly<Record<string, string>> = {
  int: 'integer',
  'timestamptz(3)': 'timestamp(3) with time zone',
};

/** What is wrong between migrations, snapshot, entities and the database they make; empty when all agree. `databaseUrl` is an empty database. */
export async function migrationFaults(databaseUrl: string): Promise<string[]> {
  const faults: string[] = [];
  const listed = new Set(MIGRATIONS.map((migration) => `${migration.name}.ts`));
  for (const file of readdirSync(new URL('../../migrations', import.meta.url))) {
    if (file.endsWith('.ts') && !listed.has(file))
      faults.push(`migrations/${file} is not in the list of migrations.`);
  }
  await migrate(databaseUrl);
  const orm = await createOrm(databaseUrl, { max: 2, snapshot: true });
  try {
    if (await orm.getMigrator().checkMigrationNeeded()) {
      faults.push(
        'An entity was changed without a migration: migrations/snapshot-upstand.json is not current.',
      );
    }
    faults.push(...(await entityFaults(orm)));
  } finally {
    await orm.close();
  }
  return faults;
}

/** Entities are written by hand beside the SQL: each of their columns must be there, of the same type, and null or not alike. */
async function entityFaults(orm: MikroORM): Promise<string[]> {
  const columns = await rows<{ name: string; type: string; optional: boolean }>(
    orm.em.fork(),
    `select c.relname || '.' || a.attname as name, format_type(a.atttypid, a.atttypmod) as type, not a.attnotnull as optional
     from pg_attribute a join pg_class c on c.oid = a.attrelid join pg_namespace n on n.oid = c.relnamespace
     where n.nspname = 'public' and c.relkind = 'r' and a.attnum > 0 and not a.attisdropped`,
  );
  const known = new Map(columns.map((column) => [column.name, column]));
  const faults: string[] = [];
  for (const meta of Object.values(orm.getMetadata().getAll())) {
    for (const property of Object.values(meta.properties)) {
      const name = `${meta.tableName}.${property.fieldNames[0]}`;
      const declared = property.columnTypes[0] ?? '';
      const type = TYPE_NAMES[declared] ?? declared;
      const found = known.get(name);
      if (found === undefined) faults.push(`${name} is in an entity and not in the database.`);
      else if (found.type !== type)
        faults.push(`${name} is ${found.type} in the database and ${type} in its entity.`);
      else if (found.optional !== (property.nullable ?? false)) {
        faults.push(`${name} may be null in one of database and entity only.`);
      }
    }
  }
  return faults;
}

async function inScratchDatabase(
  serverUrl: string,
  work: (url: string) => Promise<string[]>,
): Promise<string[]> {
  const name = `check_migrations_${process.pid}`;
  const client = new pg.Client({ connectionString: serverUrl });
  await client.connect();
  try {
    await client.query(`create database ${name}`);
    const url = new URL(serverUrl);
    url.pathname = `/${name}`;
    return await work(url.href).finally(() => client.query(`drop database ${name} with (force)`));
  } finally {
    await client.end();
  }
}

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const serverUrl = process.env['TEST_DATABASE_URL'] ?? process.env['DATABASE_URL'];
  if (serverUrl === undefined) {
    console.error('Set DATABASE_URL to a server on which this account may make a database for a moment.');
    process.exit(2);
  }
  const faults = await inScratchDatabase(serverUrl, migrationFaults);
  for (const fault of faults) console.error(fault);
  process.exit(faults.length === 0 ? 0 : 1);
}
