import { Migration } from '@mikro-orm/migrations';

/** The hash-chained trail. */
export class Trail20260105090600 extends Migration {
  override up(): void {
    this.addSql(`
create table trail (
  seq bigint primary key,
  at timestamptz not null,
  actor_id uuid,
  actor_name text,
  actor_role text,
  action text not null,
  subject_type text not null,
  subject_id text not null,
  subject_label text,
  payload_text text not null,
  prev text not null,
  hash text not null unique
);
create index trail_subject on trail (subject_type, subject_id, seq);
create index trail_actor on trail (actor_id, seq);
create index trail_action on trail (action, seq);
create index trail_at on trail (at);
call make_append_only('trail');

-- Where the chain ends. Rows cut off the end show as a difference from it.
create table trail_head (
  one boolean primary key default true check (one),
  seq bigint not null,
  hash text not null
);
insert into trail_head values (true, 0, repeat('0', 64));

-- Entries wait here until their transaction commits and are chained then: the chain's lock is held for an instant,
-- and always last, so that it takes no part in a deadlock.
create table trail_staged (
  id bigint generated always as identity primary key,
  at timestamptz not null default clock_timestamp(),
  actor_id uuid,
  actor_name text,
  actor_role text,
  action text not null,
  subject_type text not null,
  subject_id text not null,
  subject_label text,
  payload_text text not null
);

-- One field of the canonical text: its length in bytes, a colon, itself; a missing one is a hyphen. No two rows read alike.
create function trail_field(value text) returns text language sql immutable as $$
  select coalesce(octet_length(value) || ':' || value, '-') || E'\\n'
$$;
create function trail_hash(e trail) returns text language sql immutable as $$
  select encode(sha256(convert_to(
    trail_field(e.prev) || trail_field(e.seq::text) || trail_field(((extract(epoch from e.at) * 1000000)::bigint)::text)
    || trail_field(e.actor_id::text) || trail_field(e.actor_name) || trail_field(e.actor_role) || trail_field(e.action)
    || trail_field(e.subject_type) || trail_field(e.subject_id) || trail_field(e.subject_label) || trail_field(e.payload_text),
    'UTF8')), 'hex')
$$;

-- Runs as the owner: the application's role may stage an entry, but writes none itself.
create function trail_chain() returns trigger language plpgsql security definer set search_path = public, pg_temp as $$
declare
  head trail_head;
  e trail;
begin
  select * into strict head from trail_head for update;
  e.seq := head.seq + 1;
  e.at := new.at;
  e.actor_id := new.actor_id;
  e.actor_name := new.actor_name;
  e.actor_role := new.actor_role;
  e.action := new.action;
  e.subject_type := new.subject_type;
  e.subject_id := new.subject_id;
  e.subject_label := new.subject_label;
  e.payload_text := new.payload_text;
  e.prev := head.hash;
  e.hash := trail_hash(e);
  insert into trail values (e.*);
  update trail_head set seq = e.seq, hash = e.hash;
  delete from trail_staged where id = new.id;
  return null;
end $$;
create constraint trigger trail_chain after insert on trail_staged deferrable initially deferred
  for each row execute function trail_chain();
alter table trail_staged enable always trigger trail_chain;

-- Every place where the chain does not hold, first ones first; empty when it holds.
create function trail_faults(most int default 20) returns table (seq bigint, fault text) language sql stable as $$
  with walk as (
    select t, t.seq, t.prev, t.hash, lag(t.seq, 1, 0::bigint) over w as before_seq, lag(t.hash, 1, repeat('0', 64)) over w as before_hash
    from trail t window w as (order by t.seq)
  ), faults as (
    select walk.seq, case
      when walk.hash <> trail_hash(walk.t) then 'changed'
      when walk.seq <> walk.before_seq + 1 then 'missing-before'
      when walk.prev <> walk.before_hash then 'link-broken'
    end as fault
    from walk
    union all
    select head.seq, 'end-differs' from trail_head head
    where (head.seq, head.hash) is distinct from
      (coalesce((select max(t.seq) from trail t), 0), coalesce((select t.hash from trail t order by t.seq desc limit 1), repeat('0', 64)))
  )
  select f.seq, f.fault from faults f where f.fault is not null order by f.seq, f.fault limit most
$$;
`);
  }
}
