import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { openNextRevision } from './open-next-revision.ts';
import type { ChangedLine } from './refresh-line-states.ts';
import { writeOutcomes } from './write-outcomes.ts';

/**
 * After a review has closed a line may still change: its concession is answered, or it was reopened. What it has come to
 * is logged at once, and what comes back goes to the contractor's next revision.
 */
export async function settleLines(
  em: EntityManager,
  options: {
    batchId: string;
    lines: readonly ChangedLine[];
    actor: Actor;
    reason: string | null;
    dueOn?: string | null;
  },
): Promise<void> {
  const { batchId, actor, reason } = options;
  const settled = options.lines.filter((line) => line.state !== 'undecided' && line.state !== line.before);
  if (settled.length === 0) return;
  await writeOutcomes(em, { lines: settled, actorId: actor.id, reason });
  await run(em, 'update batches set version = version + 1 where id = $1', [batchId]);
  if (settled.some((line) => line.state === 'returned'))
    await openNextRevision(em, { batchId, dueOn: options.dueOn ?? null });
}
