import type { CheckContext } from '#shared/rules/types.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';

/** Before any work day: the demo's versions have always been in force. */
const ALWAYS = '1900-01-01';

/** What a check without a server knows: the demo standard and product. Work order, lots, register and photographs are not known. */
export const DEMO_CONTEXT: CheckContext = {
  zone: 'America/Chicago',
  asOfMs: null,
  standards: [{ id: 'demo', n: 1, effectiveOn: ALWAYS, body: DEMO_STANDARD }],
  products: [{ code: DEMO_PRODUCT.code, n: 1, effectiveOn: ALWAYS, body: DEMO_PRODUCT }],
  lots: null,
  lotUse: null,
  design: null,
  neighbours: null,
  area: null,
  register: null,
  photos: null,
  otherPhotos: null,
  siblings: null,
  previous: null,
};
