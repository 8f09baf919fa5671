import { geoAreaOf } from '#shared/calc/geo-area.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import type { CheckContext, ContextPart } from '#shared/rules/types.ts';
import type { Product, Standard } from '#shared/standard/types.ts';
import { contextBeside, type KnownBeside } from './known-beside.ts';

/** What the server gives for a work order; with `KnownBeside`, more than it gives a contractor before hand-in. */
export type OrderContextData = Omit<CheckContextData, 'register' | 'neighbours'> & KnownBeside;

/** Of these the server gives the contractor's own. */
const OWN_ONLY: readonly ContextPart[] = ['register', 'neighbours'];

/**
 * What a check before hand-in knows, from the plain data that the server gives for a work order. Photographs, earlier
 * checks and the use of lots over all are not known unless they are given too; of the register, the contractor's own
 * unless `ownOnly` says otherwise.
 */
export const contextFromData = (data: OrderContextData): CheckContext => ({
  zone: data.zone,
  asOfMs: Date.parse(data.asOf),
  // Published bodies have passed their schemas; the reply's own schema does not repeat them.
  standards: data.standards.map((one) => ({ ...one, body: one.body as unknown as Standard })),
  products: data.products.map((one) => ({ ...one, body: one.body as unknown as Product })),
  lots: data.lots,
  design: data.design,
  area: data.area === null ? 'none' : geoAreaOf(data.area),
  ...contextBeside({ ownOnly: OWN_ONLY, ...data }),
});
