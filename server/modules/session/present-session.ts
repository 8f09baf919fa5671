import { packRules } from '@casl/ability/extra';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import type { Session } from '#shared/generated/api-types.ts';

/** `abilities` are CASL's packed rules: the client unpacks them and hides what the person may not do. */
export function presentSession(options: { actor: Actor; ability: Ability; csrfToken: string }): Session {
  const { actor, ability, csrfToken } = options;
  const { id, email, name, role, orgId, orgName, orgKind } = actor;
  return {
    user: { id, email, name, role, organisation: { id: orgId, name: orgName, kind: orgKind } },
    abilities: packRules(ability.rules),
    csrfToken,
  };
}
