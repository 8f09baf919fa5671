import { Migration } from '@mikro-orm/migrations';

/** Where each submitted finding stands, kept beside the append-only rows so that lists filter on one table. */
export class FindingStates20260105090400 extends Migration {
  override up(): void {
    this.addSql(`
create table finding_states (
  finding_id uuid primary key references findings,
  revision_id uuid not null references revisions,
  batch_id uuid not null references batches,
  record_id uuid references records,
  line_id uuid references lines,
  contractor_id uuid not null references organisations,
  work_order_id uuid not null references work_orders,
  code text not null,
  severity text not null,
  work_day date,
  -- Work day, or the day it was submitted where the line has none: lists page on (sort_day, finding_id).
  sort_day date not null,
  state text not null default 'open' check (state in ('open', 'approved', 'rejected', 'held')),
  grounds text,
  action text,
  due_on date,
  decided_by uuid,
  decided_at timestamptz(3),
  -- seq of the last decision: the finding's version on the wire.
  version int not null default 0
);
create index finding_states_page on finding_states (sort_day, finding_id);
create index finding_states_code on finding_states (code, sort_day, finding_id);
create index finding_states_severity on finding_states (severity, sort_day, finding_id);
create index finding_states_state on finding_states (state, sort_day, finding_id);
create index finding_states_contractor on finding_states (contractor_id, sort_day, finding_id);
create index finding_states_order on finding_states (work_order_id, sort_day, finding_id);
create index finding_states_revision on finding_states (revision_id);
create index finding_states_record on finding_states (record_id);
create index finding_states_line on finding_states (line_id);

-- Called on submission (all findings of the run) and when a finding is added to a submitted revision. Repeatable.
create function open_findings(of_run uuid) returns int language plpgsql as $$
declare n int;
begin
  insert into finding_states (finding_id, revision_id, batch_id, record_id, line_id, contractor_id, work_order_id, code, severity, work_day, sort_day)
  select f.id, f.revision_id, b.id, f.record_id, f.line_id, b.contractor_id, b.work_order_id, f.code, f.severity, r.work_day,
    coalesce(r.work_day, (coalesce(v.submitted_at, now()) at time zone 'UTC')::date)
  from findings f
  join revisions v on v.id = f.revision_id
  join batches b on b.id = v.batch_id
  left join records r on r.id = f.record_id
  where f.run_id = of_run
  on conflict (finding_id) do nothing;
  get diagnostics n = row_count;
  return n;
end $$;

-- Called when a submission is withdrawn before anybody decided.
create function close_findings(of_revision uuid) returns int language plpgsql as $$
declare n int;
begin
  delete from finding_states where revision_id = of_revision and version = 0;
  get diagnostics n = row_count;
  return n;
end $$;

-- The projection follows the append-only rows by itself, so that it cannot disagree with them.
create function apply_decision() returns trigger language plpgsql as $$
begin
  update finding_states set
    state = case new.decision when 'approve' then 'approved' when 'reject' then 'rejected' when 'hold' then 'held' else 'open' end,
    grounds = new.grounds, action = new.action, due_on = new.due_on,
    decided_by = case when new.decision = 'undo' then null else new.actor_id end,
    decided_at = case when new.decision = 'undo' then null else new.at end,
    version = new.seq
  where finding_id = new.finding_id and version = new.seq - 1;
  if not found then
    -- The same code as a second writer of the same seq: the reader saw an older state.
    raise exception 'The finding is not open at version %.', new.seq - 1 using errcode = 'UP004';
  end if;
  return null;
end $$;
create trigger apply_decision after insert on decisions for each row when (new.finding_id is not null) execute function apply_decision();
`);
  }
}
