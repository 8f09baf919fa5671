import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { findingTitle } from '#shared/findings/render.ts';
import type { NonconformitySummary } from '#shared/generated/api-types.ts';
import { pareto } from '#shared/nonconformities/pareto.ts';
import { scoreInterval } from '#shared/nonconformities/score-interval.ts';
import { nonconformityConditions, type NonconformityFilter } from './nonconformity-filter.ts';

type ContractorRow = { id: string; name: string; records: number; nonconforming: number };
type AgeRow = { bucket: string; correct: number; rework: number; repair: number };
const BUCKETS = ['to 7 days', '8 to 14', '15 to 30', 'over 30'];

/** Totals over the filter: by rule with running share, rate by contractor with its 95 % interval, open actions by age. */
export async function summarise(
  em: EntityManager,
  filter: NonconformityFilter,
): Promise<NonconformitySummary> {
  const where = nonconformityConditions(filter);
  const from = `from finding_states s where ${where.sql}`;
  const byRule = await rows<{ code: string; count: number }>(
    em,
    `select s.code, count(*)::int as count ${from} group by s.code`,
    where.values,
  );
  const byContractor = await rows<ContractorRow>(
    em,
    `with hit as (select s.contractor_id, count(distinct s.record_id)::int as n ${from} and s.record_id is not null group by 1)
     , checked as (
       select b.contractor_id, sum(l.n)::int as n
       from (select batch_id, count(*) as n from lines where record_id is not null group by 1) l
       join batches b on b.id = l.batch_id group by 1
     )
     select o.id, o.name, checked.n as records, coalesce(hit.n, 0)::int as nonconforming
     from checked join organisations o on o.id = checked.contractor_id
     left join hit on hit.contractor_id = o.id
     order by o.name`,
    where.values,
  );
  const sum = (list: readonly number[]): number => list.reduce((all, one) => all + one, 0);
  return {
    // Every finding has one rule, every record one contractor: their sums are the totals.
    findings: sum(byRule.map((rule) => rule.count)),
    records: sum(byContractor.map((item) => item.nonconforming)),
    recordsChecked: sum(byContractor.map((item) => item.records)),
    byRule: pareto(byRule.map((rule) => ({ ...rule, title: findingTitle(rule.code) }))),
    byContractor: byContractor.map(withInterval),
    openActions: await openActions(em, where),
  };
}

/** A line may have non-conforming records in more than one revision; its rate never passes 1. */
function withInterval(item: ContractorRow): NonconformitySummary['byContractor'][number] {
  const nonconforming = Math.min(item.nonconforming, item.records);
  const { low, high } = scoreInterval(nonconforming, item.records);
  return { ...item, nonconforming, rate: item.records > 0 ? nonconforming / item.records : 0, low, high };
}

/** Actions not closed yet on the filtered findings, by how long they have been open. */
async function openActions(
  em: EntityManager,
  where: { sql: string; values: unknown[] },
): Promise<NonconformitySummary['openActions']> {
  const found = await rows<AgeRow>(
    em,
    `with open as (
       select a.type, extract(day from now() - a.created_at) as days from actions a join finding_states s on s.finding_id = a.finding_id
       where a.closed_at is null and ${where.sql}
     )
     select case when days <= 7 then 'to 7 days' when days <= 14 then '8 to 14' when days <= 30 then '15 to 30' else 'over 30' end as bucket,
       count(*) filter (where type = 'correct')::int as correct, count(*) filter (where type = 'rework')::int as rework,
       count(*) filter (where type = 'repair')::int as repair
     from open group by 1`,
    where.values,
  );
  const byBucket = new Map(found.map((item) => [item.bucket, item]));
  return BUCKETS.map((bucket) => byBucket.get(bucket) ?? { bucket, correct: 0, rework: 0, repair: 0 });
}
