import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';

export type PhotoToPlace = {
  readonly id: string;
  readonly fileName: string;
  readonly sha256: string;
  /** The last match, if any; `removed`: taken off by hand or no longer fitting. */
  readonly seq: number;
  readonly lineId: string | null;
  readonly view: string | null;
  readonly method: 'sheet' | 'name' | 'hand' | null;
  readonly removed: boolean;
};

export function loadPhotos(em: EntityManager, batchId: string): Promise<PhotoToPlace[]> {
  return rows<PhotoToPlace>(
    em,
    `select p.id, p.file_name as "fileName", p.sha256, coalesce(m.seq, 0) as seq, m.line_id as "lineId", m.view, m.method,
       coalesce(m.removed, false) as removed
     from photos p
     left join lateral (select * from photo_matches x where x.photo_id = p.id order by x.seq desc limit 1) m on true
     where p.batch_id = $1 order by p.at, p.id`,
    [batchId],
  );
}
