import { expect } from 'vitest';
import { row, rows } from '#server/db/rows.ts';
import { verifyTrail } from '#server/trail/verify-trail.ts';
import type { FaultStage } from './fault-stage.ts';

/** Things under way: none may be left when the jobs are at rest. */
const UNDER_WAY = `
select 'job ' || name as what from pgboss.job where state <= 'active' and singleton_key is distinct from 'every'
union all select 'revision ' || id from revisions where status = 'checking'
union all select 'check run ' || id from check_runs where state in ('queued', 'running')
union all select 'transmittal ' || id from transmittals where state in ('queued', 'running')
union all select 'progress of ' || subject from job_progress where state in ('queued', 'running')`;

/** What the rows say was done beside what the trail says was done. */
const TOLD = `
select x.what, x.done, (select count(*) from trail t where t.action = x.action) as told from (
  select 'workbooks handed in' as what, 'batch.workbook-uploaded' as action, count(*) as done from inputs where kind = 'workbook'
  union all select 'uploads of photographs', 'batch.photos-uploaded', count(*) from inputs where kind = 'photos'
  union all select 'checks', 'batch.checked', count(*) from check_runs where state = 'done' and (counts ->> 'lines')::int > 0
  union all select 'batches', 'batch.created', count(*) from batches
  union all select 'transmittals asked for', 'transmittal.requested', count(*) from transmittals
  union all select 'transmittals issued', 'transmittal.issued', count(*) from transmittals where state = 'issued'
  union all select 'versions on the register', 'register.entered', count(*) from register_versions
) x where x.done <> (select count(*) from trail t where t.action = x.action)`;

/** Each of these would be something done twice or by halves. */
const WRONG = `
select 'records of run ' || r.id as what from check_runs r
  where r.state = 'done' and (r.counts ->> 'lines')::int <> (select count(*) from records x where x.run_id = r.id)
union all select 'records of the unfinished run ' || r.id from check_runs r
  where r.state <> 'done' and exists (select from records x where x.run_id = r.id)
union all select 'two inputs of the same bytes on end' from (
    select revision_id, sha256, lag(sha256) over (partition by revision_id order by n) as before from inputs where kind = 'workbook'
  ) i where i.sha256 = i.before
union all select 'checked on an input that is not the newest: ' || v.id from revisions v join check_runs r on r.id = v.run_id
  where v.status <> 'draft' and r.input <> v.input
union all select 'issued without its file: ' || id from transmittals where state = 'issued' and sha256 is null`;

/**
 * With the jobs at rest: nothing is under way for ever, nothing was done twice or by halves, the trail is unbroken and
 * tells what the rows tell, every file that a row refers to is in the store, and every message of the outbox reached
 * the mail server under one Message-ID.
 */
export async function expectWhole(stage: FaultStage): Promise<void> {
  await stage.rest();
  const em = stage.em();
  expect(await rows(em, UNDER_WAY)).toEqual([]);
  expect(await rows(em, TOLD)).toEqual([]);
  expect(await rows(em, WRONG)).toEqual([]);
  const verdict = await verifyTrail(em);
  expect(verdict).toMatchObject({ intact: true, faults: [] });
  for (const { sha256 } of await rows<{ sha256: string }>(em, 'select sha256 from blobs'))
    expect([sha256, await stage.blobs.exists(sha256)]).toEqual([sha256, true]);
  await expectMail(stage);
}

async function expectMail(stage: FaultStage): Promise<void> {
  const outbox = await rows<{ id: string; recipient: string }>(
    stage.em(),
    `select message_id as id, recipient from outbox where state = 'sent'`,
  );
  const delivered = new Map(stage.mail.deliveries.map((one) => [one.messageId, one.to]));
  expect(delivered).toEqual(new Map(outbox.map((one) => [one.id, one.recipient])));
}

/** Rows of a table, by a condition; for what must not have been written. */
export async function countOf(stage: FaultStage, from: string, values: unknown[] = []): Promise<number> {
  return (await row<{ n: number }>(stage.em(), `select count(*)::int as n from ${from}`, values))?.n ?? 0;
}
