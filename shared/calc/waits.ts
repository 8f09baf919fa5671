import { interpolate } from './interpolate.ts';
import type { Product } from '#shared/standard/types.ts';

/** What every wait is multiplied by at a component temperature in °F: straight lines between the product's points, the nearest point outside. */
export function temperatureFactor(product: Product, tempF: number): number {
  return interpolate(
    product.waitFactors.map(({ tempF, factor }) => [tempF, factor] as const),
    tempF,
  );
}

/** Share of the nominal yield at a component temperature in °F, likewise. */
export function yieldFactor(product: Product, tempF: number): number {
  return interpolate(
    product.yieldFactors.map(({ tempF, factor }) => [tempF, factor] as const),
    tempF,
  );
}

/** A standard's wait in minutes at the temperature of the coldest component. */
export function waitAt({
  waitMin,
  product,
  tempF,
}: {
  readonly waitMin: number;
  readonly product: Product;
  readonly tempF: number;
}): number {
  return waitMin * temperatureFactor(product, tempF);
}
