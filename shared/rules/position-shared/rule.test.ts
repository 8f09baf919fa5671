import { describe, expect, it } from 'vitest';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import type { FieldValues } from '#shared/records/types.ts';
import { lineOf, sourceRow } from '../testing.ts';
import type { NeighbourFact } from '../types.ts';
import { positionShared } from './rule.ts';

/** 0.0005° of latitude at 40° north are 55.517319 m (high-precision inverse on WGS 84), 182.1434 ft. */
const HERE = { latitude: 40, longitude: -105 };
const NORTH = { latitude: 40.0005, longitude: -105 };
const line = (structureNumber: string, values: FieldValues, broken: readonly string[] = []) =>
  lineOf({ structureNumber, values: { structureNumber, ...values }, broken });
const neighbour = (structureNumber: string, fact: Partial<NeighbourFact> = {}): NeighbourFact => ({
  structureNumber,
  ...HERE,
  accuracyFt: 0,
  own: true,
  ...fact,
});
const find = (
  lines: ReturnType<typeof line>[],
  neighbours: readonly NeighbourFact[] | null = [],
  leastFt = 3,
) =>
  positionShared
    .check(
      { lines, pours: [], orphans: [], batch: sourceRow('Batch', 1, {}) },
      { leastFt },
      { ...DEMO_CONTEXT, neighbours },
    )
    .map(({ line: on, ...draft }) => ({ on: on?.structureNumber, ...draft }));

describe('position-shared', () => {
  it.each([
    ['apart', [line('S-1', HERE), line('S-2', NORTH)], []],
    ['the replaced one', [line('S-1', { ...HERE, replacesStructure: 's-0' })], [neighbour('S-0')]],
    ['the structure itself, on record', [line('S-1', HERE)], [neighbour(' s-1')]],
    ['the same structure on two lines', [line('S-1', HERE), line('S-1', HERE)], []],
    ['no position', [line('S-1', {}), line('S-2', HERE)], []],
    ['accuracy unreadable', [line('S-1', HERE, ['accuracyFt'])], [neighbour('S-0')]],
    ['the register not known', [line('S-1', HERE), line('S-2', HERE)], null],
  ])('meets: %s', (_name, lines, neighbours) => {
    expect(find(lines, neighbours)).toEqual([]);
  });

  it('meets: a standard that asks for no distance', () => {
    expect(find([line('S-1', HERE), line('S-2', HERE)], [], 0)).toEqual([]);
  });

  it('meets: exactly as far as asked for: nothing left of it, and nothing asked for', () => {
    const lines = [line('S-1', { ...HERE, accuracyFt: 1 }), line('S-2', { ...HERE, accuracyFt: 1 })];
    expect(find(lines, [], 0)).toEqual([]);
  });

  // 7.0e-6° of longitude at 40° north are 0.598 m (85,394 m a degree, WGS 84), 1.96 ft.
  it('finds: the one to the east and the one to the west, wherever the pair lies', () => {
    const lines = [0, 1, 2, 3, 4, 5, 6, 7].flatMap((n) => {
      const longitude = -105 + n * 0.0101013;
      return [
        line(`W-${n}`, { latitude: 40, longitude }),
        line(`E-${n}`, { latitude: 40, longitude: longitude + 7e-6 }),
      ];
    });
    expect(find(lines).map(({ on, params }) => `${on} ${params?.['other'] as string}`)).toEqual(
      [0, 1, 2, 3, 4, 5, 6, 7].flatMap((n) => [`W-${n} E-${n}`, `E-${n} W-${n}`]),
    );
  });

  it('finds: two lines of a batch in one place, each of them', () => {
    expect(find([line('S-1', HERE), line('S-2', HERE)])).toEqual([
      { on: 'S-1', measured: 0, limit: 3, margin: -3, unit: 'ft', params: { distanceFt: 0, other: 'S-2' } },
      { on: 'S-2', measured: 0, limit: 3, margin: -3, unit: 'ft', params: { distanceFt: 0, other: 'S-1' } },
    ]);
  });

  it('finds: so near that the accuracies leave less', () => {
    const found = find(
      [line('S-1', { ...HERE, accuracyFt: 90 })],
      [neighbour('S-0', { ...NORTH, accuracyFt: 90 })],
    );
    expect(found).toMatchObject([{ limit: 3, params: { other: 'S-0' } }]);
    expect(found[0]?.measured).toBeCloseTo(2.1434, 4);
    expect(found[0]?.margin).toBeCloseTo(-0.8566, 4);
  });

  it('finds: whose it is, where it is another contractor’s, is for the owner alone', () => {
    expect(find([line('S-1', HERE)], [neighbour('X-7', { own: false })])).toMatchObject([
      { params: { distanceFt: 0 }, ownerParams: { other: 'X-7' } },
    ]);
    expect(find([line('S-1', HERE)], [neighbour('X-7', { own: false })])[0]?.params).not.toHaveProperty(
      'other',
    );
  });

  it('finds: of two in one place the first by name', () => {
    const [a, b] = [neighbour('A-1'), neighbour('B-1')];
    for (const neighbours of [
      [a, b],
      [b, a],
    ])
      expect(find([line('S-1', HERE)], neighbours)).toMatchObject([{ params: { other: 'A-1' } }]);
  });

  it('finds: the nearest of several, whatever their order', () => {
    const south = neighbour('A-0', { accuracyFt: 500, latitude: 39.9995 });
    const near = neighbour('A-1', { accuracyFt: 500, ...NORTH });
    const nearer = neighbour('B-1', { accuracyFt: 500 });
    for (const neighbours of [
      [near, nearer],
      [nearer, near],
      [south, nearer],
      [nearer, south],
    ])
      expect(find([line('S-1', HERE)], neighbours)).toMatchObject([{ params: { other: 'B-1' } }]);
  });
});
