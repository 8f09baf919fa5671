import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';

export type RecordDecisionWord = 'approve' | 'return' | 'undo' | 'reopen' | 'refer-back' | 'abandon';

/** Appends decisions on records themselves, each with the next number of its record. */
export async function writeRecordDecisions(
  em: EntityManager,
  options: {
    recordIds: readonly string[];
    decision: RecordDecisionWord;
    reason: string | null;
    actorId: string;
  },
): Promise<void> {
  await run(
    em,
    `insert into decisions (record_id, revision_id, seq, decision, reason, actor_id)
     select r.id, r.revision_id, coalesce((select max(d.seq) from decisions d where d.record_id = r.id), 0) + 1, $2, $3, $4
     from records r where r.id = any($1::uuid[])`,
    [options.recordIds, options.decision, options.reason, options.actorId],
  );
}
