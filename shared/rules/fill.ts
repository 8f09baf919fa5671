import type { FindingDraft, LineView, Pour } from './types.ts';
import { unproved } from './need.ts';

type Fill = {
  /** Null where the readings leave no void to speak of. */
  readonly ratio: number | null;
  readonly placedFt3: number;
  readonly voidFt3: number;
  readonly smallestKitFt3: number | null;
  /** Where the void begins to be measured: the primary cell of the fill rules. */
  readonly field: string;
};

const PRIMARY = { set: 'boreDepthFt', straighten: 'gapAtGradeIn', relevel: 'gap1In' } as const;
const TEMPERATURES = ['componentATempF', 'componentBTempF'] as const;

/** Temperatures without which neither the yield nor a wait is known; nothing for those with a `record-…` finding. */
export const missingTemperatures = (pours: readonly Pour[]): readonly FindingDraft[] =>
  pours.flatMap((pour) =>
    TEMPERATURES.filter((field) => pour[field] === null && !pour.broken.has(field)).map((field) =>
      unproved(field, { source: pour.source }),
    ),
  );

/** Foam against void, or the drafts to return in its place. A line without pours is `pour-none`'s and says nothing here. */
export const fillOf = (
  line: LineView,
):
  | { readonly fill: Fill; readonly missing: null }
  | { readonly fill: null; readonly missing: readonly FindingDraft[] } => {
  if (line.pours.length === 0) return { fill: null, missing: [] };
  const { fillRatio, placedFt3, voidFt3 } = line.derived;
  if (placedFt3 === null || voidFt3 === null) {
    return { fill: null, missing: missingTemperatures(line.pours) };
  }
  const kits = line.product?.kitsFt3 ?? [];
  const smallestKitFt3 = kits.length > 0 ? Math.min(...kits) : null;
  return {
    fill: { ratio: fillRatio, placedFt3, voidFt3, smallestKitFt3, field: PRIMARY[line.kind] },
    missing: null,
  };
};
