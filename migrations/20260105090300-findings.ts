import { Migration } from '@mikro-orm/migrations';

/** What the check found and what people decided on it. */
export class Findings20260105090300 extends Migration {
  override up(): void {
    this.addSql(`
create table records (
  id uuid primary key default gen_random_uuid(),
  run_id uuid not null references check_runs,
  revision_id uuid not null references revisions,
  line_id uuid not null references lines,
  -- Place in the run's order; lists page on it.
  ordinal int not null,
  kind text not null check (kind in ('set', 'straighten', 'relevel')),
  structure_number text not null,
  occurrence int not null default 1,
  sheet text not null,
  row int not null,
  -- Cells as written by field key: {field: {address, raw}}; values as read; derived figures.
  raw jsonb not null,
  values jsonb not null,
  derived jsonb not null,
  -- Rows of the Events sheet for this line: [{event, values, cells}].
  events jsonb not null default '[]',
  schema text not null,
  standard_id uuid references standard_versions,
  work_order_id uuid not null references work_orders,
  contractor_id uuid not null references organisations,
  work_day date,
  worst_severity text check (worst_severity in ('nonconformity', 'query', 'note')),
  nonconformities int not null default 0,
  queries int not null default 0,
  notes int not null default 0,
  fill_ratio double precision,
  fill_ratio_u double precision,
  latitude double precision,
  longitude double precision,
  rule_codes text[] not null default '{}',
  lot_ids uuid[] not null default '{}',
  product_codes text[] not null default '{}',
  created_at timestamptz(3) not null default now(),
  unique (run_id, ordinal)
);
create index records_line on records (line_id, created_at);
create index records_contractor on records (contractor_id, work_day, id);
create index records_order on records (work_order_id, work_day, id);
create index records_work_day on records (work_day, id);
create index records_fill on records (fill_ratio);
create index records_rules on records using gin (rule_codes);
create index records_lots on records using gin (lot_ids);
alter table lines add foreign key (record_id) references records;
create index lines_record on lines (record_id);

create table pours (
  record_id uuid not null references records,
  n int not null check (n >= 1),
  pour_number int,
  event int not null default 1,
  product_code text,
  lot_id uuid references lots,
  lot_text text,
  kit_ft3 double precision,
  quantity double precision,
  wasted_quantity double precision not null default 0,
  poured_wall text,
  poured_at timestamptz(3),
  component_a_temp_f double precision,
  component_b_temp_f double precision,
  sheet text,
  row int,
  raw jsonb not null default '{}',
  primary key (record_id, n)
);
create index pours_lot on pours (lot_id);
create index pours_lot_text on pours (lot_text);

create table findings (
  id uuid primary key default gen_random_uuid(),
  run_id uuid not null references check_runs,
  revision_id uuid not null references revisions,
  record_id uuid references records,
  line_id uuid references lines,
  ordinal int not null,
  code text not null,
  severity text not null check (severity in ('nonconformity', 'query', 'note')),
  kind text,
  structure_number text,
  occurrence int,
  sheet text,
  row int,
  cell text,
  field text,
  -- JSON number or string.
  measured jsonb,
  limit_value jsonb,
  margin double precision,
  unit text,
  uncertainty double precision,
  params jsonb not null default '{}',
  -- What a rule learnt about another contractor; never leaves the owner.
  owner_params jsonb not null default '{}',
  fingerprint text not null,
  -- after-acceptance: learnt later (a recall, a reused photograph).
  origin text not null default 'check' check (origin in ('check', 'after-acceptance')),
  created_at timestamptz(3) not null default now(),
  unique (run_id, fingerprint),
  unique (run_id, ordinal)
);
create index findings_record on findings (record_id);
create index findings_line on findings (line_id);
create index findings_revision on findings (revision_id, fingerprint);

-- Answers outlive a re-check of the same draft: they hang on revision and fingerprint.
create table answers (
  id uuid primary key default gen_random_uuid(),
  revision_id uuid not null references revisions,
  fingerprint text not null,
  finding_id uuid not null references findings,
  seq int not null check (seq >= 1),
  text text not null check (btrim(text) <> ''),
  actor_id uuid references users,
  at timestamptz(3) not null default now(),
  unique (revision_id, fingerprint, seq)
);

create sequence concession_numbers;
create table concessions (
  id uuid primary key default gen_random_uuid(),
  number text not null unique default human_number('C', nextval('concession_numbers'), 4),
  revision_id uuid not null references revisions,
  contractor_id uuid not null references organisations,
  work_order_id uuid not null references work_orders,
  asked_by uuid references users,
  reason text not null check (btrim(reason) <> ''),
  at timestamptz(3) not null default now()
);
create index concessions_page on concessions (at, id);
create index concessions_contractor on concessions (contractor_id, at, id);
create index concessions_revision on concessions (revision_id);
create table concession_findings (
  concession_id uuid not null references concessions,
  finding_id uuid not null references findings,
  primary key (concession_id, finding_id)
);
create index concession_findings_finding on concession_findings (finding_id);
create table concession_events (
  id uuid primary key default gen_random_uuid(),
  concession_id uuid not null references concessions,
  seq int not null check (seq >= 1),
  type text not null check (type in ('asked', 'granted', 'refused', 'withdrawn')),
  reason text,
  condition text,
  ends_on date,
  actor_id uuid references users,
  at timestamptz(3) not null default now(),
  unique (concession_id, seq)
);
create view concession_current as
  select distinct on (c.id) c.*, e.seq as version, e.type as state, e.reason as decision_reason, e.condition, e.ends_on,
    e.actor_id as decided_by, e.at as decided_at
  from concessions c join concession_events e on e.concession_id = c.id
  order by c.id, e.seq desc;

-- The last row of a finding or record counts; undo is a further row. seq is the version that the reader saw, plus one.
create table decisions (
  id uuid primary key default gen_random_uuid(),
  finding_id uuid references findings,
  record_id uuid references records,
  revision_id uuid not null references revisions,
  seq int not null check (seq >= 1),
  decision text not null
    check (decision in ('approve', 'reject', 'hold', 'return', 'undo', 'reopen', 'refer-back', 'abandon')),
  grounds text check (grounds in ('evidence', 'answer', 'concession')),
  action text check (action in ('correct', 'rework', 'repair')),
  due_on date,
  reason text,
  concession_id uuid references concessions,
  actor_id uuid references users,
  at timestamptz(3) not null default now(),
  check ((finding_id is null) <> (record_id is null)),
  check (finding_id is null or decision in ('approve', 'reject', 'hold', 'undo')),
  check (record_id is null or decision in ('approve', 'return', 'undo', 'reopen', 'refer-back', 'abandon')),
  check (finding_id is null or decision <> 'approve' or grounds is not null),
  check (decision <> 'reject' or action is not null),
  check (grounds is distinct from 'concession' or concession_id is not null),
  check (decision <> 'hold' or concession_id is not null)
);
create unique index decisions_finding on decisions (finding_id, seq) where finding_id is not null;
create unique index decisions_record on decisions (record_id, seq) where record_id is not null;
create index decisions_revision on decisions (revision_id, at);
create index decisions_actor on decisions (actor_id, at);

create table outcomes (
  id uuid primary key default gen_random_uuid(),
  revision_id uuid not null references revisions,
  line_id uuid not null references lines,
  record_id uuid not null references records,
  seq int not null check (seq >= 1),
  outcome text not null
    check (outcome in ('approved', 'returned', 'held', 'reopened', 'referred-back', 'abandoned', 'on-record')),
  reason text,
  actor_id uuid references users,
  at timestamptz(3) not null default now(),
  unique (line_id, seq)
);
create index outcomes_revision on outcomes (revision_id);

create table actions (
  id uuid primary key default gen_random_uuid(),
  finding_id uuid references findings,
  concession_id uuid references concessions,
  type text not null check (type in ('correct', 'rework', 'repair', 'condition')),
  text text,
  owner_org_id uuid references organisations,
  owner_id uuid references users,
  due_on date,
  reminded_at timestamptz(3),
  closed_at timestamptz(3),
  closed_by uuid references users,
  version int not null default 1,
  created_at timestamptz(3) not null default now(),
  check (finding_id is not null or concession_id is not null)
);
create index actions_open on actions (due_on, id) where closed_at is null;
create index actions_finding on actions (finding_id);
create index actions_concession on actions (concession_id);

call make_append_only('records', 'pours', 'findings', 'answers', 'concessions', 'concession_findings', 'concession_events', 'decisions', 'outcomes');
`);
  }
}
