import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { PHOTO_PIPELINE } from '#server/modules/photos/pipeline.ts';
import type { OtherPhoto, PhotoMeasures } from '#shared/rules/types.ts';

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
  /** Null until it was measured, and for a picture that cannot be read. */
  readonly facts: PhotoMeasures | null;
};

/** Photographs fetched at a time: of a large batch there are tens of thousands. */
const PAGE = 2_000;

/** The photographs of a batch in the order they came, page by page. */
export async function* loadPhotos(
  em: EntityManager,
  batchId: string,
): AsyncGenerator<readonly PhotoToPlace[]> {
  let last: { at: string; id: string } | null = null;
  for (;;) {
    const found: (PhotoToPlace & { at: string })[] = await rows<PhotoToPlace & { at: string }>(
      em,
      `select p.id, p.file_name as "fileName", p.sha256, p.at, coalesce(m.seq, 0) as seq, m.line_id as "lineId", m.view, m.method,
         coalesce(m.removed, false) as removed,
         case when f.sha256 is null or f.problem is not null then null else jsonb_build_object(
           'takenWall', f.taken_wall, 'takenAtMs', floor(extract(epoch from f.taken_at) * 1000)::float8,
           'latitude', f.latitude, 'longitude', f.longitude, 'width', f.width, 'height', f.height, 'phash', f.phash
         ) end as facts
       from photos p
       left join lateral (select * from photo_matches x where x.photo_id = p.id order by x.seq desc limit 1) m on true
       left join photo_facts f on f.sha256 = p.sha256 and f.pipeline = $2
       where p.batch_id = $1 and ($3::timestamptz is null or (p.at, p.id) > ($3::timestamptz, $4::uuid))
       order by p.at, p.id limit $5`,
      [batchId, PHOTO_PIPELINE, last?.at ?? null, last?.id ?? null, PAGE],
    );
    if (found.length > 0) yield found.map(({ at: _at, ...photo }) => photo);
    const end = found.at(-1);
    if (end === undefined || found.length < PAGE) return;
    last = { at: end.at, id: end.id };
  }
}

/**
 * Photographs of other batches that share their bytes, or a piece of their hash, with one of this batch, by the
 * structure they lie on: the contractor's own, and of others what was handed in.
 */
export function loadOtherPhotos(
  em: EntityManager,
  options: { batchId: string; contractorId: string },
): Promise<OtherPhoto[]> {
  return rows<OtherPhoto>(
    em,
    `with mine as (select distinct sha256 from photos where batch_id = $1),
     alike as (
       select sha256 from mine
       union
       select b.sha256 from mine m join photo_bands a on a.sha256 = m.sha256
       join photo_bands b on b.band = a.band and b.value = a.value
     )
     select distinct p.sha256, f.phash, pl.view, l.structure_number as "structureNumber", b.number as batch,
       b.contractor_id = $2 as own
     from alike join photos p on p.sha256 = alike.sha256
     join photo_placed pl on pl.photo_id = p.id
     join lines l on l.id = pl.line_id
     join batches b on b.id = p.batch_id
     join revisions v on v.id = p.revision_id
     left join photo_facts f on f.sha256 = p.sha256 and f.pipeline = $3
     where p.batch_id <> $1 and (b.contractor_id = $2 or v.submitted_at is not null)
     order by p.sha256, b.number, l.structure_number, pl.view`,
    [options.batchId, options.contractorId, PHOTO_PIPELINE],
  );
}
