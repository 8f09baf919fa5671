import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { notFound } from '#server/http/problem.ts';
import type { Concession } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { CONCESSION_SELECT, type ConcessionDbRow } from './concession-select.ts';
import { presentConcession } from './present-concession.ts';

/** @throws Problem 404 for a concession of another contractor's work as for none */
export async function readConcession(
  em: EntityManager,
  options: { id: string; actor: Actor; ability: Ability },
): Promise<Concession> {
  const { id, actor, ability } = options;
  const found = await row<ConcessionDbRow>(
    em,
    `${CONCESSION_SELECT} where c.id = $1 and ($2::uuid is null or c.contractor_id = $2)`,
    [id, contractorWall(ability, 'read', 'Concession')],
  );
  if (!found) throw notFound();
  return presentConcession(found, { actor, ability });
}
