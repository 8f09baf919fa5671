import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '#shared/permissions/ability.ts';
import { canonicalJson } from '#server/trail/canonical-json.ts';
import { run } from '#server/db/rows.ts';

export type TrailEntry = {
  /** Null: the system itself (a job). */
  readonly actor: Pick<Actor, 'id' | 'name' | 'role'> | null;
  /** Verb in the past tense with its subject, like `batch.submitted`. */
  readonly action: string;
  readonly subject: { readonly type: string; readonly id: string; readonly label?: string };
  readonly payload?: Readonly<Record<string, unknown>>;
};

/**
 * Tells the trail, in em's transaction. The entry gets its place in the chain when that transaction commits, so that the
 * chain's lock is held for an instant only; a transaction that is rolled back leaves nothing.
 */
export async function appendTrail(em: EntityManager, entry: TrailEntry): Promise<void> {
  await run(
    em,
    `insert into trail_staged (actor_id, actor_name, actor_role, action, subject_type, subject_id, subject_label, payload_text)
     values ($1, $2, $3, $4, $5, $6, $7, $8)`,
    [
      entry.actor?.id ?? null,
      entry.actor?.name ?? null,
      entry.actor?.role ?? null,
      entry.action,
      entry.subject.type,
      entry.subject.id,
      entry.subject.label ?? null,
      canonicalJson(entry.payload ?? {}),
    ],
  );
}
