import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CLEAN_LINES, CLEAN_POURS, batchOf } from '#shared/check/testing.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { ContextRefused, readContext } from './read-context.ts';

/** A context file that tells all that a check can know, and what each part makes of the clean set pole. */

let folder = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'upstand-context-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

const S1 = { kind: 'set', structureNumber: 'S-1' };
const FACTS = {
  takenWall: '2026-04-14T09:50:00',
  takenAtMs: null,
  latitude: null,
  longitude: null,
  width: 1600,
  height: 1200,
  phash: null,
};
const photo = (view: string) => ({
  ...S1,
  id: view,
  fileName: `${view}.jpg`,
  sha256: `of ${view}`,
  view,
  facts: FACTS,
});
const VIEWS = ['bore-depth', 'kits', 'finish', 'plumb'];
const SIZE = { kitFt3: 8, received: 10, used: 4, own: 1 };
const WHOLE = {
  asOf: '2026-05-01T00:00:00Z',
  lots: [{ product: 'EP-15', number: 'L-100', history: [] }],
  lotUse: [{ product: 'EP-15', number: 'L-100', sizes: [SIZE, { ...SIZE, kitFt3: 1.5 }] }],
  design: [{ ...S1, latitude: 35.1, longitude: -97.4 }],
  area: null,
  neighbours: [],
  register: [],
  photos: VIEWS.map(photo),
  otherPhotos: [],
  previous: [],
  siblings: [],
};

const checked = async (context: object) => {
  const path = join(folder, 'context.json');
  await writeFile(path, JSON.stringify(context));
  const check = await readContext(path);
  return check(batchOf({ lines: [{ kind: 'set', values: CLEAN_LINES.set }], pours: CLEAN_POURS.set }));
};
const codes = async (changes: object): Promise<readonly string[]> =>
  (await checked({ ...WHOLE, ...changes })).findings.map(({ code }) => code);
const faults = async (changes: object): Promise<string> => {
  const error: unknown = await checked({ ...WHOLE, ...changes }).catch((one: unknown) => one);
  if (!(error instanceof ContextRefused)) throw new Error('The file was taken.');
  return error.message;
};

describe('a context file that tells everything', () => {
  it('leaves no rule out but what the standard has off', async () => {
    const { findings, skipped } = await checked(WHOLE);
    expect(findings).toEqual([]);
    expect(skipped).toMatchObject([{ code: 'brand-differs', reason: 'off' }]);
  });

  it.each([
    ['photo-missing', { photos: VIEWS.slice(1).map(photo) }],
    [
      'photo-small',
      { photos: VIEWS.map((view) => ({ ...photo(view), facts: { ...FACTS, width: 900, height: 999 } })) },
    ],
    [
      'photo-reused',
      {
        otherPhotos: [
          { sha256: 'of kits', phash: null, view: 'kits', structureNumber: 'X-9', batch: 'B-2', own: false },
        ],
      },
    ],
    // Ten received and ten used already.
    ['lot-overdrawn', { lotUse: [{ product: 'EP-15', number: 'L-100', sizes: [{ ...SIZE, used: 10 }] }] }],
    [
      'position-shared',
      { neighbours: [{ structureNumber: 'X-9', latitude: 35.1, longitude: -97.4, accuracyFt: 5 }] },
    ],
    // Written as in no register: the key is made of it.
    ['already-on-record', { register: [{ structureKey: ' s-1', recordNumber: 'R-000007', own: false }] }],
    ['done-twice', { siblings: [S1] }],
    [
      'changed-to-pass',
      {
        previous: [
          {
            ...S1,
            code: 'embedment-short',
            field: 'embedmentFt',
            measured: 5.5,
            limit: 6,
            unit: 'ft',
            values: { ...CLEAN_LINES.set, embedmentFt: 5.5 },
            pours: CLEAN_POURS.set,
          },
        ],
      },
    ],
  ])('%s is found by its part of it', async (code, changes) => {
    expect(new Set(await codes(changes))).toEqual(new Set([code]));
  });

  it('takes standards in any order and uses the one of the work day', async () => {
    const asking = (leastRatio: number) => ({
      ...DEMO_STANDARD,
      rules: {
        ...DEMO_STANDARD.rules,
        'fill-short': { ...DEMO_STANDARD.rules['fill-short'], params: { leastRatio } },
      },
    });
    // The fill ratio is 1.0957 (worked record WR-01); the work day is 2026-04-14.
    const later = { id: 'b', n: 2, effectiveOn: '2026-04-01', body: asking(1.2) };
    const earlier = { id: 'a', n: 1, effectiveOn: '2020-01-01', body: asking(1) };
    expect(await codes({ standards: [later, earlier] })).toEqual(['fill-short']);
    expect(await codes({ standards: [{ ...later, effectiveOn: '2026-04-15' }, earlier] })).toEqual([]);
  });

  it('says on which parts only the contractor’s own is told', async () => {
    const { skipped } = await checked({ ...WHOLE, ownOnly: ['register'] });
    expect(skipped).toContainEqual({ code: 'already-on-record', reason: 'own-only' });
  });

  it.each([
    ['a photograph of no view', { photos: [photo('roof')] }, 'photos/0/view: must be one of bore-depth, '],
    [
      'facts of half a photograph',
      { photos: [{ ...photo('kits'), facts: { width: 3 } }] },
      "photos/0/facts: must have required property 'takenWall'",
    ],
    [
      'a hash that is none',
      { photos: [{ ...photo('kits'), facts: { ...FACTS, phash: 'xyz' } }] },
      'photos/0/facts/phash: must match pattern',
    ],
    [
      'an earlier finding of no rule',
      { previous: [{ ...S1, code: 'too-blue' }] },
      'previous/0/code: must be one of embedment-short, ',
    ],
    [
      'kits that are less than none',
      { lotUse: [{ product: 'EP-15', number: 'L', sizes: [{ ...SIZE, used: -1 }] }] },
      'lotUse/0/sizes/0/used: must be >= 0',
    ],
    [
      'a line of no kind',
      { siblings: [{ structureNumber: 'S-1' }] },
      "siblings/0: must have required property 'kind'",
    ],
    [
      'a neighbour without a place',
      { neighbours: [{ structureNumber: 'X' }] },
      "neighbours/0: must have required property 'latitude'",
    ],
    ['a part of no name', { ownOnly: ['weather'] }, 'ownOnly/0: must be one of lots, '],
    [
      'a standard that is none',
      { standards: [{ id: 'a', n: 1, effectiveOn: '2026-01-01', body: { name: 'x' } }] },
      'standards/0/',
    ],
  ])('names the fault of %s with its place', async (_name, changes, sentence) => {
    expect(await faults(changes)).toContain(sentence);
  });
});
