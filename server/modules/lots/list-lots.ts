import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import { notFound } from '#server/http/problem.ts';
import type { Lot, LotDetail } from '#shared/generated/api-types.ts';
import type { Ability } from '#shared/permissions/ability.ts';
import { LOT_SELECT, type LotDbRow } from './lot-select.ts';
import { presentLot } from './present-lot.ts';

export type LotQuery = PageQuery & { status?: Lot['status'][]; number?: string };
type Viewer = { ability: Ability };

/** Lots by number. */
export async function listLots(
  em: EntityManager,
  options: { query: LotQuery; viewer: Viewer },
): Promise<Page<Lot>> {
  const { query, viewer } = options;
  const { limit, after } = parsePage(query, ['string', 'uuid']);
  const filter = [query.status ?? null, query.number ?? null];
  const where = `where ($1::text[] is null or s.status = any($1)) and ($2::text is null or upper(s.number) = upper($2))`;
  const found = await rows<LotDbRow>(
    em,
    `${LOT_SELECT} ${where} and ($3::text is null or (s.number, s.lot_id) > ($3, $4::uuid))
     order by s.number, s.lot_id limit $5`,
    [...filter, after?.[0] ?? null, after?.[1] ?? null, limit + 1],
  );
  const counted = after
    ? null
    : await row<{ n: number }>(em, `select count(*) as n from lot_status s ${where}`, filter);
  return toPage({
    rows: found,
    limit,
    total: counted?.n ?? null,
    key: (lot) => [lot.number, lot.id],
    item: (lot) => presentLot(lot, viewer),
  });
}

/** A lot with what happened to it and every structure it went into. @throws Problem 404 */
export async function readLot(em: EntityManager, options: Viewer & { id: string }): Promise<LotDetail> {
  const found = await row<LotDbRow>(em, `${LOT_SELECT} where s.lot_id = $1`, [options.id]);
  if (!found) throw notFound();
  const events = await rows<LotDetail['events'][number]>(
    em,
    `select e.id, e.type, e.kit_ft3 as "kitFt3", e.quantity, e.reason, e.at, coalesce(u.name, '') as by
     from lot_events e left join users u on u.id = e.actor_id where e.lot_id = $1 order by e.at desc, e.id`,
    [options.id],
  );
  const uses = await rows<LotDetail['uses'][number]>(
    em,
    `select r.id as "recordId", r.structure_number as "structureNumber", r.kind, l.state, r.work_day as "workDay",
       json_build_object('id', b.id, 'number', b.number) as batch, json_build_object('id', o.id, 'name', o.name) as contractor,
       sum(p.kit_ft3 * p.quantity) as "usedFt3"
     from pours p join records r on r.id = p.record_id join lines l on l.record_id = r.id
     join batches b on b.id = l.batch_id join organisations o on o.id = b.contractor_id
     where p.lot_id = $1
     group by r.id, r.structure_number, r.kind, l.state, r.work_day, b.id, b.number, o.id, o.name
     order by r.work_day, r.structure_number limit 5000`,
    [options.id],
  );
  return { ...presentLot(found, options), events, uses };
}
