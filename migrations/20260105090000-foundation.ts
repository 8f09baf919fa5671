import { Migration } from '@mikro-orm/migrations';

/** Shared functions, people, sessions and what guards the door. */
export class Foundation20260105090000 extends Migration {
  override up(): void {
    this.addSql(`
-- Append-only: refused per statement, so that a change of zero rows is refused too, and ENABLE ALWAYS, so that
-- a replication role does not get around it.
create function refuse_change() returns trigger language plpgsql as $$
begin
  raise exception 'Rows of % are kept as written; % is refused.', tg_table_name, lower(tg_op) using errcode = 'UP001';
end $$;

create procedure make_append_only(variadic names text[]) language plpgsql as $$
declare name text;
begin
  foreach name in array names loop
    execute format('create trigger append_only before update or delete or truncate on %I for each statement execute function refuse_change()', name);
    execute format('alter table %I enable always trigger append_only', name);
  end loop;
end $$;

-- lpad would cut a number that outgrows its width.
create function human_number(prefix text, n bigint, width int) returns text language sql immutable as $$
  select prefix || '-' || repeat('0', greatest(0, width - length(n::text))) || n
$$;

create table installation (
  key text primary key,
  value jsonb not null,
  at timestamptz(3) not null default now()
);

create table organisations (
  id uuid primary key default gen_random_uuid(),
  kind text not null check (kind in ('owner', 'contractor')),
  name text not null check (btrim(name) <> ''),
  version int not null default 1,
  created_at timestamptz(3) not null default now(),
  unique (name),
  unique (id, kind)
);

create table users (
  id uuid primary key default gen_random_uuid(),
  org_id uuid not null,
  role text not null check (role in ('contractor', 'inspector', 'engineer', 'clerk', 'auditor', 'administrator')),
  -- Only a contractor's people are contractors, and they are nothing else.
  org_kind text not null generated always as (case when role = 'contractor' then 'contractor' else 'owner' end) stored,
  email text not null check (email like '%_@_%'),
  name text not null check (btrim(name) <> ''),
  password_hash text,
  active boolean not null default true,
  version int not null default 1,
  created_at timestamptz(3) not null default now(),
  last_sign_in_at timestamptz(3),
  foreign key (org_id, org_kind) references organisations (id, kind)
);
create unique index users_email on users (lower(email));
create index users_org on users (org_id);
create index users_page on users (created_at, id);

create table sessions (
  sid text primary key,
  sess json not null,
  expire timestamptz(3) not null
);
create index sessions_expire on sessions (expire);
create index sessions_user on sessions ((sess #>> '{passport,user}'));

create table tokens (
  hash text primary key,
  user_id uuid not null references users,
  purpose text not null check (purpose in ('invitation', 'password-reset')),
  created_at timestamptz(3) not null default now(),
  expires_at timestamptz(3) not null,
  used_at timestamptz(3)
);
create index tokens_user on tokens (user_id, purpose);

create table throttles (
  key text not null,
  window_start timestamptz(3) not null,
  n int not null default 0,
  primary key (key, window_start)
);
create index throttles_window on throttles (window_start);

create table idempotency (
  user_id uuid not null references users,
  key text not null,
  request_hash text not null,
  status int,
  reply jsonb,
  headers jsonb,
  created_at timestamptz(3) not null default now(),
  primary key (user_id, key)
);
create index idempotency_age on idempotency (created_at);

-- Apart from the trail: a refused sign-in must not queue for the chain's lock.
create table refusals (
  id bigint generated always as identity primary key,
  at timestamptz(3) not null default now(),
  user_id uuid,
  email text,
  address text,
  action text not null,
  subject text,
  code text not null,
  detail text
);
create index refusals_at on refusals (at);
call make_append_only('refusals');
`);
  }
}
