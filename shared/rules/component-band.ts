import { productInForce } from '#shared/check/in-force.ts';
import { say } from '#shared/findings/say.ts';
import type { Finding } from '#shared/findings/types.ts';
import type { Product } from '#shared/standard/types.ts';
import { cToF } from '#shared/units/convert.ts';
import { missingTemperatures } from './fill.ts';
import { pourPart } from './pour-part.ts';
import type { CheckContext, FindingDraft, LineView } from './types.ts';

const COMPONENTS = [
  ['A', 'componentATempF'],
  ['B', 'componentBTempF'],
] as const;

type Reading = {
  readonly measured: number;
  readonly product: Product;
  /** All readings of the pour would be usual ones in °C. */
  readonly asCelsius: boolean;
};

/** Whether a reading, taken as °C, lies in a product's band of full yield. */
const usualInCelsius = (
  reading: number,
  { lowF, highF }: { readonly lowF?: unknown; readonly highF?: unknown },
): boolean =>
  typeof lowF === 'number' && typeof highF === 'number' && cToF(reading) >= lowF && cToF(reading) <= highF;

/** Each component temperature of a line's pours, in °F, against its product's band; `unproved` for what was not measured. */
export const againstBand = (
  line: LineView,
  context: CheckContext,
  judge: (reading: Reading) => readonly FindingDraft[],
): readonly FindingDraft[] => {
  const drafts = line.pours.flatMap((pour) => {
    const version =
      pour.product === null ? null : productInForce(context.products, pour.product, line.workDay);
    if (!version) return [];
    const product = version.body;
    const readings = COMPONENTS.flatMap(([, field]) => pour[field] ?? []);
    const asCelsius = readings.every((reading) => usualInCelsius(reading, product.fullYieldF));
    return COMPONENTS.flatMap(([component, field]) => {
      const measured = pour[field];
      if (measured === null) return [];
      return judge({ measured, product, asCelsius }).map((found) => ({
        ...found,
        source: pour.source,
        field,
        part: `${component} ${pourPart(pour)}`,
        params: {
          component,
          pourNumber: pour.pourNumber,
          product: product.code,
          lowF: product.fullYieldF.lowF,
          highF: product.fullYieldF.highF,
          asCelsius,
        },
      }));
    });
  });
  return [...drafts, ...missingTemperatures(line.pours)];
};

/** For a reading that would be a usual one in °C: says so. */
export const celsiusHint = ({ measured, params }: Finding): string => {
  if (typeof measured !== 'number' || !usualInCelsius(measured, params)) return '';
  return ` (${say(measured, null)} °C would be ${say(cToF(measured), 'degF')})`;
};
