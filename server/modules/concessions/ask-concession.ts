import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { stale } from '#server/http/problem.ts';
import { readFinding } from '#server/modules/records/read-finding.ts';
import { acceptedDecision } from '#server/modules/review/accepted-decision.ts';
import { afterDecision, writeDecision } from '#server/modules/review/decide-finding.ts';
import { ensureDeciding } from '#server/modules/review/ensure-deciding.ts';
import { lockFinding } from '#server/modules/review/lock-finding.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { askConcession as ask } from '#shared/review/finding-decision.ts';
import { mailConcessionAsked } from './mail-concession.ts';

/**
 * Asks the engineers to accept a finding as built. The line is held meanwhile and no longer keeps the review from closing.
 * @returns id of the concession
 * @throws Problem 404; 409 when another holds the batch; 412 when `version` is given and stale; 422 without a reason
 */
export async function askConcession(
  em: EntityManager,
  options: { findingId: string; reason: string; version: number | null; actor: Actor; ability: Ability },
): Promise<string> {
  const { findingId, actor, ability } = options;
  return em.transactional(async (tx) => {
    const finding = await lockFinding(tx, findingId);
    ensureDeciding(finding, actor);
    if (options.version !== null && options.version !== finding.version)
      throw stale(await readFinding(tx, { id: findingId, actor, ability }));
    const { reason } = acceptedDecision(ask(finding, options.reason));
    const made = await row<{ id: string; number: string }>(
      tx,
      `insert into concessions (revision_id, contractor_id, work_order_id, asked_by, reason)
       values ($1, $2, $3, $4, $5) returning id, number`,
      [finding.revision_id, finding.contractor_id, finding.work_order_id, actor.id, reason],
    );
    if (!made) throw new Error('The new concession has no id.');
    await run(tx, 'insert into concession_findings (concession_id, finding_id) values ($1, $2)', [
      made.id,
      finding.id,
    ]);
    await run(
      tx,
      `insert into concession_events (concession_id, seq, type, reason, actor_id) values ($1, 1, 'asked', $2, $3)`,
      [made.id, reason, actor.id],
    );
    await writeDecision(tx, { finding, actor, decision: 'hold', concessionId: made.id, reason });
    await appendTrail(tx, {
      actor,
      action: 'concession.asked',
      subject: { type: 'concession', id: made.id, label: made.number },
      payload: {
        batch: finding.batch_number,
        structure: finding.structure_number,
        code: finding.code,
        reason,
      },
    });
    await afterDecision(tx, { finding, actor, reason });
    await mailConcessionAsked(tx, { concessionId: made.id, actor });
    return made.id;
  });
}
