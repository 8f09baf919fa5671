import { SectionHead } from '#src/components/ui/page-band.tsx';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';
import { fieldTitle } from '#shared/records/field-meta.ts';
import type { Kind } from '#shared/records/types.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';

type Part = RecordSheetData['uncertainty'][number];

const WORDS: Readonly<Record<Part['source'], string>> = {
  bore: 'Bore diameters',
  pole: 'Pole sizes',
  depth: 'Depths',
  gap: 'Gaps',
  width: 'Width of the gap',
  yield: 'Yield of the kits',
};

/** What the ± comes from, so that a crew measures again what pays most. */
export function UncertaintyTable({ data }: { data: RecordSheetData }) {
  const metric = useUnitSystem() === 'metric';
  const { record, uncertainty } = data;
  const { worstReading } = record.derived;
  if (uncertainty.length === 0) return null;
  const columns: readonly PlainColumn<Part>[] = [
    { id: 'source', title: 'Comes from', cell: (part) => sourceCell(part, record.kind) },
    {
      id: 'within',
      title: 'Known within (k = 2)',
      figures: true,
      cell: ({ source, within }) =>
        `± ${source === 'yield' ? percent(within) : formatQuantity(within, 'in', { metric, digits: metric ? 0 : 2 })}`,
    },
    {
      id: 'ratio',
      title: '± on the fill ratio',
      figures: true,
      cell: ({ ofRatio }) => `± ${formatQuantity(ofRatio, 'ratio', { metric, digits: 3 })}`,
    },
    { id: 'share', title: 'Share of u²', figures: true, cell: ({ share }) => percent(share) },
  ];
  return (
    <section aria-labelledby="uncertainty">
      <SectionHead title="What the ± comes from" id="uncertainty" />
      <PlainTable
        caption="Sources of the uncertainty of the fill ratio"
        columns={columns}
        rows={uncertainty}
        rowKey={(part) => part.source}
      />
      {worstReading ? (
        <p className="px-gutter py-2.5 text-small text-ink-2">{againFirst(record.kind, worstReading)}</p>
      ) : null}
    </section>
  );
}

/** The four gaps of a pad weigh the same: none of them comes before the others. */
function againFirst(kind: Kind, worstReading: string): string {
  return kind === 'relevel'
    ? 'Of the readings, the gaps contribute most: measure all four again first.'
    : `Of the readings, ${fieldTitle(kind, worstReading).toLowerCase()} contributes most: measure that again first.`;
}

function sourceCell({ source, fields }: Part, kind: Kind) {
  const read = fields.map((field) => fieldTitle(kind, field).toLowerCase()).join(', ');
  return (
    <>
      {WORDS[source]}
      <span className="block text-small font-normal text-muted">
        {source === 'yield' ? 'as the owner’s standard states it' : read || 'by the class table, not taped'}
      </span>
    </>
  );
}

const percent = (share: number): string => {
  const whole = Math.round(share * 100);
  return whole === 0 && share > 0 ? 'under 1 %' : `${whole} %`;
};
