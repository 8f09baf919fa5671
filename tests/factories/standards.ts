import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';

export type PublishedStandard = { id: string; n: number };

/** A published version of the construction standard, the demo's unless `body` is given. Two engineers are due. */
export async function createStandard(
  em: EntityManager,
  options: { authorId: string; approverId: string; effectiveOn?: string; body?: object },
): Promise<PublishedStandard> {
  const made = await row<PublishedStandard>(
    em,
    `insert into standard_versions (n, title, effective_on, body, state, author_id, approver_id, published_at)
     select coalesce(max(n), 0) + 1, $1, $2, $3, 'published', $4, $5, now() from standard_versions returning id, n`,
    [
      DEMO_STANDARD.name,
      options.effectiveOn ?? '2020-01-01',
      JSON.stringify(options.body ?? DEMO_STANDARD),
      options.authorId,
      options.approverId,
    ],
  );
  if (made === null) throw new Error('The standard was not made.');
  return made;
}
