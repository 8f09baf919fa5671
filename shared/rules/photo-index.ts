import { byText } from '#shared/records/canonical.ts';
import { structureKey } from '#shared/records/structure-key.ts';
import type { CheckContext, PhotoFact } from './types.ts';

/** A photograph where it lies: on a line of this batch, or on a structure elsewhere. */
export type PlacedPhoto = {
  readonly sha256: string;
  readonly view: string;
  readonly phash: string | null;
  /** Structure key. */
  readonly structure: string;
  /** The contractor's own, so that it may be told. */
  readonly own: boolean;
  /** Number of another batch; null for this one. */
  readonly batch: string | null;
};

const bySha = new WeakMap<CheckContext, ReadonlyMap<string, readonly PlacedPhoto[]>>();

/** `kind|STRUCTURE|occurrence` without its ends. */
const structureOf = (lineKey: string): string =>
  lineKey.slice(lineKey.indexOf('|') + 1, lineKey.lastIndexOf('|'));

const inBatch = (photos: CheckContext['photos']): PlacedPhoto[] =>
  [...(photos ?? [])].flatMap(([key, facts]) =>
    facts.map(({ sha256, view, facts: measured }: PhotoFact) => ({
      sha256,
      view,
      phash: measured?.phash ?? null,
      structure: structureOf(key),
      own: true,
      batch: null,
    })),
  );

/** Every photograph that the context knows, this batch's first. */
export const allPhotos = (context: CheckContext): readonly PlacedPhoto[] => [
  ...inBatch(context.photos),
  ...(context.otherPhotos ?? []).map(({ structureNumber, ...photo }) => ({
    ...photo,
    structure: structureKey(structureNumber),
  })),
];

/** Photographs by their bytes; made once for a context, so that a check stays linear in its photographs. */
export const photosBySha = (context: CheckContext): ReadonlyMap<string, readonly PlacedPhoto[]> => {
  const before = bySha.get(context);
  if (before) return before;
  const index = new Map<string, PlacedPhoto[]>();
  for (const photo of allPhotos(context)) {
    const same = index.get(photo.sha256);
    if (same) same.push(photo);
    else index.set(photo.sha256, [photo]);
  }
  bySha.set(context, index);
  return index;
};

/** What may be told of the other photograph: to the contractor where it is its own, else to the owner alone. */
export const tellOther = (other: PlacedPhoto) => {
  const told = { other: other.structure, ...(other.batch === null ? {} : { otherBatch: other.batch }) };
  return other.own ? { params: told, ownerParams: {} } : { params: {}, ownerParams: told };
};

/** Own photographs first, then by structure and batch: the order of a query has no say in what is told. */
export const byTelling = (a: PlacedPhoto, b: PlacedPhoto): number =>
  Number(b.own) - Number(a.own) || byText(a.structure, b.structure) || byText(a.batch ?? '', b.batch ?? '');
