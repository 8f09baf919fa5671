import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRows } from '#server/db/insert-rows.ts';
import type { Placing } from './place-photos.ts';
import type { StartedRun } from './start-run.ts';

/** Writes where photographs came to lie, as further rows: who looks back sees where they lay before. */
export async function storePlacing(
  em: EntityManager,
  options: { started: StartedRun; placing: Placing; lineIds: ReadonlyMap<string, string> },
): Promise<void> {
  const { started, placing, lineIds } = options;
  const list = placing.changes.flatMap(({ photo, place }) => {
    const lineId = place === null ? null : lineIds.get(place.lineKey);
    // The line could not be judged at all (no standard): the photograph waits where it is.
    if (lineId === undefined) return [];
    return [
      {
        photo_id: photo.id,
        revision_id: started.revisionId,
        seq: photo.seq + 1,
        line_id: lineId,
        view: place?.view ?? null,
        method: place?.method ?? photo.method ?? 'name',
        removed: place === null,
      },
    ];
  });
  await insertRows(em, 'photo_matches', list);
}
