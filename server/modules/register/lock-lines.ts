import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { conflict, notFound } from '#server/http/problem.ts';
import type { Kind } from '#shared/records/types.ts';
import type { LineState } from '#shared/review/states.ts';

export type EnteringLine = {
  record_id: string;
  line_id: string;
  line_state: LineState;
  current: boolean;
  kind: Kind;
  structure_number: string;
  replaces: string | null;
  batch_id: string;
  batch_number: string;
  revision_id: string;
  work_order_id: string;
  contractor_id: string;
  work_day: string | null;
  fill_ratio: number | null;
  latitude: number | null;
  longitude: number | null;
  /** Rules whose findings stand, accepted by concession. */
  conceded: string[];
};

/**
 * The lines of these records, their batches locked, in the order asked for.
 * @throws Problem 404 when one is unknown; 409 naming each that is not an approved line
 */
export async function lockLines(em: EntityManager, recordIds: readonly string[]): Promise<EnteringLine[]> {
  // Batches in one order, so that two clerks never wait for each other in a ring.
  await rows(
    em,
    `select b.id from batches b where b.id in (
       select v.batch_id from records r join revisions v on v.id = r.revision_id where r.id = any($1::uuid[])
     ) order by b.id for update`,
    [recordIds],
  );
  const found = await rows<EnteringLine>(
    em,
    `select r.id as record_id, l.id as line_id, l.state as line_state, l.record_id = r.id as current, r.kind,
       r.structure_number, r.values ->> 'replacesStructure' as replaces, v.batch_id, b.number as batch_number,
       v.id as revision_id, r.work_order_id, r.contractor_id, r.work_day, r.fill_ratio, r.latitude, r.longitude,
       coalesce((
         select array_agg(distinct s.code) from finding_states s
         where s.record_id = r.id and s.state = 'approved' and s.grounds = 'concession'
       ), '{}') as conceded
     from unnest($1::uuid[]) with ordinality as asked(id, n)
     join records r on r.id = asked.id
     join lines l on l.id = r.line_id
     join revisions v on v.id = r.revision_id
     join batches b on b.id = v.batch_id
     where v.submitted_at is not null
     order by asked.n`,
    [recordIds],
  );
  if (found.length !== recordIds.length) throw notFound();
  refuseUnapproved(found);
  return found;
}

function refuseUnapproved(lines: readonly EnteringLine[]): void {
  const errors = lines.flatMap((line, index) =>
    line.current && line.line_state === 'approved'
      ? []
      : [
          {
            pointer: `/recordIds/${index}`,
            code: 'register.not-approved',
            detail: `${line.structure_number} is ${line.current ? line.line_state : 'superseded by a newer revision'}, not approved.`,
          },
        ],
  );
  if (errors.length > 0)
    throw conflict('register.not-approved', 'Only approved lines go on record. Nothing was entered.', {
      errors,
    });
}
