import { structureKey } from '#shared/records/structure-key.ts';
import type { SourceBatch } from '#shared/records/types.ts';
import { lotKey } from '#shared/rules/lot-index.ts';
import type { SourceNeeds } from './check-messages.ts';

/** Squares of a hundredth of a degree, some half a mile: what lies in a line's own or in one beside it may be near. */
export const PER_DEGREE = 100;

export function sourceNeeds(source: SourceBatch): SourceNeeds {
  return {
    lines: source.lines.length,
    structureKeys: [...new Set(source.lines.map((line) => structureKey(line.structureNumber)))],
    squares: squaresNear(source.lines.map(({ values }) => values)),
    lotKeys: [
      ...new Set(
        source.pours.map(({ values }) =>
          lotKey(String(values['product'] ?? ''), String(values['lot'] ?? '')),
        ),
      ),
    ],
  };
}

/** Squares of a hundredth of a degree in and beside which these places lie. */
export function squaresNear(
  places: readonly { readonly latitude?: unknown; readonly longitude?: unknown }[],
): { i: number; j: number }[] {
  const squares = new Map<string, { i: number; j: number }>();
  for (const { latitude, longitude } of places) {
    if (typeof latitude !== 'number' || typeof longitude !== 'number') continue;
    // What is no place has a finding of its own, and may be no number of the database's either.
    if (!(Math.abs(latitude) <= 90 && Math.abs(longitude) <= 180)) continue;
    for (const north of [-1, 0, 1])
      for (const east of [-1, 0, 1]) {
        const i = Math.floor(latitude * PER_DEGREE) + north;
        const j = Math.floor(longitude * PER_DEGREE) + east;
        squares.set(`${i}|${j}`, { i, j });
      }
  }
  return [...squares.values()];
}
