import type { EntityManager } from '@mikro-orm/postgresql';
import { hashPassword } from '#server/auth/hash-password.ts';
import { row } from '#server/db/rows.ts';
import type { Actor, Role } from '#shared/permissions/ability.ts';
import { unique } from './unique.ts';

export const PASSWORD = 'a long sentence of the tests';
let passwordHash: Promise<string> | null = null;

export type Organisation = { id: string; kind: 'owner' | 'contractor'; name: string };

export async function createOrganisation(
  em: EntityManager,
  options: { kind: 'owner' | 'contractor'; name?: string },
): Promise<Organisation> {
  const made = await row<Organisation>(
    em,
    'insert into organisations (kind, name) values ($1, $2) returning id, kind, name',
    [options.kind, options.name ?? `${options.kind} ${unique()}`],
  );
  if (made === null) throw new Error('The organisation was not made.');
  return made;
}

/** Signs in with PASSWORD. */
export async function createPerson(
  em: EntityManager,
  options: { role: Role; orgId: string; active?: boolean },
): Promise<Actor> {
  passwordHash ??= hashPassword(PASSWORD);
  const tag = unique();
  const made = await row<Actor>(
    em,
    `with made as (
       insert into users (org_id, role, email, name, password_hash, active) values ($1, $2, $3, $4, $5, $6) returning *
     ) select made.id, made.email, made.name, made.role, o.id as "orgId", o.kind as "orgKind", o.name as "orgName"
     from made join organisations o on o.id = made.org_id`,
    [
      options.orgId,
      options.role,
      `${options.role}.${tag}@people.example`,
      `${options.role} ${tag}`,
      await passwordHash,
      options.active ?? true,
    ],
  );
  if (made === null) throw new Error('The person was not made.');
  return made;
}
