import { KINDS, type Kind } from '#shared/records/types.ts';
import type { CheckContext, DesignFact, PhotoFact, PhotoMeasures } from '#shared/rules/types.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { DEMO_CONTEXT } from './demo-context.ts';
import { CLEAN_LINES } from './testing.ts';

/** For tests: all that a batch of the three clean lines can know beside them, with nothing amiss. */

const NUMBER: Readonly<Record<Kind, string>> = { set: 'S-1', straighten: 'S-2', relevel: 'P-1' };
/** When each kind's crew was at work, and hashes far from each other. */
const TAKEN: Readonly<Record<Kind, Pick<PhotoMeasures, 'takenWall' | 'phash'>>> = {
  set: { takenWall: '2026-04-14T09:50:00', phash: 'ffff00000000ffff' },
  straighten: { takenWall: '2026-04-14T11:30:00', phash: '00ff00ff00ff00ff' },
  relevel: { takenWall: '2026-04-14T13:30:00', phash: '0f0f0f0f0f0f0f0f' },
};

const photo = (kind: Kind, view: string): PhotoFact => ({
  id: `${kind} ${view}`,
  fileName: `${view}.jpg`,
  sha256: `${kind} ${view}`,
  view,
  facts: {
    ...TAKEN[kind],
    takenAtMs: null,
    latitude: Number(CLEAN_LINES[kind]['latitude']),
    longitude: Number(CLEAN_LINES[kind]['longitude']),
    width: 1600,
    height: 1200,
  },
});
const planned = (kind: Kind): DesignFact => ({
  structureNumber: NUMBER[kind],
  kind,
  poleLengthFt: kind === 'set' ? 40 : null,
  poleClass: kind === 'set' ? '4' : null,
  poleMaterial: kind === 'set' ? 'southern-pine' : null,
  embedmentFt: null,
  latitude: Number(CLEAN_LINES[kind]['latitude']),
  longitude: Number(CLEAN_LINES[kind]['longitude']),
});

const PHOTOS = new Map(
  KINDS.map((kind) => [
    `${kind}|${NUMBER[kind]}|1`,
    DEMO_STANDARD.requiredViews[kind].filter((view) => view !== 'water').map((view) => photo(kind, view)),
  ]),
);

/** The photographs with other facts of the set pole's picture `finish`. */
export const photosWith = (facts: Partial<PhotoMeasures>): ReadonlyMap<string, readonly PhotoFact[]> =>
  new Map(
    [...PHOTOS].map(([key, photos]) => [
      key,
      photos.map((one) =>
        one.id === 'set finish' && one.facts ? { ...one, facts: { ...one.facts, ...facts } } : one,
      ),
    ]),
  );

export const FULL_CONTEXT: CheckContext = {
  ...DEMO_CONTEXT,
  asOfMs: Date.UTC(2026, 4, 1),
  lots: [{ product: 'EP-15', number: 'L-100', expiresOn: '2026-04-14', status: 'in-use', history: [] }],
  lotUse: [
    {
      product: 'EP-15',
      number: 'L-100',
      sizes: DEMO_PRODUCT.kitsFt3.map((kitFt3) => ({ kitFt3, received: 10, used: 4, own: 1 })),
    },
  ],
  design: KINDS.map(planned),
  neighbours: [],
  area: 'none',
  register: new Map(),
  photos: PHOTOS,
  otherPhotos: [],
  previous: new Map(),
  siblings: new Set(),
};
