import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import type { TrailEntry } from '#shared/generated/api-types.ts';
import { actionTitle } from '#shared/trail/action-title.ts';

export type TrailQuery = PageQuery & {
  /** `type:id`, e.g. `batch:<uuid>`, or a type alone */
  subject?: string;
  actor?: string;
  action?: string;
  from?: string;
  to?: string;
  q?: string;
};
type TrailDbRow = {
  seq: number;
  at: string;
  actor_name: string | null;
  actor_role: string | null;
  action: string;
  subject_type: string;
  subject_id: string;
  subject_label: string | null;
  payload_text: string;
  hash: string;
};

/** Who did what when, newest first. */
export async function listTrail(em: EntityManager, query: TrailQuery): Promise<Page<TrailEntry>> {
  const { limit, after } = parsePage(query, ['number']);
  const [type, id] = (query.subject ?? '').split(':');
  const where = `
    ($1::text is null or subject_type = $1) and ($2::text is null or subject_id = $2)
    and ($3::uuid is null or actor_id = $3) and ($4::text is null or action = $4)
    and ($5::date is null or at >= $5::date) and ($6::date is null or at < $6::date + 1)
    and ($7::text is null or subject_label ilike $7)`;
  const like = query.q?.replaceAll(/[\\%_]/g, String.raw`\$&`).concat('%');
  const values = [type || null, id || null, query.actor, query.action, query.from, query.to, like].map(
    (value) => value ?? null,
  );
  const found = await rows<TrailDbRow>(
    em,
    `select seq, at, actor_name, actor_role, action, subject_type, subject_id, subject_label, payload_text, hash
     from trail where ${where} and ($8::bigint is null or seq < $8) order by seq desc limit $9`,
    [...values, after?.[0] ?? null, limit + 1],
  );
  const total = after
    ? null
    : await row<{ n: number }>(em, `select count(*)::int as n from trail where ${where}`, values);
  return toPage({ rows: found, limit, total: total?.n ?? null, key: (entry) => [entry.seq], item: present });
}

function present(entry: TrailDbRow): TrailEntry {
  return {
    seq: entry.seq,
    at: entry.at,
    actor: entry.actor_name,
    role: entry.actor_role,
    action: entry.action,
    title: actionTitle(entry.action),
    subject: { type: entry.subject_type, id: entry.subject_id, label: entry.subject_label },
    payload: JSON.parse(entry.payload_text) as Record<string, unknown>,
    hash: entry.hash,
  };
}
