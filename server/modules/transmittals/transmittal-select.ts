import type { Transmittal } from '#shared/generated/api-types.ts';

export type TransmittalDbRow = {
  id: string;
  number: string;
  revision: number;
  state: 'queued' | 'running' | 'issued' | 'failed';
  title: string;
  scope: Record<string, unknown>;
  rows: number;
  done: number;
  sha256: string | null;
  content_digest: string | null;
  size: number | null;
  file_name: string | null;
  requested_by: string;
  created_at: string;
  issued_at: string | null;
  problem: { code: string; detail: string } | null;
  superseded: boolean;
};

export const TRANSMITTAL_SELECT = `
select t.id, t.number, t.revision, t.state, t.title, t.scope,
  coalesce(t.rows, (select count(*)::int from transmittal_items i where i.transmittal_id = t.id)) as rows,
  case t.state when 'issued' then coalesce(t.rows, 0) else coalesce(p.done, 0) end as done,
  t.sha256, t.content_digest, t.size, t.file_name, coalesce(u.name, '') as requested_by, t.created_at, t.issued_at, t.problem,
  exists (select 1 from transmittals later where later.supersedes_id = t.id and later.state = 'issued') as superseded
from transmittals t
left join users u on u.id = t.requested_by
left join job_progress p on p.subject = 'transmittal:' || t.id`;

/** A transmittal on the wire. */
export function presentTransmittal(row: TransmittalDbRow, canIssue: boolean): Transmittal {
  return {
    id: row.id,
    number: row.number,
    revision: row.revision,
    state: row.state,
    title: row.title,
    scope: row.scope,
    rows: row.rows,
    done: row.done,
    sha256: row.sha256,
    contentDigest: row.content_digest,
    size: row.size,
    requestedBy: row.requested_by,
    requestedAt: row.created_at,
    issuedAt: row.issued_at,
    problem: row.problem?.detail ?? null,
    can: canIssue && row.state === 'issued' && !row.superseded ? ['issue-again'] : [],
  };
}
