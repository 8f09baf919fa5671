import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { problem, type ProblemError } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { StandardDraftBody } from '#shared/generated/api-types.ts';
import { validateStandard } from '#shared/generated/validators.mjs';
import type { Actor } from '#shared/permissions/ability.ts';

/**
 * Drafts the next version of the standard.
 * @returns its number
 * @throws Problem 422 with a pointer for each part of the body that the standard's schema refuses
 */
export async function draftStandard(
  em: EntityManager,
  options: { draft: StandardDraftBody; actor: Actor },
): Promise<number> {
  const { draft, actor } = options;
  const errors = faultsOf(draft.body);
  if (errors.length > 0)
    throw problem(422, 'standard.invalid', 'The standard is not complete. Nothing was kept.', { errors });
  return em.transactional(async (tx) => {
    // Numbers follow one another: two drafts at once wait for each other here.
    await rows(tx, `select pg_advisory_xact_lock(hashtext('standard_versions'))`);
    const made = await row<{ id: string; n: number }>(
      tx,
      `insert into standard_versions (n, title, effective_on, body, author_id, note)
       select coalesce(max(n), 0) + 1, $1, $2, $3, $4, $5 from standard_versions returning id, n`,
      [draft.title ?? '', draft.effectiveOn, JSON.stringify(draft.body), actor.id, draft.note ?? null],
    );
    if (!made) throw new Error('The new version has no number.');
    await appendTrail(tx, {
      actor,
      action: 'standard.drafted',
      subject: { type: 'standard', id: made.id, label: `Standard ${made.n}` },
      payload: { n: made.n, effectiveOn: draft.effectiveOn },
    });
    return made.n;
  });
}

function faultsOf(body: unknown): ProblemError[] {
  return validateStandard(body)
    .slice(0, 50)
    .map((fault) => ({
      pointer: `/body/${(fault.field ?? '').replaceAll('.', '/')}`,
      code: `standard.${fault.keyword}`,
      detail: `${fault.field ?? 'The body'} does not fit the schema of a standard (${fault.keyword}).`,
    }));
}
