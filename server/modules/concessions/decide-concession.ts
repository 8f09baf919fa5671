import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows, run } from '#server/db/rows.ts';
import { conflict, notFound, problem, stale } from '#server/http/problem.ts';
import { writeDecision } from '#server/modules/review/decide-finding.ts';
import { ownerToday } from '#server/modules/review/owner-today.ts';
import { refreshLineStates } from '#server/modules/review/refresh-line-states.ts';
import { requireReason } from '#server/modules/review/require-reason.ts';
import { settleLines } from '#server/modules/review/settle-lines.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import type { RevisionStatus } from '#shared/review/states.ts';
import { mailConcessionAnswered } from './mail-concession.ts';
import { readConcession } from './read-concession.ts';

export type ConcessionAnswer = {
  decision: 'grant' | 'refuse';
  reason: string;
  condition?: string | null;
  endsOn?: string | null;
};
type LockedConcession = {
  id: string;
  number: string;
  state: string;
  version: number;
  revision_id: string;
  revision_status: RevisionStatus;
  batch_id: string;
  work_order_id: string;
};
/** After a refusal the contractor has this long, unless somebody says otherwise; the owner's habit, a demo value. */
const REWORK_DAYS = 14;

/**
 * An engineer accepts as built what does not conform, or refuses to. A condition becomes an open action. Refused after
 * the review closed, the finding is rejected and its line goes back for rework; while it is open the inspector decides.
 * @throws Problem 404; 409 when already answered; 412 stale; 422 naming the field
 */
export async function decideConcession(
  em: EntityManager,
  options: {
    concessionId: string;
    version: number;
    answer: ConcessionAnswer;
    actor: Actor;
    ability: Ability;
  },
): Promise<void> {
  const { concessionId, actor, ability, answer } = options;
  const reason = requireReason(answer.reason);
  const condition = answer.condition?.trim() || null;
  await em.transactional(async (tx) => {
    const concession = await lockConcession(tx, concessionId);
    if (concession.version !== options.version)
      throw stale(await readConcession(tx, { id: concessionId, actor, ability }));
    if (concession.state !== 'asked')
      throw conflict(
        'concession.answered',
        `Concession ${concession.number} is ${concession.state} already.`,
      );
    await checkEnd(tx, concession, answer.endsOn ?? null);
    const granted = answer.decision === 'grant';
    await run(
      tx,
      `insert into concession_events (concession_id, seq, type, reason, condition, ends_on, actor_id)
       values ($1, $2, $3, $4, $5, $6, $7)`,
      [
        concession.id,
        concession.version + 1,
        granted ? 'granted' : 'refused',
        reason,
        granted ? condition : null,
        granted ? (answer.endsOn ?? null) : null,
        actor.id,
      ],
    );
    if (granted && condition)
      await openCondition(tx, { concession, condition, dueOn: answer.endsOn ?? null });
    await appendTrail(tx, {
      actor,
      action: granted ? 'concession.granted' : 'concession.refused',
      subject: { type: 'concession', id: concession.id, label: concession.number },
      payload: { reason, ...(granted ? { condition, endsOn: answer.endsOn ?? null } : {}) },
    });
    await decideFindings(tx, { concession, granted, reason, actor });
    await mailConcessionAnswered(tx, { concessionId: concession.id, actor });
  });
}

async function lockConcession(em: EntityManager, id: string): Promise<LockedConcession> {
  const batch = await row(
    em,
    `select b.id from batches b join revisions v on v.batch_id = b.id join concessions c on c.revision_id = v.id
     where c.id = $1 for update of b`,
    [id],
  );
  const found = await row<LockedConcession>(
    em,
    `select c.id, c.number, c.state, c.version, c.revision_id, v.status as revision_status, v.batch_id, c.work_order_id
     from concession_current c join revisions v on v.id = c.revision_id where c.id = $1`,
    [id],
  );
  if (!batch || !found) throw notFound();
  return found;
}

async function checkEnd(
  em: EntityManager,
  concession: LockedConcession,
  endsOn: string | null,
): Promise<void> {
  if (endsOn === null || endsOn >= (await ownerToday(em, concession.work_order_id))) return;
  throw problem(422, 'concession.end-past', 'The day has already passed. Choose today or a later day.', {
    errors: [{ pointer: '/endsOn', code: 'endsOn.past', detail: 'Choose today or a later day.' }],
  });
}

async function openCondition(
  em: EntityManager,
  options: { concession: LockedConcession; condition: string; dueOn: string | null },
): Promise<void> {
  await run(
    em,
    `insert into actions (concession_id, type, text, owner_org_id, due_on)
     select c.id, 'condition', $2, c.contractor_id, $3 from concessions c where c.id = $1`,
    [options.concession.id, options.condition, options.dueOn],
  );
}

/** The findings still held by this concession are decided by its answer, and their lines follow. */
async function decideFindings(
  em: EntityManager,
  options: { concession: LockedConcession; granted: boolean; reason: string; actor: Actor },
): Promise<void> {
  const { concession, granted, reason, actor } = options;
  const held = await rows<{ id: string; line_id: string | null; version: number; due_on: string }>(
    em,
    `select s.finding_id as id, s.line_id, s.version,
       to_char((now() at time zone w.zone)::date + $2::int, 'YYYY-MM-DD') as due_on
     from concession_findings f join finding_states s on s.finding_id = f.finding_id and s.state = 'held'
     join work_orders w on w.id = s.work_order_id
     where f.concession_id = $1 order by s.finding_id`,
    [concession.id, REWORK_DAYS],
  );
  const closed = concession.revision_status !== 'in-review';
  for (const { id, version, due_on: dueOn } of held) {
    const finding = { id, version, revision_id: concession.revision_id };
    if (granted)
      await writeDecision(em, {
        finding,
        actor,
        decision: 'approve',
        grounds: 'concession',
        concessionId: concession.id,
        reason,
      });
    else if (closed) await rejectForRework(em, { finding, actor, reason, dueOn, concession });
    else await writeDecision(em, { finding, actor, decision: 'undo', reason });
  }
  const lineIds = [...new Set(held.flatMap(({ line_id: id }) => (id === null ? [] : [id])))];
  const lines = await refreshLineStates(em, lineIds);
  await run(em, 'update revisions set version = version + 1 where id = $1', [concession.revision_id]);
  if (closed)
    await settleLines(em, {
      batchId: concession.batch_id,
      lines,
      actor,
      reason,
      dueOn: held[0]?.due_on ?? null,
    });
}

async function rejectForRework(
  em: EntityManager,
  options: {
    finding: { id: string; version: number; revision_id: string };
    actor: Actor;
    reason: string;
    dueOn: string;
    concession: LockedConcession;
  },
): Promise<void> {
  const { finding, actor, reason, dueOn } = options;
  await writeDecision(em, { finding, actor, decision: 'reject', action: 'rework', dueOn, reason });
  await run(
    em,
    `insert into actions (finding_id, type, text, owner_org_id, due_on)
     select $1, 'rework', $2, c.contractor_id, $3 from concessions c where c.id = $4`,
    [finding.id, reason, dueOn, options.concession.id],
  );
}
