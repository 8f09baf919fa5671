import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import { stale } from '#server/http/problem.ts';
import { readFinding } from '#server/modules/records/read-finding.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { decideFinding as decide, type DecisionRequest } from '#shared/review/finding-decision.ts';
import { acceptedDecision } from './accepted-decision.ts';
import { ensureDeciding } from './ensure-deciding.ts';
import { lockFinding, type LockedFinding } from './lock-finding.ts';
import { ownerToday } from './owner-today.ts';
import { refreshLineStates } from './refresh-line-states.ts';
import { settleLines } from './settle-lines.ts';

type Options = { findingId: string; version: number; actor: Actor; ability: Ability };

/**
 * The inspector's word on one finding.
 * @throws Problem 404; 409 when another holds the batch; 412 with the newer state; 422 from the state machine
 */
export async function decideFinding(
  em: EntityManager,
  options: Options & { request: DecisionRequest },
): Promise<void> {
  await em.transactional(async (tx) => {
    const finding = await lockForDeciding(tx, options);
    const decision = acceptedDecision(
      decide(finding, options.request, await ownerToday(tx, finding.work_order_id)),
    );
    await writeDecision(tx, { finding, actor: options.actor, ...decision });
    await appendTrail(tx, {
      actor: options.actor,
      action: decision.decision === 'approve' ? 'finding.approved' : 'finding.rejected',
      subject: { type: 'finding', id: finding.id, label: labelOf(finding) },
      payload: { batch: finding.batch_number, revision: finding.revision_n, code: finding.code, ...decision },
    });
    await afterDecision(tx, {
      finding,
      actor: options.actor,
      reason: decision.reason,
      dueOn: decision.dueOn,
    });
  });
}

/** Takes the newest decision back while the review is open. Repeating it changes nothing. */
export async function undoFindingDecision(em: EntityManager, options: Options): Promise<void> {
  await em.transactional(async (tx) => {
    const finding = await lockForDeciding(tx, options);
    if (finding.state === 'undecided') return;
    await writeDecision(tx, { finding, actor: options.actor, decision: 'undo' });
    if (finding.state === 'concession-asked') await withdrawConcession(tx, finding, options.actor);
    await appendTrail(tx, {
      actor: options.actor,
      action: 'finding.decision-undone',
      subject: { type: 'finding', id: finding.id, label: labelOf(finding) },
      payload: {
        batch: finding.batch_number,
        revision: finding.revision_n,
        code: finding.code,
        was: finding.state,
      },
    });
    await afterDecision(tx, { finding, actor: options.actor, reason: null });
  });
}

export async function lockForDeciding(em: EntityManager, options: Options): Promise<LockedFinding> {
  const finding = await lockFinding(em, options.findingId);
  ensureDeciding(finding, options.actor);
  if (finding.version !== options.version)
    throw stale(await readFinding(em, { id: finding.id, actor: options.actor, ability: options.ability }));
  return finding;
}

export async function writeDecision(
  em: EntityManager,
  options: {
    finding: Pick<LockedFinding, 'id' | 'revision_id' | 'version'>;
    actor: Actor;
    decision: 'approve' | 'reject' | 'hold' | 'undo';
    grounds?: string | null;
    action?: string | null;
    dueOn?: string | null;
    reason?: string | null;
    concessionId?: string | null;
  },
): Promise<void> {
  const { finding, actor, decision } = options;
  await run(
    em,
    `insert into decisions (finding_id, revision_id, seq, decision, grounds, action, due_on, reason, concession_id, actor_id)
     values ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10)`,
    [
      finding.id,
      finding.revision_id,
      finding.version + 1,
      decision,
      options.grounds ?? null,
      options.action ?? null,
      options.dueOn ?? null,
      options.reason ?? null,
      options.concessionId ?? null,
      actor.id,
    ],
  );
}

/** The line follows its findings; the batch shows that it was worked on. */
export async function afterDecision(
  em: EntityManager,
  options: { finding: LockedFinding; actor: Actor; reason: string | null; dueOn?: string | null },
): Promise<void> {
  const { finding, actor, reason } = options;
  await run(em, 'update revisions set worked_at = now(), version = version + 1 where id = $1', [
    finding.revision_id,
  ]);
  if (!finding.line_id) return;
  const lines = await refreshLineStates(em, [finding.line_id]);
  if (finding.revision_status === 'decided')
    await settleLines(em, { batchId: finding.batch_id, lines, actor, reason, dueOn: options.dueOn });
}

/** A concession that nothing waits for any longer is withdrawn; one that covers other findings goes on. */
async function withdrawConcession(em: EntityManager, finding: LockedFinding, actor: Actor): Promise<void> {
  await run(
    em,
    `insert into concession_events (concession_id, seq, type, actor_id)
     select c.id, c.version + 1, 'withdrawn', $2 from concession_current c
     join concession_findings f on f.concession_id = c.id
     where f.finding_id = $1 and c.state = 'asked' and not exists (
       select 1 from concession_findings other join finding_states s on s.finding_id = other.finding_id
       where other.concession_id = c.id and s.state = 'held'
     )`,
    [finding.id, actor.id],
  );
}

const labelOf = (finding: LockedFinding): string =>
  [finding.structure_number, finding.code].filter(Boolean).join(' ');
