import { fileURLToPath } from 'node:url';
import { defineConfig } from '@mikro-orm/postgresql';
import { Migrator } from '@mikro-orm/migrations';
import { MIGRATIONS } from '#server/db/migrations-list.ts';
import { Batch, Line, Revision } from '#server/modules/batches/entity.ts';
import { Lot } from '#server/modules/lots/entity.ts';
import { Organisation } from '#server/modules/organisations/entity.ts';
import { User } from '#server/modules/people/entity.ts';
import { FoamProduct } from '#server/modules/products/entity.ts';
import { OpenAction } from '#server/modules/review/entity.ts';
import { StandardVersion } from '#server/modules/standard/entity.ts';
import { Transmittal } from '#server/modules/transmittals/entity.ts';
import { Structure, WorkOrder } from '#server/modules/work-orders/entity.ts';

export const ENTITIES = [
  Organisation,
  User,
  WorkOrder,
  Structure,
  FoamProduct,
  Lot,
  StandardVersion,
  Batch,
  Revision,
  Line,
  OpenAction,
  Transmittal,
];

export type OrmOptions = {
  max?: number;
  applicationName?: string;
  /** Reads and writes migrations/snapshot-upstand.json: for making and checking migrations, never for running them. */
  snapshot?: boolean;
};

/** Entities cover the mutable aggregates; append-only tables are written and read by SQL. */
export function ormOptions(url: string, options: OrmOptions = {}) {
  return defineConfig({
    clientUrl: url,
    entities: ENTITIES,
    extensions: [Migrator],
    forceUtcTimezone: true,
    pool: { min: 0, max: options.max ?? 10 },
    driverOptions: {
      connection: {
        // Whole, for what else it says: sslmode, options.
        connectionString: url,
        application_name: options.applicationName ?? 'upstand',
        connectionTimeoutMillis: 10_000,
        keepAlive: true,
        // A process that hangs in a transaction must not hold its locks for ever.
        idle_in_transaction_session_timeout: 5 * 60_000,
      },
    },
    // A query through the shared manager would mix what two requests have loaded.
    allowGlobalContext: false,
    migrations: {
      path: fileURLToPath(new URL('../../migrations', import.meta.url)),
      migrationsList: MIGRATIONS,
      snapshot: options.snapshot ?? false,
      snapshotName: 'snapshot-upstand',
      tableName: 'mikro_orm_migrations',
      allOrNothing: true,
      silent: true,
    },
  });
}
