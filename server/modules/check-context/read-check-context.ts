import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { notFound } from '#server/http/problem.ts';
import { loadDesign } from '#server/modules/check/load-design.ts';
import { loadLots } from '#server/modules/check/load-lots.ts';
import { loadNeighbours } from '#server/modules/check/load-neighbours.ts';
import { loadRegister } from '#server/modules/check/load-register.ts';
import { loadProducts, loadStandards } from '#server/modules/check/load-versions.ts';
import { squaresNear } from '#server/modules/check/source-needs.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import type { Ability } from '#shared/permissions/ability.ts';
import { structureKey } from '#shared/records/structure-key.ts';

type Order = {
  id: string;
  number: string;
  zone: string;
  area: CheckContextData['area'];
  contractor_id: string;
  now: string;
};

/** No batch yet: none has this id. */
const NO_BATCH = '00000000-0000-0000-0000-000000000000';

/**
 * What a check of a workbook knows beside its lines before it is handed in, by the same queries as the check of a batch.
 * Other contractors' structures and the use of lots over all are left out, whoever asks.
 * @throws Problem 404 for another contractor's order as for none
 */
export async function readCheckContext(
  em: EntityManager,
  options: { id: string; ability: Ability },
): Promise<CheckContextData> {
  const order = await row<Order>(
    em,
    `select id, number, zone, area, contractor_id, now() as now from work_orders
     where id = $1 and ($2::uuid is null or contractor_id = $2)`,
    [options.id, contractorWall(options.ability, 'read', 'WorkOrder')],
  );
  if (!order) throw notFound();
  const asked = { batchId: NO_BATCH, contractorId: order.contractor_id };
  const design = await loadDesign(em, order.id);
  const structureKeys = [...new Set(design.map((one) => structureKey(one.structureNumber)))];
  const register = await loadRegister(em, { ...asked, structureKeys });
  const neighbours = await loadNeighbours(em, { ...asked, squares: squaresNear(design) });
  const standards = await loadStandards(em, null);
  const products = await loadProducts(em, null);
  const lots = await loadLots(em);
  return {
    workOrder: { id: order.id, number: order.number },
    zone: order.zone,
    asOf: new Date(order.now).toISOString(),
    standards: standards.map(({ id, n, effectiveOn, body }) => ({ id, n, effectiveOn, body: { ...body } })),
    products: products.map(({ code, n, effectiveOn, body }) => ({
      code,
      n,
      effectiveOn,
      body: { ...body },
    })),
    lots: lots.map(({ product, number, expiresOn, status, history = [] }) => ({
      product,
      number,
      expiresOn,
      status,
      history: history.map((one) => ({ ...one })),
    })),
    design,
    area: order.area,
    register: [...register].flatMap(([key, { recordNumber, own }]) =>
      own ? [{ structureKey: key, recordNumber }] : [],
    ),
    neighbours: neighbours
      .filter(({ own }) => own)
      .map(({ structureNumber, latitude, longitude, accuracyFt }) => ({
        structureNumber,
        latitude,
        longitude,
        accuracyFt,
      })),
  };
}
