import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import type { CheckProgress } from '#shared/generated/api-types.ts';

type Found = {
  input: number;
  run_state: CheckProgress['state'] | null;
  run_problem: unknown;
  lines: number | null;
  progress_state: CheckProgress['state'] | null;
  done: number | null;
  total: number | null;
  problem: unknown;
};

/** How far the check of the newest revision's newest input is. Before the first upload there is nothing to wait for: done, none of none. */
export async function readCheck(
  em: EntityManager,
  revision: { id: string; hideProblem: boolean },
): Promise<CheckProgress> {
  const found = await row<Found>(
    em,
    `select v.input, run.state as run_state, run.problem as run_problem, (run.counts ->> 'lines')::int as lines,
       p.state as progress_state, p.done, p.total, p.problem
     from revisions v
     left join lateral (
       select * from check_runs c where c.revision_id = v.id and c.input = v.input order by c.queued_at desc, c.started_at desc nulls last limit 1
     ) run on true
     left join job_progress p on p.subject = 'check:' || v.id
     where v.id = $1`,
    [revision.id],
  );
  if (!found || found.input === 0)
    return { input: 0, state: 'done', stage: null, done: 0, total: 0, problem: null };
  const state =
    found.run_state === 'running' ? 'running' : (found.run_state ?? found.progress_state ?? 'queued');
  const finished = state === 'done' || state === 'failed';
  const total = finished ? (found.lines ?? found.total ?? 0) : (found.total ?? 0);
  return {
    input: found.input,
    state,
    stage: state === 'running' ? (total === 0 ? 'reading' : 'checking') : null,
    done: finished ? total : (found.done ?? 0),
    total,
    problem: revision.hideProblem ? null : (found.run_problem ?? found.problem ?? null),
  };
}
