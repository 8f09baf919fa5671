import type { MikroORM } from '@mikro-orm/postgresql';
import type { Pool } from 'pg';
import type { Logger } from 'pino';
import type { Config } from '#server/config/config.ts';
import { createOrm } from '#server/db/orm.ts';
import { createPool } from '#server/db/pool.ts';
import { createLog } from '#server/http/create-log.ts';
import { createQueue, type Queue } from '#server/jobs/create-queue.ts';
import { createBlobStore, type BlobStore } from '#server/storage/blob-store.ts';

/** What handlers and jobs work with; one a process. */
export type Services = {
  readonly config: Config;
  readonly orm: MikroORM;
  /** on the application's role, for what runs outside an entity manager */
  readonly pool: Pool;
  readonly blobs: BlobStore;
  readonly queue: Queue;
  readonly log: Logger;
  close(): Promise<void>;
};

/**
 * Connects to the stores.
 * @throws when one cannot be reached; what was opened before is closed
 */
export async function createServices(config: Config): Promise<Services> {
  const log = createLog(config.logLevel);
  const opened: (() => Promise<unknown>)[] = [];
  const close = async (): Promise<void> => {
    for (const shut of opened.splice(0).toReversed()) await shut();
  };
  try {
    const pool = createPool(config.databaseAppUrl, { applicationName: 'upstand-web' });
    opened.push(() => pool.end());
    const orm = await createOrm(config.databaseAppUrl);
    opened.push(() => orm.close(true));
    const blobs = await createBlobStore(config.storageConnectionString);
    const queue = createQueue({ databaseUrl: config.databaseAppUrl, pool, log });
    opened.push(() => queue.close());
    return { config, orm, pool, blobs, queue, log, close };
  } catch (error) {
    await close();
    throw error;
  }
}
