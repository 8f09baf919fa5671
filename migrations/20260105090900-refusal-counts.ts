import { Migration } from '@mikro-orm/migrations';

/** How often a caller was refused in an hour: past a number of rows, refusals are counted and no longer kept one by one. */
export class RefusalCounts20260105090900 extends Migration {
  override up(): void {
    this.addSql(`
create table refusal_counts (
  -- An account by id, or an address on the network: never a text that a stranger typed.
  key text not null,
  window_start timestamptz(3) not null,
  n int not null,
  primary key (key, window_start)
);
`);
  }
}
