import pg from 'pg';
import { VALUE_TYPES } from '#server/db/value-types.ts';

/** Connections for what runs outside an entity manager: sessions, streams of an export. An idle connection lost is replaced in silence. */
export function createPool(url: string, options: { max?: number; applicationName?: string } = {}): pg.Pool {
  const pool = new pg.Pool({
    connectionString: url,
    max: options.max ?? 10,
    application_name: options.applicationName ?? 'upstand',
    connectionTimeoutMillis: 10_000,
    idleTimeoutMillis: 30_000,
    keepAlive: true,
    types: VALUE_TYPES,
  });
  // Without a listener the loss of an idle connection (a restart of PostgreSQL) would end the process.
  pool.on('error', () => undefined);
  return pool;
}
