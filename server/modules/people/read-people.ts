import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import { notFound } from '#server/http/problem.ts';
import type { Ability, Role } from '#shared/permissions/ability.ts';
import type { Person } from '#shared/generated/api-types.ts';

type PersonRow = {
  id: string;
  email: string;
  name: string;
  role: Role;
  org_id: string;
  org_name: string;
  org_kind: 'owner' | 'contractor';
  active: boolean;
  invited: boolean;
  last_sign_in_at: string | null;
  version: number;
  sort_name: string;
};
export type PeopleQuery = PageQuery & { q?: string; role?: Role; organisation?: string; active?: boolean };

const SELECT = `
  select u.id, u.email, u.name, u.role, u.active, u.version, u.last_sign_in_at, lower(u.name) as sort_name,
    u.password_hash is null as invited, o.id as org_id, o.name as org_name, o.kind as org_kind
  from users u join organisations o on o.id = u.org_id`;

export function presentPerson(person: PersonRow, ability: Ability): Person {
  const { id, email, name, role, active, invited, version } = person;
  return {
    id,
    email,
    name,
    role,
    organisation: { id: person.org_id, name: person.org_name, kind: person.org_kind },
    active,
    invited,
    lastSignInAt: person.last_sign_in_at,
    version,
    can: ability.can('update', 'Person') ? ['update', ...(invited && active ? ['invite'] : [])] : [],
  };
}

/** @throws Problem 404 */
export async function readPerson(em: EntityManager, id: string, ability: Ability): Promise<Person> {
  const found = await row<PersonRow>(em, `${SELECT} where u.id = $1`, [id]);
  if (!found) throw notFound();
  return presentPerson(found, ability);
}

/** By name; the total is of the whole filter. */
export async function listPeople(
  em: EntityManager,
  query: PeopleQuery,
  ability: Ability,
): Promise<Page<Person>> {
  const { limit, after } = parsePage(query, ['string', 'uuid']);
  const filter = `
    ($1::text is null or strpos(lower(u.name), lower($1)) > 0 or strpos(lower(u.email), lower($1)) > 0)
    and ($2::text is null or u.role = $2) and ($3::uuid is null or u.org_id = $3) and ($4::boolean is null or u.active = $4)`;
  const values = [query.q ?? null, query.role ?? null, query.organisation ?? null, query.active ?? null];
  const counted = await row<{ n: number }>(em, `select count(*) as n from users u where ${filter}`, values);
  const found = await rows<PersonRow>(
    em,
    `${SELECT} where ${filter} and ($5::text is null or (lower(u.name), u.id) > ($5, $6::uuid))
     order by lower(u.name), u.id limit $7`,
    [...values, after?.[0] ?? null, after?.[1] ?? null, limit + 1],
  );
  return toPage({
    rows: found,
    limit,
    total: counted?.n ?? 0,
    key: (person) => [person.sort_name, person.id],
    item: (person) => presentPerson(person, ability),
  });
}
