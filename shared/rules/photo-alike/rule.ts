import { structureKey } from '#shared/records/structure-key.ts';
import { viewWord } from '#shared/records/photo-views.ts';
import { say } from '#shared/findings/say.ts';
import { bandsOf, bitsApart, hashBits } from '../hash-bands.ts';
import { numberOf, paramsSchema } from '../params.ts';
import { allPhotos, byTelling, tellOther, type PlacedPhoto } from '../photo-index.ts';
import { photoPart } from '../photo-part.ts';
import type { CheckContext, FindingDraft, LineRule, PhotoFact } from '../types.ts';

const schema = paramsSchema({
  greatestBits: {
    type: 'number',
    title: 'Greatest number of bits in which two hashes are alike',
    'x-unit': 'count',
    default: 6,
    minimum: 0,
    maximum: 16,
  },
});
/** Kit labels look alike by nature. */
const EXEMPT = 'kits';

type Hashed = PlacedPhoto & { readonly bits: string };
type Index = { readonly greatest: number; readonly bands: ReadonlyMap<string, readonly Hashed[]> };
const made = new WeakMap<CheckContext, Index>();

const indexOf = (context: CheckContext, greatest: number): Index['bands'] => {
  const before = made.get(context);
  if (before?.greatest === greatest) return before.bands;
  const bands = new Map<string, Hashed[]>();
  for (const photo of allPhotos(context)) {
    const bits = photo.view === EXEMPT ? null : hashBits(photo.phash);
    if (bits === null) continue;
    for (const band of bandsOf(bits, greatest)) {
      const held = bands.get(band);
      if (held) held.push({ ...photo, bits });
      else bands.set(band, [{ ...photo, bits }]);
    }
  }
  made.set(context, { greatest, bands });
  return bands;
};

const nearest = (
  photo: PhotoFact,
  { own, bands, greatest }: { own: string; bands: Index['bands']; greatest: number },
): { readonly other: Hashed; readonly apart: number } | null => {
  const bits = photo.view === EXEMPT ? null : hashBits(photo.facts?.phash ?? null);
  if (bits === null) return null;
  const found = bandsOf(bits, greatest).flatMap((band) => bands.get(band) ?? []);
  const near = found
    // The same bytes are the matter of `photo-reused`.
    .filter((other) => other.structure !== own && other.sha256 !== photo.sha256)
    .map((other) => ({ other, apart: bitsApart(bits, other.bits) }))
    .filter(({ apart }) => apart <= greatest)
    .toSorted((a, b) => a.apart - b.apart || byTelling(a.other, b.other));
  return near[0] ?? null;
};

export const photoAlike: LineRule = {
  code: 'photo-alike',
  title: 'Photograph alike',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'query',
  field: 'structureNumber',
  needs: ['photos', 'otherPhotos'],
  paramsSchema: schema,
  check: (line, params, context) => {
    const greatest = numberOf(params, schema, 'greatestBits');
    const bands = indexOf(context, greatest);
    const own = structureKey(line.structureNumber);
    return (line.photos ?? []).flatMap((photo): FindingDraft[] => {
      const near = nearest(photo, { own, bands, greatest });
      if (!near) return [];
      const { params: told, ownerParams } = tellOther(near.other);
      return [
        {
          part: photoPart(photo),
          measured: photo.fileName,
          limit: null,
          margin: null,
          unit: null,
          params: { view: photo.view, bits: near.apart, greatest, ...told },
          ownerParams,
        },
      ];
    });
  },
  message: ({ measured, params, ownerParams }) => {
    const other = params['other'] ?? ownerParams['other'];
    const whose = other === undefined ? 'another structure' : `structure ${say(other, null)}`;
    return `The photograph ${say(measured, null)} (${viewWord(String(params['view']))}) looks like one of ${whose}: their picture hashes differ in ${say(params['bits'], 'count')} of 64 bits.`;
  },
  remedy: () => 'Look at both. If it shows this structure, say so; if not, hand in the one taken here.',
};
