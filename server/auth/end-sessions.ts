import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';

/** Signs a person out everywhere: after a new password, another role, a closed account. */
export async function endSessionsOf(em: EntityManager, userId: string): Promise<void> {
  await run(em, `delete from sessions where sess #>> '{passport,user}' = $1`, [userId]);
}
