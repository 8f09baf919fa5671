import { FINDING_FACTS, type FindingFacts } from '#server/modules/records/finding-facts.ts';

export type ConcessionFindingRow = FindingFacts & { id: string; record_id: string | null };

export type ConcessionDbRow = {
  id: string;
  number: string;
  state: 'asked' | 'granted' | 'refused' | 'withdrawn';
  version: number;
  at: string;
  reason: string;
  asked_by: string;
  decision_reason: string | null;
  condition: string | null;
  ends_on: string | null;
  decided_by: string | null;
  decided_at: string | null;
  contractor_id: string;
  contractor_name: string;
  batch_id: string;
  batch_number: string;
  findings: ConcessionFindingRow[];
};

export const CONCESSION_SELECT = `
select c.id, c.number, c.state, c.version, c.at, c.reason, coalesce(asked.name, '') as asked_by,
  c.decision_reason, c.condition, c.ends_on, decided.name as decided_by, c.decided_at,
  c.contractor_id, o.name as contractor_name, b.id as batch_id, b.number as batch_number,
  (
    select coalesce(jsonb_agg(to_jsonb(one) - 'ordinal' order by one.ordinal), '[]') from (
      select f.id, f.record_id, f.ordinal, ${FINDING_FACTS}
      from concession_findings k join findings f on f.id = k.finding_id where k.concession_id = c.id
    ) one
  ) as findings
from concession_current c
join organisations o on o.id = c.contractor_id
join revisions v on v.id = c.revision_id
join batches b on b.id = v.batch_id
left join users asked on asked.id = c.asked_by
left join users decided on decided.id = c.decided_by`;
