import { useAbility } from '@casl/react';
import type { Ability, Action, SubjectName } from '#shared/permissions/ability.ts';

/** May the signed-in person do this at all? The client only hides by it; the server decides. */
export function useCan(action: Action, name: SubjectName): boolean {
  return useAbility<Ability>().can(action, name);
}
