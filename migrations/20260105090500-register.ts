import { Migration } from '@mikro-orm/migrations';

/** The as-built register and what was issued from it. */
export class Register20260105090500 extends Migration {
  override up(): void {
    this.addSql(`
create sequence record_numbers;
create table register_versions (
  id uuid primary key default gen_random_uuid(),
  structure_id uuid not null references structures,
  kind text not null check (kind in ('set', 'straighten', 'relevel')),
  n int not null check (n >= 1),
  -- One number for all versions of a structure and kind.
  record_number text not null,
  record_id uuid not null references records,
  supersedes_id uuid unique,
  -- Changed fields where the clerk corrects without a new record: {field: {before, after}}.
  amendment jsonb,
  reason text,
  structure_number text not null,
  work_order_id uuid not null references work_orders,
  contractor_id uuid not null references organisations,
  work_day date,
  fill_ratio double precision,
  latitude double precision,
  longitude double precision,
  -- Accepted by concession: stays non-conforming for ever.
  nonconforming boolean not null default false,
  rule_codes text[] not null default '{}',
  entered_by uuid references users,
  entered_at timestamptz(3) not null default now(),
  unique (structure_id, kind, n),
  unique (record_number, n),
  unique (id, structure_id, kind),
  foreign key (supersedes_id, structure_id, kind) references register_versions (id, structure_id, kind),
  check ((n = 1) = (supersedes_id is null)),
  check (n = 1 or btrim(coalesce(reason, '')) <> '')
);
create unique index register_versions_record on register_versions (record_id) where amendment is null;
create index register_versions_page on register_versions (entered_at, id);
create index register_versions_contractor on register_versions (contractor_id, entered_at, id);
create index register_versions_order on register_versions (work_order_id, entered_at, id);
create index register_versions_day on register_versions (work_day, id);
create index register_versions_rules on register_versions using gin (rule_codes);

create table register_current (
  structure_id uuid not null,
  kind text not null,
  version_id uuid not null unique,
  record_number text not null unique,
  suspended boolean not null default false,
  primary key (structure_id, kind),
  foreign key (version_id, structure_id, kind) references register_versions (id, structure_id, kind)
);

create table flags (
  id uuid primary key default gen_random_uuid(),
  version_id uuid references register_versions,
  line_id uuid references lines,
  finding_id uuid references findings,
  type text not null check (type in ('raised', 'cleared', 'suspended', 'restored')),
  reason text,
  actor_id uuid references users,
  at timestamptz(3) not null default now(),
  check (version_id is not null or line_id is not null)
);
create index flags_version on flags (version_id, at);
create index flags_line on flags (line_id, at);

create sequence transmittal_numbers;
create table transmittals (
  id uuid primary key default gen_random_uuid(),
  number text not null default human_number('T', nextval('transmittal_numbers'), 4),
  revision int not null default 0 check (revision >= 0),
  supersedes_id uuid references transmittals,
  -- {workOrder} | {recordNumbers} | {filter}
  scope jsonb not null,
  title text not null default '',
  state text not null default 'queued' check (state in ('queued', 'running', 'issued', 'failed')),
  rows int,
  sha256 text references blobs,
  size bigint,
  file_name text,
  content_digest text,
  -- {code, detail} of why it failed.
  problem jsonb,
  recipients jsonb not null default '[]',
  requested_by uuid references users,
  created_at timestamptz(3) not null default now(),
  issued_at timestamptz(3),
  version int not null default 1,
  unique (number, revision),
  check (state <> 'issued' or (sha256 is not null and content_digest is not null and rows is not null and issued_at is not null))
);
create index transmittals_page on transmittals (created_at, id);
create index transmittals_sha on transmittals (sha256);
create trigger frozen before update or delete on transmittals for each row execute function refuse_frozen('issued');
alter table transmittals enable always trigger frozen;
create trigger never_emptied before truncate on transmittals for each statement execute function refuse_change();

create table transmittal_items (
  transmittal_id uuid not null references transmittals,
  version_id uuid not null references register_versions,
  ordinal int not null,
  primary key (transmittal_id, version_id)
);
create index transmittal_items_version on transmittal_items (version_id);

call make_append_only('register_versions', 'flags', 'transmittal_items');
`);
  }
}
