import { Migration } from '@mikro-orm/migrations';

/** Mail to send, mail captured on this machine, progress of jobs. */
export class Messages20260105090700 extends Migration {
  override up(): void {
    this.addSql(`
create table outbox (
  id uuid primary key default gen_random_uuid(),
  event text not null,
  recipient text not null,
  recipient_name text not null default '',
  template text not null,
  data jsonb not null,
  -- Stable over attempts, so that a message sent twice is seen as one.
  message_id text not null unique,
  state text not null default 'queued' check (state in ('queued', 'sent', 'failed')),
  attempts int not null default 0,
  last_error text,
  created_at timestamptz(3) not null default now(),
  sent_at timestamptz(3),
  unique (event, recipient, template)
);
create index outbox_waiting on outbox (created_at) where state <> 'sent';

create table captured_mail (
  id uuid primary key default gen_random_uuid(),
  message_id text,
  sender text not null,
  recipients text[] not null,
  subject text not null default '',
  source text not null,
  at timestamptz(3) not null default now()
);
create index captured_mail_page on captured_mail (at, id);

create table job_progress (
  subject text primary key,
  state text not null check (state in ('queued', 'running', 'done', 'failed')),
  done int not null default 0,
  total int,
  problem jsonb,
  updated_at timestamptz(3) not null default now()
);
`);
  }
}
