import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { notFound } from '#server/http/problem.ts';
import type { RegisterRow } from '#shared/generated/api-types.ts';
import type { Ability } from '#shared/permissions/ability.ts';
import { presentRegister } from './present-register.ts';
import { REGISTER_COLUMNS, REGISTER_FROM, type RegisterDbRow } from './register-select.ts';

/**
 * Every version of one record number, newest first. A contractor sees the versions that came from their own work.
 * @throws Problem 404
 */
export async function readVersions(
  em: EntityManager,
  options: { recordNumber: string; ability: Ability },
): Promise<RegisterRow[]> {
  const found = await rows<RegisterDbRow>(
    em,
    `select ${REGISTER_COLUMNS} ${REGISTER_FROM}
     where v.record_number = $1 and ($2::uuid is null or v.contractor_id = $2) order by v.n desc`,
    [options.recordNumber, contractorWall(options.ability, 'read', 'RegisterEntry')],
  );
  if (found.length === 0) throw notFound();
  return found.map(presentRegister);
}
