import {
  matchByName,
  nameIndex,
  squash,
  type NamedLine,
  type NameIndex,
} from '#server/modules/photos/match-by-name.ts';
import { VIEWS, VIEWS_OF_KIND } from '#shared/records/photo-views.ts';
import { occurrences } from '#shared/records/occurrences.ts';
import { lineKey, structureKey } from '#shared/records/structure-key.ts';
import type { SourceBatch } from '#shared/records/types.ts';
import type { PhotoFact } from '#shared/rules/types.ts';
import type { KnownLines } from './load-lines.ts';
import type { PhotoToPlace } from './load-photos.ts';

export type Place = {
  readonly lineKey: string;
  readonly view: string;
  readonly method: 'sheet' | 'name' | 'hand';
};
export type Placing = {
  /** By line key, for the rules. */
  readonly byLine: ReadonlyMap<string, readonly PhotoFact[]>;
  /** What differs from the last match and is to be written: null takes it off its line. */
  readonly changes: readonly { readonly photo: PhotoToPlace; readonly place: Place | null }[];
};

/**
 * Each photograph to a line: where a person put it, else by the Photos sheet, else by its file name, else nowhere. What
 * lies on a line of an earlier revision that stands is left there.
 */
export function placePhotos(options: {
  photos: readonly PhotoToPlace[];
  source: SourceBatch;
  known: KnownLines;
}): Placing {
  const { photos, source, known } = options;
  const lines = namedLines(source);
  const byName = nameIndex(lines);
  const bySheet = sheetPlaces(source, lines);
  const byLine = new Map<string, PhotoFact[]>();
  const changes: { photo: PhotoToPlace; place: Place | null }[] = [];
  for (const photo of photos) {
    const before = placeBefore(photo, known);
    const stays = photo.method === 'hand' || (before !== null && isStanding(before.lineKey, known));
    const place = stays ? before : (bySheet.get(nameKey(photo.fileName)) ?? placeByName(photo, byName));
    if (!stays && !samePlace(before, place)) changes.push({ photo, place });
    if (!place) continue;
    const { id, fileName, sha256, facts } = photo;
    const fact = { id, fileName, sha256, view: place.view, facts };
    byLine.set(place.lineKey, [...(byLine.get(place.lineKey) ?? []), fact]);
  }
  return { byLine, changes };
}

function namedLines(source: SourceBatch): NamedLine[] {
  const numbers = occurrences(source.lines);
  return source.lines.map((line) => {
    const occurrence = numbers.get(line) ?? 1;
    return {
      lineId: lineKey(line.kind, line.structureNumber, occurrence),
      kind: line.kind,
      structureNumber: line.structureNumber,
      occurrence,
    };
  });
}

function sheetPlaces(source: SourceBatch, lines: readonly NamedLine[]): ReadonlyMap<string, Place> {
  const places = new Map<string, Place>();
  const first = new Map<string, NamedLine[]>();
  for (const line of lines) {
    if (line.occurrence > 1) continue;
    const key = structureKey(line.structureNumber);
    first.set(key, [...(first.get(key) ?? []), line]);
  }
  for (const { values } of source.photos) {
    const { fileName, structureNumber, view } = values;
    if (typeof fileName !== 'string' || typeof view !== 'string' || !VIEWS.includes(view)) continue;
    const candidates = first.get(structureKey(structureNumber)) ?? [];
    const line = candidates.find((one) => VIEWS_OF_KIND[one.kind].includes(view)) ?? candidates[0];
    if (line) places.set(nameKey(fileName), { lineKey: line.lineId, view, method: 'sheet' });
  }
  return places;
}

function placeByName(photo: PhotoToPlace, lines: NameIndex): Place | null {
  const match = matchByName(photo.fileName, lines);
  return match && { lineKey: match.lineId, view: match.view, method: 'name' };
}

function placeBefore(photo: PhotoToPlace, known: KnownLines): Place | null {
  const key = photo.lineId === null ? undefined : known.keyById.get(photo.lineId);
  if (photo.removed || key === undefined || photo.view === null || photo.method === null) return null;
  return { lineKey: key, view: photo.view, method: photo.method };
}

const isStanding = (key: string, known: KnownLines): boolean =>
  known.standing.has(key.slice(0, key.lastIndexOf('|')));

const samePlace = (a: Place | null, b: Place | null): boolean =>
  a?.lineKey === b?.lineKey && a?.view === b?.view && a?.method === b?.method;

/** A file is the same whatever folder, case, ending or separators its name was written with. */
const nameKey = (fileName: string): string =>
  squash((fileName.split(/[\\/]/u).at(-1) ?? '').replace(/\.[^.]*$/u, ''));
