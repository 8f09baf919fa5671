export type LotDbRow = {
  id: string;
  number: string;
  product_id: string;
  product: string;
  expires_on: string | null;
  status: 'in-use' | 'held' | 'recalled';
  received_ft3: number;
  used_ft3: number;
  structures: number;
  version: number;
};

/** Pours of lines that were handed in: the record that a line's state speaks of, so that a corrected line counts once. */
export const LOT_USE = `
from pours p join records r on r.id = p.record_id join lines l on l.record_id = r.id where p.lot_id = s.lot_id`;

/** A lot with its receipts and its use by nominal yield; what was wasted was used. */
export const LOT_SELECT = `
select s.lot_id as id, s.number, s.product_id, s.product, s.expires_on, s.status, l.version,
  received.ft3 as received_ft3, used.ft3 as used_ft3, used.structures
from lot_status s
join lots l on l.id = s.lot_id
cross join lateral (
  select coalesce(sum(e.kit_ft3 * e.quantity), 0) as ft3 from lot_events e where e.lot_id = s.lot_id and e.type = 'received'
) received
cross join lateral (
  select coalesce(sum(p.kit_ft3 * p.quantity), 0) as ft3, count(distinct l.id) as structures ${LOT_USE}
) used`;
