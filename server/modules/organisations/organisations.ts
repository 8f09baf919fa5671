import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import { conflict } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { Organisation } from '#shared/generated/api-types.ts';

type OrganisationRow = Organisation & { sort_name: string };

const SELECT = `
  select o.id, o.kind, o.name, o.version, lower(o.name) as sort_name,
    (select count(*) from users u where u.org_id = o.id and u.active) as people
  from organisations o`;

function present({ id, kind, name, people, version }: OrganisationRow): Organisation {
  return { id, name, kind, people, version };
}

/** By name; `people` counts open accounts. */
export async function listOrganisations(em: EntityManager, query: PageQuery): Promise<Page<Organisation>> {
  const { limit, after } = parsePage(query, ['string', 'uuid']);
  const counted = await row<{ n: number }>(em, 'select count(*) as n from organisations');
  const found = await rows<OrganisationRow>(
    em,
    `${SELECT} where $1::text is null or (lower(o.name), o.id) > ($1, $2::uuid) order by lower(o.name), o.id limit $3`,
    [after?.[0] ?? null, after?.[1] ?? null, limit + 1],
  );
  return toPage({
    rows: found,
    limit,
    total: counted?.n ?? 0,
    key: (one) => [one.sort_name, one.id],
    item: present,
  });
}

/** @throws Problem 409 where the name is taken */
export async function addOrganisation(
  em: EntityManager,
  { actor, name }: { actor: Actor; name: string },
): Promise<Organisation> {
  return em.transactional(async (tx) => {
    const made = await row<{ id: string }>(
      tx,
      `insert into organisations (kind, name) values ('contractor', $1) on conflict (name) do nothing returning id`,
      [name.trim()],
    );
    if (!made) {
      const detail = 'An organisation of this name is already here.';
      throw conflict('organisation.name-taken', detail, {
        errors: [{ pointer: '/name', code: 'taken', detail }],
      });
    }
    await appendTrail(tx, {
      actor,
      action: 'organisation.added',
      subject: { type: 'organisation', id: made.id, label: name.trim() },
    });
    const added = await row<OrganisationRow>(tx, `${SELECT} where o.id = $1`, [made.id]);
    return present(added as OrganisationRow);
  });
}
