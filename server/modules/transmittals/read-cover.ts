import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import type { ContentSummary } from './content-digest.ts';
import type { Cover } from './write-cover.ts';

export type TransmittalHead = {
  id: string;
  number: string;
  revision: number;
  title: string;
  scope: Readonly<Record<string, unknown>>;
  requested_by: string | null;
};

/** What the cover of an as-built says. */
export async function readCover(
  em: EntityManager,
  { head, summary }: { head: TransmittalHead; summary: ContentSummary },
): Promise<Cover> {
  const facts = await row<{ owner: string; issued_by: string; nonconforming: number; issued_at: string }>(
    em,
    `select coalesce((select name from organisations where kind = 'owner' order by created_at limit 1), '') as owner,
       coalesce((select name from users where id = $2), '') as issued_by, now() as issued_at,
       (select count(*)::int from transmittal_items i join register_versions v on v.id = i.version_id
        where i.transmittal_id = $1 and v.nonconforming) as nonconforming`,
    [head.id, head.requested_by],
  );
  const standards = await rows<{ n: number }>(
    em,
    `select distinct s.n from transmittal_items i join register_versions v on v.id = i.version_id
     join records r on r.id = v.record_id join standard_versions s on s.id = r.standard_id
     where i.transmittal_id = $1 order by 1`,
    [head.id],
  );
  const names = await namesIn(em, head.scope);
  return {
    owner: facts?.owner ?? '',
    number: head.number,
    revision: head.revision,
    title: head.title,
    scope: scopeText(head.scope, names),
    issuedBy: facts?.issued_by ?? '',
    issuedAt: facts?.issued_at ?? '',
    standards: standards.map(({ n }) => n),
    counts: summary.counts,
    nonconforming: facts?.nonconforming ?? 0,
    digest: summary.digest,
  };
}

type Names = ReadonlyMap<string, string>;

/** Work orders and contractors stand in a filter by id; the cover names them. */
async function namesIn(em: EntityManager, scope: TransmittalHead['scope']): Promise<Names> {
  const ids = Object.values((scope['filter'] as Record<string, unknown> | undefined) ?? {});
  const found = await rows<{ id: string; name: string }>(
    em,
    `select id::text, number || ', ' || title as name from work_orders where id::text = any($1)
     union all select id::text, name from organisations where id::text = any($1)`,
    [ids],
  );
  return new Map(found.map(({ id, name }) => [id, name]));
}

function scopeText(scope: TransmittalHead['scope'], names: Names): string {
  const { recordNumbers, filter } = scope;
  if (Array.isArray(recordNumbers))
    return recordNumbers.slice(0, 40).join(', ') + (recordNumbers.length > 40 ? ' …' : '');
  if (!filter || typeof filter !== 'object') return 'every current record of the work order';
  const parts = Object.entries(filter).map(
    ([name, value]) => `${name}: ${names.get(String(value)) ?? String(value)}`,
  );
  return parts.join('; ') || 'the whole register';
}
