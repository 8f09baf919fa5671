import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import type { Concession } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { CONCESSION_SELECT, type ConcessionDbRow } from './concession-select.ts';
import { presentConcession } from './present-concession.ts';

/** Concessions, newest first. */
export async function listConcessions(
  em: EntityManager,
  options: { query: PageQuery & { state?: string }; actor: Actor; ability: Ability },
): Promise<Page<Concession>> {
  const { query, actor, ability } = options;
  const { limit, after } = parsePage(query, ['instant', 'uuid']);
  const found = await rows<ConcessionDbRow>(
    em,
    `${CONCESSION_SELECT}
     where ($1::uuid is null or c.contractor_id = $1) and ($2::text is null or c.state = $2)
       and ($3::timestamptz is null or (c.at, c.id) < ($3, $4::uuid))
     order by c.at desc, c.id desc limit $5`,
    [
      contractorWall(ability, 'read', 'Concession'),
      query.state ?? null,
      after?.[0] ?? null,
      after?.[1] ?? null,
      limit + 1,
    ],
  );
  return toPage({
    rows: found,
    limit,
    key: (row) => [row.at, row.id],
    item: (row) => presentConcession(row, { actor, ability }),
  });
}
