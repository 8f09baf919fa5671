import type { Actor } from '#shared/permissions/ability.ts';
import type { Stage } from '#tests/setup/api-harness.ts';
import { createLot, createProduct, type FoamProduct, type Lot } from './foam.ts';
import { createStandard } from './standards.ts';
import { createWorkOrder, type PlannedStructure, type WorkOrder } from './work-orders.ts';

export type WorkSite = {
  readonly contractor: Actor;
  readonly order: WorkOrder;
  readonly product: FoamProduct;
  readonly lot: Lot;
};

/** The demo's standard in force, its product with one lot, and a work order of one contractor with these structures planned. */
export async function createWorkSite(
  harness: Stage,
  options: { planned: readonly (string | PlannedStructure)[]; contractor?: Actor; number?: string },
): Promise<WorkSite> {
  const em = harness.em();
  const author = await harness.person('engineer');
  const approver = await harness.person('engineer');
  await createStandard(em, { authorId: author.id, approverId: approver.id });
  const product = await createProduct(em);
  const lot = await createLot(em, { productId: product.id });
  const contractor = options.contractor ?? (await harness.person('contractor'));
  const order = await createWorkOrder(em, {
    contractorId: contractor.orgId,
    ...(options.number ? { number: options.number } : {}),
    planned: options.planned.map((one) => (typeof one === 'string' ? { structureNumber: one } : one)),
  });
  return { contractor, order, product, lot };
}
