import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { notFound } from '#server/http/problem.ts';
import type { StandardVersion } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';

export type StandardDbRow = {
  id: string;
  n: number;
  title: string;
  state: 'draft' | 'published';
  effective_on: string;
  body: Record<string, unknown>;
  note: string | null;
  author_id: string | null;
  author: string | null;
  approver: string | null;
  published_at: string | null;
  version: number;
};

export const STANDARD_SELECT = `
select s.id, s.n, s.title, s.state, s.effective_on, s.body, s.note, s.author_id, a.name as author, p.name as approver, s.published_at, s.version
from standard_versions s left join users a on a.id = s.author_id left join users p on p.id = s.approver_id`;

/** A version of the standard on the wire. A draft is published by another engineer than its author. */
export function presentStandard(item: StandardDbRow, actor: Actor): StandardVersion {
  const engineer = actor.role === 'engineer' && item.state === 'draft';
  const can = !engineer ? [] : item.author_id === actor.id ? ['change'] : ['publish'];
  return {
    id: item.id,
    n: item.n,
    title: item.title,
    state: item.state,
    effectiveOn: item.effective_on,
    body: item.body,
    note: item.note,
    author: item.author ?? '',
    approver: item.approver,
    publishedAt: item.published_at,
    version: item.version,
    can,
  };
}

/** Drafts are the owner's own business: a contractor sees what is published. */
export async function readStandard(em: EntityManager, n: number, actor: Actor): Promise<StandardVersion> {
  const found = await row<StandardDbRow>(em, `${STANDARD_SELECT} where s.n = $1`, [n]);
  if (!found || (found.state === 'draft' && actor.orgKind === 'contractor')) throw notFound();
  return presentStandard(found, actor);
}
