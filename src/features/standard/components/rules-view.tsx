import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { SEVERITY_WORDS, StateWord } from '#src/components/ui/state-word.tsx';
import type { RuleRow } from './rule-table.ts';

const COLUMNS: readonly PlainColumn<RuleRow>[] = [
  {
    id: 'title',
    title: 'Rule and its code',
    cell: (row) => (
      <span className="flex flex-wrap gap-x-3 sm:w-80">
        <b>{row.title}</b>
        <span className="text-muted">{row.code}</span>
      </span>
    ),
  },
  {
    id: 'limits',
    title: 'Limits',
    cell: (row) =>
      row.limits.length === 0 ? (
        <span className="text-muted">the record itself</span>
      ) : (
        row.limits.map((limit) => (
          <span key={limit.key} className="flex max-w-md items-baseline justify-between gap-4">
            <span>{limit.title}</span>
            <span className="shrink-0">
              <Quantity value={limit.value} unit={limit.unit} />
            </span>
          </span>
        ))
      ),
  },
  { id: 'severity', title: 'Severity', cell: (row) => <StateWord {...SEVERITY_WORDS[row.severity]} /> },
  {
    id: 'on',
    title: 'Checked',
    cell: (row) => (row.on ? <StateWord glyph="tick" word="on" /> : <StateWord glyph="dotted" word="off" />),
  },
];

export function RulesView({ rows }: { rows: readonly RuleRow[] }) {
  return (
    <PlainTable caption="Rules of this version" columns={COLUMNS} rows={rows} rowKey={(row) => row.code} />
  );
}
