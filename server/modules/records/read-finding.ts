import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { notFound } from '#server/http/problem.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { FINDING_SELECT, type FindingDbRow } from './finding-select.ts';
import { presentFinding } from './present-finding.ts';

/**
 * One finding as this person sees it; the owner's people see none of a draft.
 * @throws Problem 404 for another contractor's finding as for none
 */
export async function readFinding(
  em: EntityManager,
  options: { id: string; actor: Actor; ability: Ability },
): Promise<FindingRow> {
  const { id, actor, ability } = options;
  const found = await row<FindingDbRow>(
    em,
    `${FINDING_SELECT} where f.id = $1 and ($2::uuid is null or b.contractor_id = $2)
     and ($3::boolean or v.submitted_at is not null)`,
    [id, contractorWall(ability, 'read', 'Finding'), actor.orgKind === 'contractor'],
  );
  if (!found) throw notFound();
  return presentFinding(found, { actor, ability });
}
