import type { Derived, FieldValues, Kind } from '#shared/records/types.ts';

export type RegisterDbRow = {
  id: string;
  record_id: string;
  record_number: string;
  n: number;
  current: boolean;
  structure_number: string;
  kind: Kind;
  contractor_id: string;
  contractor_name: string;
  work_order_id: string;
  work_order_number: string;
  work_day: string | null;
  values: FieldValues;
  derived: Derived;
  fill_ratio: number | null;
  lots: string[];
  nonconforming: boolean;
  concessions: string[];
  latitude: number | null;
  longitude: number | null;
  entered_at: string;
  entered_by: string | null;
  reason: string | null;
};

/** What conditions and orders are over, and all that is counted. */
export const REGISTER_SCOPE = `
from register_versions v
left join register_current c on c.version_id = v.id`;

export const REGISTER_JOINS = `
left join register_current c on c.version_id = v.id
join records r on r.id = v.record_id
join organisations o on o.id = v.contractor_id
join work_orders w on w.id = v.work_order_id
left join users u on u.id = v.entered_by`;

export const REGISTER_FROM = `from register_versions v ${REGISTER_JOINS}`;

export const REGISTER_COLUMNS = `
v.id, v.record_id, v.record_number, v.n, c.version_id is not null as current, v.structure_number, v.kind,
v.contractor_id, o.name as contractor_name, v.work_order_id, w.number as work_order_number, v.work_day,
r.values, r.derived, v.fill_ratio, v.nonconforming, v.latitude, v.longitude, v.entered_at, u.name as entered_by, v.reason,
array(select distinct p.lot_text from pours p where p.record_id = v.record_id and p.lot_text is not null order by 1) as lots,
array(
  select distinct k.number from finding_states s
  join decisions d on d.finding_id = s.finding_id and d.seq = s.version
  join concessions k on k.id = d.concession_id
  where s.record_id = v.record_id and s.grounds = 'concession' order by 1
) as concessions`;
