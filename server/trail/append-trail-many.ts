import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRows } from '#server/db/insert-rows.ts';
import type { TrailEntry } from './append-trail.ts';
import { canonicalJson } from './canonical-json.ts';

/** As appendTrail, for the many lines of one step: they are chained in the order given. */
export async function appendTrailMany(em: EntityManager, entries: readonly TrailEntry[]): Promise<void> {
  await insertRows(
    em,
    'trail_staged',
    entries.map((entry) => ({
      actor_id: entry.actor?.id ?? null,
      actor_name: entry.actor?.name ?? null,
      actor_role: entry.actor?.role ?? null,
      action: entry.action,
      subject_type: entry.subject.type,
      subject_id: entry.subject.id,
      subject_label: entry.subject.label ?? null,
      payload_text: canonicalJson(entry.payload ?? {}),
    })),
  );
}
