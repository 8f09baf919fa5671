import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import { conflict, problem, stale } from '#server/http/problem.ts';
import { readRecord } from '#server/modules/records/read-record.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { ensureDeciding } from './ensure-deciding.ts';
import { lockRecord, type LockedRecord } from './lock-record.ts';
import { refreshLineStates } from './refresh-line-states.ts';
import { settleLines } from './settle-lines.ts';
import { writeRecordDecisions } from './write-record-decision.ts';

type Options = { recordId: string; version: number; actor: Actor; ability: Ability };
type Request = { decision: 'approve' | 'return'; reason?: string | null };

/**
 * The inspector's word on a line itself: approves one without findings to decide, or returns it whatever its findings.
 * @throws Problem 404; 409 while findings are open or another holds the batch; 412; 422 for a return without a reason
 */
export async function decideRecord(
  em: EntityManager,
  options: Options & { request: Request },
): Promise<void> {
  const { request, actor } = options;
  const reason = request.reason?.trim() || null;
  if (request.decision === 'return' && !reason)
    throw problem(
      422,
      'decision.reason-required',
      'Say why the line is returned, so that the contractor knows what to mend.',
      {
        errors: [
          { pointer: '/reason', code: 'decision.reason-required', detail: 'Say why the line is returned.' },
        ],
      },
    );
  await em.transactional(async (tx) => {
    const record = await lockForDeciding(tx, options);
    if (request.decision === 'approve' && record.open_findings > 0)
      throw conflict(
        'decision.findings-open',
        `${record.open_findings === 1 ? 'One finding of this line is' : `${record.open_findings} findings of this line are`} not decided. Decide them first; the line follows.`,
      );
    await write(tx, { record, actor, decision: request.decision, reason });
  });
}

/** Takes the word on the line back while the review is open. */
export async function undoRecordDecision(em: EntityManager, options: Options): Promise<void> {
  await em.transactional(async (tx) => {
    const record = await lockForDeciding(tx, options);
    if (record.version > 0) await write(tx, { record, actor: options.actor, decision: 'undo', reason: null });
  });
}

async function lockForDeciding(em: EntityManager, options: Options): Promise<LockedRecord> {
  const record = await lockRecord(em, options.recordId);
  if (!record.current)
    throw conflict(
      'decision.superseded',
      'A newer revision of this line has been handed in. Decide that one.',
    );
  ensureDeciding(record, options.actor);
  if (record.version !== options.version)
    throw stale(await readRecord(em, { id: record.id, actor: options.actor, ability: options.ability }));
  return record;
}

const TRAIL = {
  approve: 'record.approved',
  return: 'record.returned',
  undo: 'record.decision-undone',
} as const;

async function write(
  em: EntityManager,
  options: {
    record: LockedRecord;
    actor: Actor;
    decision: 'approve' | 'return' | 'undo';
    reason: string | null;
  },
): Promise<void> {
  const { record, actor, decision, reason } = options;
  await writeRecordDecisions(em, { recordIds: [record.id], decision, reason, actorId: actor.id });
  await run(em, 'update revisions set worked_at = now(), version = version + 1 where id = $1', [
    record.revision_id,
  ]);
  await appendTrail(em, {
    actor,
    action: TRAIL[decision],
    subject: { type: 'record', id: record.id, label: record.structure_number },
    payload: { batch: record.batch_number, revision: record.revision_n, ...(reason ? { reason } : {}) },
  });
  const lines = await refreshLineStates(em, [record.line_id]);
  if (record.revision_status === 'decided')
    await settleLines(em, { batchId: record.batch_id, lines, actor, reason });
}
