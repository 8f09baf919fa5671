import { Migration } from '@mikro-orm/migrations';

/** PDF files of a batch's record sheets, each made for the person who asked. */
export class SheetFiles20260105091200 extends Migration {
  override up(): void {
    this.addSql(`
create table sheet_files (
  id uuid primary key default gen_random_uuid(),
  batch_id uuid not null references batches,
  -- The lines as they were shown when it was asked for.
  run_id uuid not null references check_runs,
  paper text not null check (paper in ('letter', 'a4')),
  state text not null default 'queued' check (state in ('queued', 'running', 'ready', 'failed')),
  sheets int not null check (sheets > 0),
  pages int,
  sha256 text references blobs,
  size bigint,
  file_name text not null,
  problem jsonb,
  -- What a person may see of a line differs: nobody else gets this file.
  requested_by uuid not null references users,
  created_at timestamptz(3) not null default now(),
  finished_at timestamptz(3),
  check (state <> 'ready' or (sha256 is not null and size is not null and pages is not null and finished_at is not null))
);
create index sheet_files_batch on sheet_files (batch_id, created_at);
create index sheet_files_run on sheet_files (run_id);
create index sheet_files_sha on sheet_files (sha256);
`);
  }
}
