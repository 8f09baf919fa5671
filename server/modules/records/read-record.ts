import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { notFound } from '#server/http/problem.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { presentRecord } from './present-record.ts';
import { RECORD_SELECT, type RecordDbRow } from './record-select.ts';

/**
 * One line's record as this person sees it; the owner's people see none of a draft.
 * @throws Problem 404 for another contractor's record as for none
 */
export async function readRecord(
  em: EntityManager,
  options: { id: string; actor: Actor; ability: Ability },
): Promise<RecordRow> {
  const { id, actor, ability } = options;
  const found = await row<RecordDbRow>(
    em,
    `${RECORD_SELECT} where r.id = $1 and ($2::uuid is null or r.contractor_id = $2)
     and ($3::boolean or v.submitted_at is not null)`,
    [id, contractorWall(ability, 'read', 'Record'), actor.orgKind === 'contractor'],
  );
  if (!found) throw notFound();
  return presentRecord(found, { actor, ability });
}
