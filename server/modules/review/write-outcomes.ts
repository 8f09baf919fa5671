import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';

/** Appends what lines have come to, each with the next number of its line. */
export async function writeOutcomes(
  em: EntityManager,
  options: {
    lines: readonly { id: string; recordId: string; revisionId: string; state: string }[];
    actorId: string;
    reason: string | null;
  },
): Promise<void> {
  await run(
    em,
    `insert into outcomes (revision_id, line_id, record_id, seq, outcome, reason, actor_id)
     select n."revisionId", n.id, n."recordId",
       coalesce((select max(o.seq) from outcomes o where o.line_id = n.id), 0) + 1, n.state, $2, $3
     from jsonb_to_recordset($1::jsonb) as n(id uuid, "recordId" uuid, "revisionId" uuid, state text)`,
    [JSON.stringify(options.lines), options.reason, options.actorId],
  );
}
