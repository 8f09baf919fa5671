import type { Placing } from './place-photos.ts';
import type { StartedRun } from './start-run.ts';

/** Rows of `photo_matches`: where photographs came to lie, as further rows, so that who looks back sees where they lay before. */
export function placingRows(options: {
  started: StartedRun;
  placing: Placing;
  lineIds: ReadonlyMap<string, string>;
}): Record<string, unknown>[] {
  const { started, placing, lineIds } = options;
  return placing.changes.flatMap(({ photo, place }) => {
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
}
