import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { readRecordSheet } from '#server/modules/records/read-record-sheet.ts';
import { sheetLimits } from '#shared/drawing/sheet-limits.ts';
import type { SheetLimits } from '#shared/drawing/sheet-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import type { Standard } from '#shared/standard/types.ts';
import type { SheetContent } from './sheet-content.ts';

export type Viewer = { readonly actor: Actor; readonly ability: Ability };

/**
 * What the PDF of one record shows to this person.
 * @throws Problem 404 for another contractor's record as for none
 */
export async function readSheetContent(
  em: EntityManager,
  options: { readonly id: string; readonly limitsOf: LimitsOf } & Viewer,
): Promise<SheetContent> {
  const { id, actor, ability, limitsOf } = options;
  const data = await readRecordSheet(em, { id, actor, ability });
  const order = await row<{ zone: string }>(
    em,
    `select w.zone from records r join revisions v on v.id = r.revision_id join batches b on b.id = v.batch_id
     join work_orders w on w.id = b.work_order_id where r.id = $1`,
    [id],
  );
  return { data, limits: await limitsOf(em, data.record.standard), zone: order?.zone ?? 'UTC' };
}

export type LimitsOf = (em: EntityManager, standard: number) => Promise<SheetLimits>;

/** Limits of versions of the standard, each read once. 0: the line has none. */
export function readLimits(): LimitsOf {
  const known = new Map<number, SheetLimits>();
  return async (em, n) => {
    const before = known.get(n);
    if (before) return before;
    const version = await row<{ body: Standard }>(em, 'select body from standard_versions where n = $1', [n]);
    const limits = version ? sheetLimits(version.body) : {};
    known.set(n, limits);
    return limits;
  };
}
