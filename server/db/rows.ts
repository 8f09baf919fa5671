import type { EntityManager } from '@mikro-orm/postgresql';
import type { PoolClient, QueryResult, QueryResultRow } from 'pg';
import { VALUE_TYPES } from '#server/db/value-types.ts';

/** What of knex's client is used: the connection of the transaction where there is one, else one of the pool. */
type ConnectionSource = {
  acquireConnection(): Promise<PoolClient>;
  releaseConnection(connection: PoolClient): Promise<void>;
};

async function query<T extends QueryResultRow>(
  em: EntityManager,
  text: string,
  values: readonly unknown[],
): Promise<QueryResult<T>> {
  const transaction = em.getTransactionContext();
  const source = (transaction ?? em.getKnex()).client as ConnectionSource;
  const connection = await source.acquireConnection();
  try {
    return await connection.query<T>({ text, values: [...values], types: VALUE_TYPES });
  } finally {
    if (transaction === undefined) await source.releaseConnection(connection);
  }
}

/** Rows of one statement with `$1` placeholders, inside em's transaction when there is one. Column values as VALUE_TYPES says. */
export async function rows<T extends QueryResultRow>(
  em: EntityManager,
  text: string,
  values: readonly unknown[] = [],
): Promise<T[]> {
  return (await query<T>(em, text, values)).rows;
}

/** The one row of a statement, or null. */
export async function row<T extends QueryResultRow>(
  em: EntityManager,
  text: string,
  values: readonly unknown[] = [],
): Promise<T | null> {
  return (await rows<T>(em, text, values))[0] ?? null;
}

/** Runs a statement and says how many rows it touched. */
export async function run(em: EntityManager, text: string, values: readonly unknown[] = []): Promise<number> {
  return (await query(em, text, values)).rowCount ?? 0;
}
