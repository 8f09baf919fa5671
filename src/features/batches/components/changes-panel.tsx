import { useQuery } from '@tanstack/react-query';
import { batchChangesQuery } from '../api/batch-changes.ts';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { formatWallClock } from '#src/lib/formats.ts';
import type { BatchChanges, ValueChange } from '#shared/generated/api-types.ts';

function Said({ value, unit }: { value: ValueChange['before']; unit: string | null }) {
  if (value === null) return 'blank';
  return typeof value === 'number' ? <Quantity value={value} unit={unit ?? ''} /> : formatWallClock(value);
}

const COLUMNS: readonly PlainColumn<ValueChange>[] = [
  {
    id: 'structure',
    title: 'Structure',
    cell: (row) => <b className="font-semibold">{row.structureNumber}</b>,
  },
  { id: 'title', title: 'Value', cell: (row) => row.title },
  {
    id: 'before',
    title: 'Before',
    figures: true,
    cell: (row) => <Said value={row.before} unit={row.unit} />,
  },
  {
    id: 'after',
    title: 'Now',
    figures: true,
    cell: (row) => (
      <b className="font-semibold">
        <Said value={row.after} unit={row.unit} />
      </b>
    ),
  },
  { id: 'cell', title: 'Cell', cell: (row) => row.cell ?? '' },
];

/** What changed since the workbook before; while there is one only, since its first check. */
export function ChangesPanel({ batchId }: { batchId: string }) {
  const changes = useQuery(batchChangesQuery(batchId));
  if (changes.isPending) return <Skeleton lines={4} />;
  if (changes.isError) {
    return <ErrorState error={changes.error} what="What changed" onRetry={() => void changes.refetch()} />;
  }
  const { from, items, added, removed, findings } = changes.data;
  if (from === null) {
    return (
      <EmptyState title="There is one check so far">
        Replace the workbook, and what the new one changes stands here: values, lines and findings.
      </EmptyState>
    );
  }
  const nothing =
    items.length + added.length + removed.length + findings.gone.length + findings.new.length === 0;
  if (nothing) {
    return (
      <EmptyState title="Nothing changed since the workbook before">
        The values and the findings are the same.
      </EmptyState>
    );
  }
  return (
    <>
      {items.length > 0 ? <SectionHead title="Values" aside={`${items.length} changed`} /> : null}
      {items.length > 0 ? (
        <PlainTable
          caption="Values changed"
          rows={items}
          rowKey={(row) => `${row.structureNumber} ${row.kind} ${row.title} ${row.cell}`}
          columns={COLUMNS}
        />
      ) : null}
      <Names title="Lines new in the workbook" names={added} />
      <Names title="Lines no longer in the workbook" names={removed} />
      <Findings title="Findings gone" gone list={findings.gone} />
      <Findings title="Findings new" list={findings.new} />
      <p className="px-gutter py-3 text-table text-muted">
        A measured value that came from failing to passing raises a query: answer it with the reason. Both
        values are shown to inspector and auditor.
      </p>
    </>
  );
}

function Names({ title, names }: { title: string; names: readonly string[] }) {
  if (names.length === 0) return null;
  return (
    <>
      <SectionHead title={title} aside={names.length} />
      <p className="border-b border-hairline px-gutter py-2">{names.join(', ')}</p>
    </>
  );
}

type FindingsProps = {
  readonly title: string;
  readonly gone?: boolean;
  readonly list: BatchChanges['findings']['gone'];
};

function Findings({ title, gone, list }: FindingsProps) {
  if (list.length === 0) return null;
  return (
    <>
      <SectionHead title={title} aside={list.length} />
      <ul className="border-b border-hairline px-gutter py-2">
        {together(list).map(({ one, times }) => (
          <li key={`${one.code} ${one.structureNumber}`} className="flex items-center gap-2 py-0.5">
            <Glyph name={gone ? 'tick' : 'info'} />
            <span className="font-semibold">{one.structureNumber ?? 'The workbook'}</span> {one.title}
            {times > 1 ? <span className="text-muted">{times} times</span> : null}
          </li>
        ))}
      </ul>
    </>
  );
}

/** The same rule on the same structure is said once, and how often. */
function together(
  list: FindingsProps['list'],
): readonly { one: FindingsProps['list'][number]; times: number }[] {
  const known = new Map<string, { one: FindingsProps['list'][number]; times: number }>();
  for (const one of list) {
    const key = `${one.code} ${one.structureNumber}`;
    known.set(key, { one, times: (known.get(key)?.times ?? 0) + 1 });
  }
  return [...known.values()];
}
