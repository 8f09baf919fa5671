import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { geoAreaOf } from '#shared/calc/geo-area.ts';
import type { LoadedInputs, SourceNeeds } from './check-messages.ts';
import { loadDesign } from './load-design.ts';
import { loadEarlierFailures } from './load-earlier-failures.ts';
import { loadLines } from './load-lines.ts';
import { loadLots, loadLotUse, lotsPoured } from './load-lots.ts';
import { loadNeighbours } from './load-neighbours.ts';
import { loadOtherPhotos, loadPhotos } from './load-photos.ts';
import { loadRegister } from './load-register.ts';
import { loadProducts, loadStandards } from './load-versions.ts';
import type { StartedRun } from './start-run.ts';

/** What the batch knows beside its lines, by one query a matter, whatever the number of lines. */
export async function loadContext(
  em: EntityManager,
  run: StartedRun,
  needs: SourceNeeds,
): Promise<LoadedInputs> {
  const order = await row<{ number: string; zone: string; area: unknown; first_submitted: string | null }>(
    em,
    `select w.number, w.zone, w.area, (
       select v.submitted_at from revisions v where v.batch_id = $2 and v.n = 0
     ) as first_submitted from work_orders w where w.id = $1`,
    [run.workOrderId, run.batchId],
  );
  if (!order) throw new Error(`The work order ${run.workOrderId} is gone.`);
  // What was in force when the batch was first handed in stays in force for its returned lines.
  const asOf = run.n === 0 ? null : order.first_submitted;
  const standards = await loadStandards(em, asOf);
  const products = await loadProducts(em, asOf);
  const lots = await loadLots(em);
  const lotUse = await loadLotUse(em, { ...run, lotIds: lotsPoured(lots, needs.lotKeys) });
  const design = await loadDesign(em, run.workOrderId);
  const neighbours = await loadNeighbours(em, { ...run, squares: needs.squares });
  const register = await loadRegister(em, { ...run, structureKeys: needs.structureKeys });
  const otherPhotos = await loadOtherPhotos(em, run);
  const previous = await loadEarlierFailures(em, run);
  const lines = await loadLines(em, run.batchId);
  return {
    frame: {
      run,
      orderNumber: order.number,
      lots,
      context: {
        zone: order.zone,
        asOfMs: run.asOfMs,
        standards,
        products,
        lotUse,
        neighbours,
        // An area that is no polygon is not known: the rule says that it did not run.
        area: order.area === null ? 'none' : geoAreaOf(order.area),
        register,
        otherPhotos,
      },
    },
    lists: { lines, design, previous: [...previous] },
    photos: loadPhotos(em, run.batchId),
  };
}
