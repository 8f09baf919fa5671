import { SectionHead } from '#src/components/ui/page-band.tsx';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { formatWallClock } from '#src/lib/formats.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';
import { fieldTitle } from '#shared/records/field-meta.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';

type Done = RecordSheetData['strength'][number];

/** How strong the foam was estimated to be when it was first relied on. */
export function StrengthTable({ data }: { data: RecordSheetData }) {
  const metric = useUnitSystem() === 'metric';
  const { record, strength } = data;
  if (strength.length === 0) return null;
  const columns: readonly PlainColumn<Done>[] = [
    {
      id: 'what',
      title: 'When',
      cell: ({ field, event }) =>
        event === 1 ? fieldTitle(record.kind, field) : `${fieldTitle('event', field)}, event ${event}`,
    },
    { id: 'at', title: 'Time', cell: ({ at }) => formatWallClock(at) },
    {
      id: 'minutes',
      title: 'After the last pour',
      figures: true,
      cell: ({ minutes }) => formatQuantity(minutes, 'min', { metric }),
    },
    {
      id: 'temp',
      title: 'Coldest component',
      figures: true,
      cell: ({ tempF }) => formatQuantity(tempF, 'degF', { metric }),
    },
    {
      id: 'share',
      title: 'Share of full strength',
      figures: true,
      cell: ({ share }) => `about ${Math.round(share * 100)} %`,
    },
  ];
  return (
    <section aria-labelledby="strength">
      <SectionHead title="Strength of the foam" id="strength" aside="an estimate" />
      <PlainTable
        caption="Estimated strength of the foam when it was relied on"
        columns={columns}
        rows={strength}
        rowKey={({ event, field }) => `${event} ${field}`}
      />
      <p className="px-gutter py-2.5 text-small text-ink-2">
        By the product’s curve and the coldest component of the last pour. It is never a design value.
      </p>
    </section>
  );
}
