import { workDay } from '#shared/records/work-day.ts';
import { clockFields } from '#shared/rules/clock-chain.ts';
import type { CheckContext, LineView, ProductInForce, StandardInForce } from '#shared/rules/types.ts';
import { designOf, photosOf } from './context-keys.ts';
import { deriveLine } from './derive-line.ts';
import { productInForce, standardInForce } from './in-force.ts';
import type { Clock } from './instants.ts';
import type { PreparedLine } from './prepared.ts';

export type ViewedLine = {
  readonly view: LineView;
  readonly line: PreparedLine;
  readonly standard: StandardInForce;
  readonly product: ProductInForce | null;
};

/** The version, in force on the work day, of the product of the first pour whose product is known. */
const productOf = (line: PreparedLine, day: string | null, context: CheckContext): ProductInForce | null => {
  for (const pour of line.pours) {
    const product = pour.product === null ? null : productInForce(context.products, pour.product, day);
    if (product) return product;
  }
  return null;
};

/** All that a rule may look at; null when no standard was ever published. */
export const viewLine = (line: PreparedLine, context: CheckContext, clock: Clock): ViewedLine | null => {
  const { kind, structureNumber, occurrence, row, broken, pours, events } = line;
  const { values } = row;
  const day = workDay(kind, values);
  const standard = standardInForce(context.standards, day);
  if (!standard) return null;
  const product = productOf(line, day, context);
  const derived = deriveLine({
    kind,
    values,
    broken,
    pours,
    events,
    standard: standard.body,
    product: product?.body ?? null,
    designDepthFt: designOf(context, line)?.embedmentFt ?? null,
  });
  const view: LineView = {
    kind,
    structureNumber,
    occurrence,
    source: row.source,
    values,
    broken,
    pours,
    events,
    photos: photosOf(context, line),
    derived,
    workDay: day,
    standard,
    product: product?.body ?? null,
    instants: clock.instants(values, clockFields(kind, 1)),
  };
  return { view, line, standard, product };
};
