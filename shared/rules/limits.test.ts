import { describe, expect, it } from 'vitest';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { fillOf } from './fill.ts';
import { lastPour, lineEvents } from './line-events.ts';
import { nearHashes, pictureHash } from './near-hashes.ts';
import { photoMissing } from './photo-missing/rule.ts';
import { atLeast, atMost } from './slack.ts';
import { lineOf, photoOf, pourOf } from './testing.ts';
import type { LineView } from './types.ts';

/** What the rules share, exactly where one case ends and the next begins. */

describe('comparisons allow for 1e-9', () => {
  it.each([
    [0, true],
    [1e-9, true],
    [1.1e-9, false],
  ])('%d from the limit', (off, meets) => {
    expect(atLeast(0, off)).toBe(meets);
    expect(atMost(off, 0)).toBe(meets);
  });
});

it('of pours that ended at one time the one of the higher number is the last', () => {
  const pours = [pourOf({ pourNumber: 1 }), pourOf({ pourNumber: 2 })];
  const [event] = lineEvents(lineOf({ pours }));
  expect(event && lastPour(event)?.pourNumber).toBe(2);
});

it('a product without kits has no smallest kit', () => {
  const line = lineOf({ pours: [pourOf()], derived: { placedFt3: 16, voidFt3: 8, fillRatio: 2 } });
  expect(fillOf(line).fill?.smallestKitFt3).not.toBeNull();
  expect(fillOf({ ...line, product: { ...DEMO_PRODUCT, kitsFt3: [] } }).fill?.smallestKitFt3).toBeNull();
});

it('hashes that differ in the last bit of each quarter are four bits apart, and met', () => {
  const kept = pictureHash('0001000100010001');
  const looked = pictureHash('0000000000000000');
  const apart: number[] = [];
  if (kept && looked) nearHashes([kept], 4).eachNear(looked, (_place, bits) => apart.push(bits));
  expect(new Set(apart)).toEqual(new Set([4]));
});

describe('where brands are checked', () => {
  const rules = {
    ...DEMO_STANDARD.rules,
    'brand-differs': { ...DEMO_STANDARD.rules['brand-differs'], on: true },
  };
  const missing = (line: LineView) =>
    photoMissing
      .check({ ...line, standard: { ...line.standard, body: { ...DEMO_STANDARD, rules } } }, {}, DEMO_CONTEXT)
      .map(({ limit }) => limit);
  const photos = (...views: string[]) => views.map((view) => photoOf(view));

  it('a set pole needs a photograph of its brand, a straightened one does not', () => {
    const set = photos('bore-depth', 'water', 'kits', 'finish', 'plumb');
    expect(missing(lineOf({ photos: set }))).toEqual(['brand']);
    expect(missing(lineOf({ kind: 'straighten', photos: photos('before', 'gap', 'kits', 'after') }))).toEqual(
      [],
    );
  });
});
