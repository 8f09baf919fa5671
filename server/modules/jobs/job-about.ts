/** SQL over a row of pgboss.job, unnamed in its query: whose work it is, as people name it. Null for a chore, or a subject that is gone. */
export const ABOUT_OF_JOB = `case job.name
  when 'check-revision' then (
    select b.number || case v.n when 0 then '' else ', revision ' || v.n end
    from revisions v join batches b on b.id = v.batch_id where v.id = (job.data ->> 'revisionId')::uuid)
  when 'prepare-photos' then (select number from batches where id = (job.data ->> 'batchId')::uuid)
  when 'issue-transmittal' then (
    select number || ' rev ' || revision from transmittals where id = (job.data ->> 'transmittalId')::uuid)
  when 'send-mail' then (select template || ' to ' || recipient from outbox where id = (job.data ->> 'outboxId')::uuid)
end`;
