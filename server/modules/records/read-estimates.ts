import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { loadProducts } from '#server/modules/check/load-versions.ts';
import { strengthAt, type PourAt } from '#shared/calc/strength-at.ts';
import { uncertaintyBudget } from '#shared/calc/uncertainty-budget.ts';
import { productInForce } from '#shared/check/in-force.ts';
import { clockOf } from '#shared/check/instants.ts';
import type { RecordRow, RecordSheetData } from '#shared/generated/api-types.ts';
import type { FieldValues, Kind } from '#shared/records/types.ts';
import type { Product, Standard } from '#shared/standard/types.ts';

type Estimates = Pick<RecordSheetData, 'uncertainty' | 'strength'>;
type Line = { record: RecordRow; events: RecordSheetData['events'] };
type Circumstances = { standard: Standard | null; zone: string; first_submitted: string | null };
type Poured = PourAt & { product: string | null };

/** What is done after a pour, by kind: as first built, and in a later event. */
const DONE: Readonly<Record<Kind, { first: readonly string[]; later: readonly string[] }>> = {
  set: { first: ['letGoAt', 'hardwareAt', 'loadAt'], later: ['letGoAt', 'hardwareAt', 'loadAt'] },
  straighten: { first: ['releasedAt', 'reattachedAt'], later: ['releasedAt', 'hardwareAt'] },
  relevel: { first: ['loweredAt', 'releasedAt'], later: ['loweredAt', 'releasedAt'] },
};

/** What a line's ± comes from and how strong its foam was estimated to be, on the standard and product that it was checked on. */
export async function readEstimates(em: EntityManager, { record, events }: Line): Promise<Estimates> {
  const found = await row<Circumstances>(
    em,
    `select s.body as standard, w.zone, (
       select v0.submitted_at from revisions v0 where v0.batch_id = v.batch_id and v0.n = 0
     ) as first_submitted
     from records r join revisions v on v.id = r.revision_id join work_orders w on w.id = r.work_order_id
     left join standard_versions s on s.id = r.standard_id where r.id = $1`,
    [record.id],
  );
  if (!found) throw new Error(`The record ${record.id} is gone.`);
  return {
    uncertainty: found.standard === null ? [] : budget({ record, events }, found.standard),
    strength: await strength(em, { record, events }, found),
  };
}

function budget({ record, events }: Line, standard: Standard): Estimates['uncertainty'] {
  const { fillRatio } = record.derived;
  const values = record.values as FieldValues;
  const later = events.map((event) => event.values as FieldValues);
  return uncertaintyBudget(record.kind, { values, events: later, standard, fillRatio }).map((part) => ({
    ...part,
    fields: [...part.fields],
  }));
}

async function strength(
  em: EntityManager,
  { record, events }: Line,
  found: Circumstances,
): Promise<Estimates['strength']> {
  const pours = await rows<Poured>(
    em,
    `select event, pour_number as "pourNumber", extract(epoch from poured_at)::float8 * 1000 as "atMs",
       product_code as product, component_a_temp_f as "componentATempF", component_b_temp_f as "componentBTempF"
     from pours where record_id = $1 order by n`,
    [record.id],
  );
  const product = await productOf(em, { pours, day: record.workDay, asOf: found.first_submitted });
  if (product === null) return [];
  const clock = clockOf(found.zone);
  const { first, later } = DONE[record.kind];
  const told = [
    ...first.map((field) => ({ event: 1, field, wall: record.values[field] })),
    ...events.flatMap(({ event, values }) =>
      event === null ? [] : later.map((field) => ({ event, field, wall: values[field] })),
    ),
  ];
  return told.flatMap(({ event, field, wall }) => {
    const atMs = clock.at(wall);
    if (atMs === null || typeof wall !== 'string') return [];
    return strengthAt([{ event, field, atMs }], { pours, product }).map((one) => ({ ...one, at: wall }));
  });
}

/** The product as it was on the work day; null for none, or for foam of two products in one structure. */
async function productOf(
  em: EntityManager,
  { pours, day, asOf }: { pours: readonly Poured[]; day: string | null; asOf: string | null },
): Promise<Product | null> {
  const codes = new Set(
    pours.flatMap(({ product }) => (product === null ? [] : [product.trim().toUpperCase()])),
  );
  const [code, ...others] = codes;
  if (code === undefined || others.length > 0) return null;
  return productInForce(await loadProducts(em, asOf), code, day)?.body ?? null;
}
