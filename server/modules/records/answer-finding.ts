import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { storableText } from '#server/db/storable-text.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { conflict, notFound } from '#server/http/problem.ts';
import { addInput } from '#server/modules/batches/add-input.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';

type Answerable = {
  code: string;
  severity: string;
  structure_number: string | null;
  fingerprint: string;
  batch_id: string;
  batch_number: string;
  n: number;
};

/**
 * The contractor's answer in writing, kept with the open revision. A finding that came back with an earlier revision
 * is answered in the next one.
 * @throws Problem 404; 409 when the batch is handed in, or the finding is a note or of an older revision
 */
export async function answerFinding(
  em: EntityManager,
  options: { findingId: string; text: string; actor: Actor; ability: Ability },
): Promise<void> {
  const { findingId, actor, ability } = options;
  const text = storableText(options.text.trim());
  const wall = contractorWall(ability, 'hand-in', 'Finding');
  await em.transactional(async (tx) => {
    const finding = await row<Answerable>(
      tx,
      `select f.code, f.severity, f.structure_number, f.fingerprint, b.id as batch_id, b.number as batch_number, v.n
       from findings f join revisions v on v.id = f.revision_id join batches b on b.id = v.batch_id
       where f.id = $1 and ($2::uuid is null or b.contractor_id = $2) for update of b`,
      [findingId, wall],
    );
    if (!finding) throw notFound();
    if (finding.severity === 'note')
      throw conflict('finding.note', 'A note is information and needs no answer.');
    const open = await row<{ id: string; n: number; input: number }>(
      tx,
      `select id, n, input from revisions where batch_id = $1 and status in ('draft', 'checking', 'checked') for update`,
      [finding.batch_id],
    );
    if (!open)
      throw conflict('revision.frozen', 'This batch has been submitted; answers can no longer be changed.');
    if (finding.n < open.n - 1)
      throw conflict('finding.older', 'This finding belongs to an older revision. Answer the newest one.');
    await run(
      tx,
      `insert into answers (revision_id, fingerprint, finding_id, seq, text, actor_id)
       values ($1, $2, $3, (
         select coalesce(max(seq), 0) + 1 from answers where revision_id = $1 and fingerprint = $2
       ), $4, $5)`,
      [open.id, finding.fingerprint, findingId, text, actor.id],
    );
    // A revision that came back may be answered alone: its lines are looked at again as they stand.
    if (open.n > 0 && open.input === 0)
      await addInput(
        tx,
        { id: open.id, input: 0, status: 'checking' },
        { kind: 'recheck', actorId: actor.id },
      );
    await appendTrail(tx, {
      actor,
      action: 'finding.answered',
      subject: {
        type: 'finding',
        id: findingId,
        label: [finding.structure_number, finding.code].filter(Boolean).join(' '),
      },
      payload: { batch: finding.batch_number, revision: open.n, code: finding.code, text },
    });
  });
}
