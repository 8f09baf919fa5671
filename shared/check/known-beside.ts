import { kindKey, lineKey, structureKey } from '#shared/records/structure-key.ts';
import type { Kind } from '#shared/records/types.ts';
import type {
  CheckContext,
  ContextPart,
  EarlierFailure,
  LotUse,
  NeighbourFact,
  OtherPhoto,
  PhotoFact,
} from '#shared/rules/types.ts';

type OfLine = {
  readonly kind: Kind;
  readonly structureNumber: string;
  /** 1 unless said. */
  readonly occurrence?: number;
};

/**
 * What is known beside a workbook's lines, as lists that a file or a message can carry. A part that is left out is not
 * known, and the rules that need it are skipped. `own`: put there by the batch's own contractor, as is what does not say.
 */
export type KnownBeside = {
  readonly lotUse?: readonly LotUse[];
  readonly neighbours?: readonly (Omit<NeighbourFact, 'own'> & { readonly own?: boolean })[];
  readonly register?: readonly {
    readonly structureKey: string;
    readonly recordNumber: string;
    readonly own?: boolean;
  }[];
  /** Photographs of the batch, each on its line. */
  readonly photos?: readonly (OfLine & PhotoFact)[];
  /** Of other batches. */
  readonly otherPhotos?: readonly OtherPhoto[];
  /** What rules found at earlier checks, each on its line. */
  readonly previous?: readonly (OfLine & EarlierFailure)[];
  /** Lines that stand from an earlier revision. */
  readonly siblings?: readonly Omit<OfLine, 'occurrence'>[];
  /** Parts of which only the contractor's own is here; the rules on them are said to have run on that alone. */
  readonly ownOnly?: readonly ContextPart[];
};

const byLine = <T>(list: readonly (OfLine & T)[]): ReadonlyMap<string, readonly (OfLine & T)[]> => {
  const map = new Map<string, (OfLine & T)[]>();
  for (const one of list) {
    const key = lineKey(one.kind, one.structureNumber, one.occurrence ?? 1);
    const held = map.get(key);
    if (held) held.push(one);
    else map.set(key, [one]);
  }
  return map;
};

type Part = 'lotUse' | 'neighbours' | 'register' | 'photos' | 'otherPhotos' | 'previous' | 'siblings';

/** The same as a check takes it. */
export const contextBeside = (
  data: KnownBeside,
): Pick<CheckContext, Part> & { readonly ownOnly: readonly ContextPart[] } => ({
  lotUse: data.lotUse ?? null,
  neighbours: data.neighbours?.map((one) => ({ own: true, ...one })) ?? null,
  register: data.register
    ? new Map(
        data.register.map(({ structureKey: key, recordNumber, own = true }) => [
          structureKey(key),
          { recordNumber, own },
        ]),
      )
    : null,
  photos: data.photos ? byLine(data.photos) : null,
  otherPhotos: data.otherPhotos ?? null,
  previous: data.previous ? byLine(data.previous) : null,
  siblings: data.siblings
    ? new Set(data.siblings.map(({ kind, structureNumber }) => kindKey(kind, structureNumber)))
    : null,
  ownOnly: data.ownOnly ?? [],
});
