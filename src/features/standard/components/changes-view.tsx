import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { counted } from '#src/lib/formats.ts';
import type { RuleChange } from './rule-changes.ts';

type Props = { readonly changes: readonly RuleChange[]; readonly before: string; readonly after: string };

function columnsOf(before: string, after: string): readonly PlainColumn<RuleChange>[] {
  return [
    { id: 'rule', title: 'Rule', cell: (row) => row.title },
    { id: 'before', title: `In ${before}`, cell: (row) => row.before },
    { id: 'after', title: `In ${after}`, cell: (row) => row.after },
  ];
}

export function ChangesView({ changes, before, after }: Props) {
  return (
    <div>
      <SectionHead title={`What differs from ${before}`} aside={counted(changes.length, 'rule')} />
      {changes.length === 0 ? (
        <p className="px-gutter py-3 text-ink-2">No rule differs.</p>
      ) : (
        <PlainTable
          caption={`What differs between ${before} and ${after}`}
          rows={changes}
          rowKey={(row) => row.code}
          columns={columnsOf(before, after)}
        />
      )}
    </div>
  );
}
