import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { conflict, notFound, stale } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { readStandard } from './standard-select.ts';

type Draft = {
  id: string;
  state: string;
  author_id: string | null;
  effective_on: string;
  version: number;
  past: boolean;
};

/**
 * A second engineer puts a draft into force from its day on. It is frozen from then on and never judges work of days
 * before it was published.
 * @throws Problem 404; 409 for one's own draft, a day already taken or already past; 412
 */
export async function publishStandard(
  em: EntityManager,
  options: { n: number; version: number; actor: Actor },
): Promise<void> {
  const { n, actor } = options;
  await em.transactional(async (tx) => {
    const draft = await row<Draft>(
      tx,
      `select id, state, author_id, effective_on, version, effective_on < current_date as past
       from standard_versions where n = $1 for update`,
      [n],
    );
    if (!draft) throw notFound();
    if (draft.version !== options.version) throw stale(await readStandard(tx, n, actor));
    if (draft.state === 'published')
      throw conflict('standard.published', `Version ${n} is in force already.`);
    if (draft.author_id === actor.id)
      throw conflict(
        'standard.own-draft',
        'A standard is published by another engineer than the one who drafted it.',
      );
    if (draft.past)
      throw conflict(
        'standard.day-past',
        'Its first day has passed: a standard never judges work done before it was published.',
      );
    const taken = await row(
      tx,
      `select 1 from standard_versions where state = 'published' and effective_on = $1`,
      [draft.effective_on],
    );
    if (taken) throw conflict('standard.day-taken', 'Another version takes effect on the same day.');
    await run(
      tx,
      `update standard_versions set state = 'published', approver_id = $2, published_at = now(), version = version + 1 where id = $1`,
      [draft.id, actor.id],
    );
    await appendTrail(tx, {
      actor,
      action: 'standard.published',
      subject: { type: 'standard', id: draft.id, label: `Standard ${n}` },
      payload: { n, effectiveOn: draft.effective_on },
    });
  });
}
