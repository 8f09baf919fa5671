import { forbidden } from '#server/http/problem.ts';
import type { Ability, Action, SubjectName } from '#shared/permissions/ability.ts';
import { contractorScope } from '#shared/permissions/contractor-scope.ts';

/**
 * The contractor whose rows may be touched, null for everybody's: the parameter of `($n::uuid is null or contractor_id = $n)`.
 * @throws Problem 403 where the role has no such right at all
 */
export function contractorWall(ability: Ability, action: Action, name: SubjectName): string | null {
  const scope = contractorScope(ability, action, name);
  if (!scope) throw forbidden();
  return scope.contractorId;
}
