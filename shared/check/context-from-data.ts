import { geoAreaOf } from '#shared/calc/geo-area.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import type { CheckContext } from '#shared/rules/types.ts';
import type { Product, Standard } from '#shared/standard/types.ts';

/**
 * What a check before hand-in knows, from the plain data that the server gives for a work order. Photographs, earlier
 * checks and the use of lots over all are not known; of the register, the contractor's own.
 */
export const contextFromData = (data: CheckContextData): CheckContext => ({
  zone: data.zone,
  asOfMs: Date.parse(data.asOf),
  // Published bodies have passed their schemas; the reply's own schema does not repeat them.
  standards: data.standards.map((one) => ({ ...one, body: one.body as unknown as Standard })),
  products: data.products.map((one) => ({ ...one, body: one.body as unknown as Product })),
  lots: data.lots,
  lotUse: null,
  design: data.design,
  neighbours: data.neighbours.map((one) => ({ ...one, own: true })),
  area: data.area === null ? 'none' : geoAreaOf(data.area),
  photos: null,
  otherPhotos: null,
  register: new Map(
    data.register.map(({ structureKey, recordNumber }) => [structureKey, { recordNumber, own: true }]),
  ),
  previous: null,
  siblings: null,
  ownOnly: ['register', 'neighbours'],
});
