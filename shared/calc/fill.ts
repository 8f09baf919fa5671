import { fillUncertainty, worstReading, type ReadingGroup } from './fill-uncertainty.ts';
import { placedVolume, type PourAmount } from './placed-volume.ts';
import type { Derived } from '#shared/records/types.ts';
import type { Product, Standard } from '#shared/standard/types.ts';

type Fill = Pick<Derived, 'voidFt3' | 'placedFt3' | 'fillRatio' | 'fillRatioU' | 'worstReading'>;

const finite = (value: number | null) => (value !== null && Number.isFinite(value) ? value : null);

/** R = P/V; null without either, or for a void that is none. */
export function fillRatio(placedFt3: number | null, voidFt3: number | null): number | null {
  return placedFt3 === null || voidFt3 === null || !(voidFt3 > 0) ? null : finite(placedFt3 / voidFt3);
}

/** The figures about foam, the same for every kind of work. */
export function fillOf(input: {
  readonly voidFt3: number | null;
  readonly groups: readonly ReadingGroup[];
  readonly pours: readonly PourAmount[];
  readonly product: Product | null;
  readonly standard: Standard;
}): Fill {
  const voidFt3 = finite(input.voidFt3);
  const placedFt3 = placedVolume(input.pours, input.product);
  const ratio = fillRatio(placedFt3, voidFt3);
  if (ratio === null || voidFt3 === null) {
    const worst = voidFt3 === null ? null : worstReading(input.groups);
    return { voidFt3, placedFt3, fillRatio: ratio, fillRatioU: null, worstReading: worst };
  }
  const { expanded, worstReading: worst } = fillUncertainty({
    fillRatio: ratio,
    voidFt3,
    placedShare: input.standard.uncertainty.placedShare,
    groups: input.groups,
  });
  return { voidFt3, placedFt3, fillRatio: ratio, fillRatioU: finite(expanded), worstReading: worst };
}
