import { structureKey } from '#shared/records/structure-key.ts';
import { viewWord } from '#shared/records/photo-views.ts';
import { say } from '#shared/findings/say.ts';
import { nearHashes, pictureHash, type NearHashes } from '../near-hashes.ts';
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

type Index = NearHashes & { readonly greatest: number; readonly photos: readonly PlacedPhoto[] };
const made = new WeakMap<CheckContext, Index>();

const indexOf = (context: CheckContext, greatest: number): Index => {
  const before = made.get(context);
  if (before?.greatest === greatest) return before;
  const hashed = allPhotos(context).flatMap((photo) => {
    const hash = photo.view === EXEMPT ? null : pictureHash(photo.phash);
    return hash === null ? [] : [{ photo, hash }];
  });
  const hashes = hashed.map(({ hash }) => hash);
  const index = { greatest, photos: hashed.map(({ photo }) => photo), ...nearHashes(hashes, greatest) };
  made.set(context, index);
  return index;
};

type Near = { readonly other: PlacedPhoto; readonly apart: number };

const nearest = (photo: PhotoFact, own: string, { photos, eachNear }: Index): Near | null => {
  const hash = photo.view === EXEMPT ? null : pictureHash(photo.facts?.phash ?? null);
  if (hash === null) return null;
  const found: Near[] = [];
  eachNear(hash, (place, apart) => {
    const other = photos[place];
    // The same bytes are the matter of `photo-reused`.
    if (other && other.structure !== own && other.sha256 !== photo.sha256) found.push({ other, apart });
  });
  return found.toSorted((a, b) => a.apart - b.apart || byTelling(a.other, b.other))[0] ?? null;
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
    const index = indexOf(context, greatest);
    const own = structureKey(line.structureNumber);
    return (line.photos ?? []).flatMap((photo): FindingDraft[] => {
      const near = nearest(photo, own, index);
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
