import { Migration } from '@mikro-orm/migrations';

/** What a contractor hands in: batches, revisions, inputs, lines, photographs, check runs. */
export class Batches20260105090200 extends Migration {
  override up(): void {
    this.addSql(`
create table blobs (
  sha256 text primary key check (sha256 ~ '^[0-9a-f]{64}$'),
  size bigint not null check (size >= 0),
  type text,
  created_at timestamptz(3) not null default now(),
  -- When something last came to refer to it; the sweeper leaves young ones alone.
  referenced_at timestamptz(3) not null default now()
);
create index blobs_age on blobs (referenced_at);

create table batches (
  id uuid primary key default gen_random_uuid(),
  number text not null unique,
  work_order_id uuid not null references work_orders,
  contractor_id uuid not null references organisations,
  created_by uuid references users,
  version int not null default 1,
  created_at timestamptz(3) not null default now()
);
create index batches_contractor on batches (contractor_id, created_at, id);
create index batches_order on batches (work_order_id, created_at, id);
create index batches_page on batches (created_at, id);

create table revisions (
  id uuid primary key default gen_random_uuid(),
  batch_id uuid not null references batches,
  n int not null check (n >= 0),
  status text not null default 'draft'
    check (status in ('draft', 'checking', 'checked', 'submitted', 'in-review', 'decided', 'on-record')),
  due_on date,
  reminded_at timestamptz(3),
  -- Number of the newest input; 0 before the first.
  input int not null default 0,
  -- The check run that counts: the last finished one, frozen on submission.
  run_id uuid,
  submitted_at timestamptz(3),
  submitted_by uuid references users,
  inspector_id uuid references users,
  taken_at timestamptz(3),
  -- Last decision; a taken revision that nobody works on is freed by this.
  worked_at timestamptz(3),
  decided_at timestamptz(3),
  decided_by uuid references users,
  version int not null default 1,
  created_at timestamptz(3) not null default now(),
  unique (batch_id, n),
  check (status not in ('submitted', 'in-review', 'decided', 'on-record') or (submitted_at is not null and run_id is not null)),
  check (status <> 'in-review' or (inspector_id is not null and taken_at is not null))
);
create unique index revisions_one_open on revisions (batch_id) where status not in ('decided', 'on-record');
create index revisions_queue on revisions (status, submitted_at, id);
create index revisions_inspector on revisions (inspector_id) where status = 'in-review';
create index revisions_run on revisions (run_id);

create table inputs (
  id uuid primary key default gen_random_uuid(),
  revision_id uuid not null references revisions,
  n int not null check (n >= 1),
  -- placement: a photograph placed by hand, which the rules must see.
  kind text not null check (kind in ('workbook', 'photos', 'placement', 'recheck')),
  sha256 text references blobs,
  file_name text,
  size bigint,
  actor_id uuid references users,
  at timestamptz(3) not null default now(),
  unique (revision_id, n),
  check (kind <> 'workbook' or sha256 is not null)
);
create index inputs_sha on inputs (sha256);
call make_append_only('inputs');

create function refuse_closed_revision() returns trigger language plpgsql as $$
declare found text;
begin
  select status into found from revisions where id = new.revision_id;
  if found not in ('draft', 'checking', 'checked') then
    raise exception 'The revision is % and takes no more files.', found using errcode = 'UP003';
  end if;
  return new;
end $$;
create trigger open_revision before insert on inputs for each row execute function refuse_closed_revision();

create table check_runs (
  id uuid primary key default gen_random_uuid(),
  revision_id uuid not null references revisions,
  input int not null,
  engine text not null,
  schema text not null,
  template text,
  state text not null default 'queued' check (state in ('queued', 'running', 'done', 'failed')),
  -- {code, title, detail, params} of why it failed, for people.
  problem jsonb,
  -- {lines, nonconformity, query, note}
  counts jsonb,
  skipped jsonb not null default '[]',
  notices jsonb not null default '[]',
  -- The Batch sheet as read: {values, cells}.
  batch_sheet jsonb,
  as_of timestamptz(3),
  queued_at timestamptz(3) not null default now(),
  started_at timestamptz(3),
  finished_at timestamptz(3),
  unique (revision_id, input, engine)
);
alter table revisions add foreign key (run_id) references check_runs;

create table lines (
  id uuid primary key default gen_random_uuid(),
  batch_id uuid not null references batches,
  kind text not null check (kind in ('set', 'straighten', 'relevel')),
  -- The number folded for comparison; structure_number keeps it as first written.
  structure_key text not null,
  structure_number text not null,
  occurrence int not null default 1 check (occurrence >= 1),
  state text not null default 'undecided'
    check (state in ('undecided', 'approved', 'returned', 'held', 'on-record', 'abandoned')),
  -- The revision and record that the state speaks of.
  revision_id uuid references revisions,
  record_id uuid,
  version int not null default 1,
  created_at timestamptz(3) not null default now(),
  unique (batch_id, kind, structure_key, occurrence)
);
create index lines_state on lines (state, batch_id);
create index lines_revision on lines (revision_id);
create index lines_structure on lines (structure_key, kind);

create table photos (
  id uuid primary key default gen_random_uuid(),
  batch_id uuid not null references batches,
  revision_id uuid not null references revisions,
  input_id uuid references inputs,
  sha256 text not null references blobs,
  file_name text not null,
  actor_id uuid references users,
  at timestamptz(3) not null default now()
);
create index photos_batch on photos (batch_id, at, id);
create index photos_revision on photos (revision_id);
create index photos_sha on photos (sha256);
create trigger open_revision before insert on photos for each row execute function refuse_closed_revision();

create table photo_facts (
  sha256 text not null references blobs,
  pipeline text not null,
  type text,
  width int,
  height int,
  -- Wall clock of the camera, YYYY-MM-DDTHH:mm:ss, and its offset where it says one.
  taken_wall text,
  taken_at timestamptz(3),
  latitude double precision,
  longitude double precision,
  phash text,
  thumb_sha256 text references blobs,
  display_sha256 text references blobs,
  -- {code, params} when the picture could not be read.
  problem jsonb,
  at timestamptz(3) not null default now(),
  primary key (sha256, pipeline)
);
create index photo_facts_thumb on photo_facts (thumb_sha256);
create index photo_facts_display on photo_facts (display_sha256);
create table photo_bands (
  band smallint not null,
  value int not null,
  sha256 text not null,
  primary key (band, value, sha256)
);
create table photo_matches (
  id uuid primary key default gen_random_uuid(),
  photo_id uuid not null references photos,
  revision_id uuid not null references revisions,
  seq int not null check (seq >= 1),
  line_id uuid references lines,
  view text,
  method text not null check (method in ('sheet', 'name', 'hand')),
  removed boolean not null default false,
  actor_id uuid references users,
  at timestamptz(3) not null default now(),
  unique (photo_id, seq),
  check (removed or (line_id is not null and view is not null))
);
create index photo_matches_line on photo_matches (line_id);
create index photo_matches_revision on photo_matches (revision_id);
call make_append_only('photos', 'photo_facts', 'photo_bands', 'photo_matches');

-- Where each photograph lies now: the last match, unless it was taken off.
create view photo_placed as
  select * from (
    select distinct on (photo_id) photo_id, revision_id, seq, line_id, view, method, removed, at
    from photo_matches order by photo_id, seq desc
  ) latest where not removed;
`);
  }
}
