import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { WAITING_BY_ROLE } from '#server/modules/home/waiting-lists.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { Home } from '#shared/generated/api-types.ts';

/** What waits for this person; what does not wait is left out. One statement for all counts. */
export async function waitingFor(em: EntityManager, actor: Actor): Promise<Home['items']> {
  const lines = WAITING_BY_ROLE[actor.role];
  const counts = await row<Record<string, number>>(
    em,
    `with me as (select $1::uuid as id, $2::uuid as org)
     select ${lines.map(({ key, sql }) => `(${sql}) as "${key}"`).join(', ')}`,
    [actor.id, actor.orgId],
  );
  return lines.flatMap(({ key, one, many, detail, to }) => {
    const count = counts?.[key] ?? 0;
    return count > 0 ? [{ key, title: count === 1 ? one : many, detail, count, to }] : [];
  });
}
