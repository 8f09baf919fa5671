import { Migration } from '@mikro-orm/migrations';

/** What the first page of each filter of register and nonconformities reads, in the order that it shows. */
export class ListIndexes20260105091000 extends Migration {
  override up(): void {
    this.addSql(`
create index register_versions_kind on register_versions (kind, entered_at, id);
create index register_versions_nonconforming on register_versions (entered_at, id) where nonconforming;
create index register_versions_installed on register_versions (coalesce(work_day, date '0001-01-01'), id);
create index register_versions_structure on register_versions (structure_number, id);
-- Beginnings of numbers, whatever their case.
create index register_versions_structure_like on register_versions (lower(structure_number) text_pattern_ops);
create index register_versions_number_like on register_versions (lower(record_number) text_pattern_ops);
-- A record's versions: the unique index covers those without amendment alone.
create index register_versions_of_record on register_versions (record_id);

create index records_products on records using gin (product_codes);
create index findings_structure_like on findings (lower(structure_number) text_pattern_ops);
create index finding_states_conceded on finding_states (sort_day, finding_id) where grounds = 'concession';
create index lines_recorded on lines (batch_id) where record_id is not null;
analyze register_versions;
analyze records;
analyze findings;
`);
  }

  override down(): void {
    this.addSql(`
drop index register_versions_kind, register_versions_nonconforming, register_versions_installed, register_versions_structure,
  register_versions_structure_like, register_versions_number_like, register_versions_of_record, records_products,
  findings_structure_like, finding_states_conceded, lines_recorded;
`);
  }
}
