import { Migration } from '@mikro-orm/migrations';

/** What the owner sets: work orders and their design, products, lots, the construction standard. */
export class Work20260105090100 extends Migration {
  override up(): void {
    this.addSql(`
create table work_orders (
  id uuid primary key default gen_random_uuid(),
  number text not null unique check (btrim(number) <> ''),
  title text not null,
  contractor_id uuid not null,
  contractor_kind text not null generated always as ('contractor') stored,
  zone text not null,
  -- GeoJSON polygon within which the work lies, where the order has one.
  area jsonb,
  state text not null default 'open' check (state in ('open', 'closed')),
  starts_on date,
  due_on date,
  planned_temperature_f double precision,
  -- A batch is numbered batch_prefix-NN within its order.
  batch_prefix text not null,
  batch_count int not null default 0,
  version int not null default 1,
  created_by uuid references users,
  created_at timestamptz(3) not null default now(),
  foreign key (contractor_id, contractor_kind) references organisations (id, kind)
);
create index work_orders_contractor on work_orders (contractor_id, created_at, id);
create index work_orders_page on work_orders (created_at, id);
create unique index work_orders_prefix on work_orders (batch_prefix);

-- Numbers are reused when a structure is replaced: one living structure a number.
create table structures (
  id uuid primary key default gen_random_uuid(),
  number text not null check (btrim(number) <> ''),
  retired_at timestamptz(3),
  created_at timestamptz(3) not null default now()
);
create unique index structures_living on structures (number) where retired_at is null;
create index structures_number on structures (number);

create table planned (
  id uuid primary key default gen_random_uuid(),
  work_order_id uuid not null references work_orders,
  structure_id uuid not null references structures,
  kind text not null check (kind in ('set', 'straighten', 'relevel')),
  amendment int not null default 0 check (amendment >= 0),
  -- From which work day the amendment counts; null: always.
  effective_on date,
  design jsonb not null,
  -- The amendment takes the structure off the order.
  removed boolean not null default false,
  actor_id uuid references users,
  created_at timestamptz(3) not null default now(),
  unique (work_order_id, structure_id, kind, amendment)
);
create index planned_structure on planned (structure_id, kind);
call make_append_only('planned');

create view planned_current as
  select distinct on (p.work_order_id, p.structure_id, p.kind) p.*, s.number as structure_number
  from planned p join structures s on s.id = p.structure_id
  order by p.work_order_id, p.structure_id, p.kind, p.amendment desc;

create table products (
  id uuid primary key default gen_random_uuid(),
  code text not null unique check (btrim(code) <> ''),
  name text not null,
  created_at timestamptz(3) not null default now()
);
create table product_versions (
  id uuid primary key default gen_random_uuid(),
  product_id uuid not null references products,
  n int not null check (n >= 1),
  effective_on date not null,
  body jsonb not null,
  actor_id uuid references users,
  created_at timestamptz(3) not null default now(),
  unique (product_id, n),
  unique (product_id, effective_on)
);
call make_append_only('product_versions');

create table lots (
  id uuid primary key default gen_random_uuid(),
  product_id uuid not null references products,
  number text not null check (btrim(number) <> ''),
  expires_on date,
  version int not null default 1,
  created_at timestamptz(3) not null default now(),
  unique (product_id, number)
);
create index lots_number on lots (number);
create table lot_events (
  id uuid primary key default gen_random_uuid(),
  lot_id uuid not null references lots,
  type text not null check (type in ('received', 'held', 'released', 'recalled')),
  kit_ft3 double precision check (kit_ft3 > 0),
  quantity int check (quantity > 0),
  reason text,
  effective_on date not null default current_date,
  actor_id uuid references users,
  at timestamptz(3) not null default now(),
  check (type <> 'received' or (kit_ft3 is not null and quantity is not null)),
  check (type = 'received' or btrim(coalesce(reason, '')) <> '')
);
create index lot_events_lot on lot_events (lot_id, at);
call make_append_only('lot_events');

-- Status now: the last of held, released, recalled.
create view lot_status as
  select l.id as lot_id, l.product_id, p.code as product, l.number, l.expires_on,
    coalesce((
      select case e.type when 'held' then 'held' when 'recalled' then 'recalled' else 'in-use' end
      from lot_events e where e.lot_id = l.id and e.type <> 'received' order by e.at desc, e.id desc limit 1
    ), 'in-use') as status
  from lots l join products p on p.id = l.product_id;

create table standard_versions (
  id uuid primary key default gen_random_uuid(),
  n int not null unique check (n >= 1),
  title text not null default '',
  effective_on date not null,
  body jsonb not null,
  state text not null default 'draft' check (state in ('draft', 'published')),
  author_id uuid references users,
  approver_id uuid references users,
  published_at timestamptz(3),
  note text,
  version int not null default 1,
  created_at timestamptz(3) not null default now(),
  check (author_id <> approver_id),
  check (state = 'draft' or (approver_id is not null and author_id is not null and published_at is not null))
);
create unique index standard_versions_effective on standard_versions (effective_on) where state = 'published';

create function refuse_frozen() returns trigger language plpgsql as $$
begin
  if old.state = tg_argv[0] then
    raise exception 'This row of % is % and stays as it is.', tg_table_name, tg_argv[0] using errcode = 'UP002';
  end if;
  if tg_op = 'DELETE' then return old; end if;
  return new;
end $$;
create trigger frozen before update or delete on standard_versions for each row execute function refuse_frozen('published');
alter table standard_versions enable always trigger frozen;
create trigger never_emptied before truncate on standard_versions for each statement execute function refuse_change();
`);
  }
}
