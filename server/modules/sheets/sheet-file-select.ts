import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { notFound } from '#server/http/problem.ts';
import type { SheetFile } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { Paper } from './paper.ts';

export type SheetFileRow = {
  id: string;
  batch_id: string;
  paper: Paper;
  state: SheetFile['state'];
  sheets: number;
  done: number;
  pages: number | null;
  sha256: string | null;
  size: number | null;
  file_name: string;
  problem: { detail: string } | null;
  created_at: string;
  finished_at: string | null;
};

/**
 * A file of sheets as the person who asked for it finds it. What a sheet shows differs by who asks, so nobody else does.
 * @throws Problem 404 for anybody else's as for none
 */
export async function readSheetFile(em: EntityManager, id: string, actor: Actor): Promise<SheetFileRow> {
  const found = await row<SheetFileRow>(
    em,
    `select f.id, f.batch_id, f.paper, f.state, f.sheets, f.pages, f.sha256, f.size, f.file_name, f.problem,
       f.created_at, f.finished_at,
       case f.state when 'ready' then f.sheets else coalesce(p.done, 0) end as done
     from sheet_files f left join job_progress p on p.subject = 'sheets:' || f.id
     where f.id = $1 and f.requested_by = $2`,
    [id, actor.id],
  );
  if (!found) throw notFound();
  return found;
}

export function presentSheetFile(file: SheetFileRow): SheetFile {
  return {
    id: file.id,
    batchId: file.batch_id,
    paper: file.paper,
    state: file.state,
    sheets: file.sheets,
    done: file.done,
    pages: file.pages,
    size: file.size,
    requestedAt: file.created_at,
    finishedAt: file.finished_at,
    problem: file.problem?.detail ?? null,
  };
}
