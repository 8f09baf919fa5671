import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import { conflict } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { lockRecord } from './lock-record.ts';
import { requireReason } from './require-reason.ts';
import { writeOutcomes } from './write-outcomes.ts';
import { writeRecordDecisions } from './write-record-decision.ts';

type Word = 'reopen' | 'refer-back' | 'abandon';
const RULES = {
  reopen: {
    from: 'approved',
    to: 'undecided',
    outcome: 'reopened',
    trail: 'record.reopened',
    refusal: 'Only an approved line that is not yet on record can be reopened.',
  },
  'refer-back': {
    from: 'approved',
    to: 'undecided',
    outcome: 'referred-back',
    trail: 'record.referred-back',
    refusal: 'Only an approved line that is not yet on record can be referred back.',
  },
  abandon: {
    from: 'returned',
    to: 'abandoned',
    outcome: 'abandoned',
    trail: 'record.abandoned',
    refusal: 'Only a returned line that has not come back can be abandoned.',
  },
} as const;

/**
 * After a review has closed: an inspector reopens an approved line, a clerk refers it back, an administrator gives a
 * returned one up. Each says why; nothing is overwritten.
 * @throws Problem 404; 409 when the line is in another state; 422 without a reason
 */
export async function moveDecidedLine(
  em: EntityManager,
  options: { recordId: string; word: Word; reason: string; actor: Actor },
): Promise<void> {
  const { recordId, word, actor } = options;
  const rule = RULES[word];
  const reason = requireReason(options.reason);
  await em.transactional(async (tx) => {
    const record = await lockRecord(tx, recordId);
    if (
      !record.current ||
      record.line_state !== rule.from ||
      !['decided', 'on-record'].includes(record.revision_status)
    )
      throw conflict(`line.not-${rule.from}`, rule.refusal);
    await writeRecordDecisions(tx, { recordIds: [record.id], decision: word, reason, actorId: actor.id });
    await run(tx, 'update lines set state = $2, version = version + 1 where id = $1', [
      record.line_id,
      rule.to,
    ]);
    await run(tx, 'update revisions set version = version + 1 where id = $1', [record.revision_id]);
    await writeOutcomes(tx, {
      lines: [
        { id: record.line_id, recordId: record.id, revisionId: record.revision_id, state: rule.outcome },
      ],
      actorId: actor.id,
      reason,
    });
    await appendTrail(tx, {
      actor,
      action: rule.trail,
      subject: { type: 'record', id: record.id, label: record.structure_number },
      payload: { batch: record.batch_number, revision: record.revision_n, reason },
    });
  });
}
