import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { counted, formatWallClock } from '#src/lib/formats.ts';
import type { PourRow } from '#shared/generated/api-types.ts';
import { formatNumber, formatQuantity } from '#shared/units/format-quantity.ts';

/** Pours of the line; a later event is rework or repair. */
export function PoursTable({ pours }: { pours: readonly PourRow[] }) {
  const metric = useUnitSystem() === 'metric';
  const figure = (value: number | null, unit: string) =>
    value === null ? 'not written' : formatQuantity(value, unit, { metric });
  const columns: readonly PlainColumn<PourRow>[] = [
    { id: 'pour', title: 'Pour', figures: true, cell: (pour) => pour.pourNumber ?? '' },
    { id: 'event', title: 'Event', figures: true, cell: (pour) => pour.event },
    {
      id: 'at',
      title: 'Poured',
      cell: (pour) => (pour.pouredAt === null ? 'not written' : formatWallClock(pour.pouredAt)),
    },
    { id: 'product', title: 'Product', cell: (pour) => pour.product ?? 'not written' },
    { id: 'lot', title: 'Lot', cell: (pour) => pour.lot ?? 'not written' },
    { id: 'kit', title: 'Kit', figures: true, cell: (pour) => figure(pour.kitFt3, 'ft3') },
    { id: 'quantity', title: 'Kits', figures: true, cell: (pour) => pour.quantity ?? '' },
    { id: 'wasted', title: 'Wasted', figures: true, cell: (pour) => formatNumber(pour.wastedQuantity) },
    {
      id: 'a',
      title: 'Component A',
      figures: true,
      cell: (pour) => figure(pour.componentATempF, 'degF'),
    },
    {
      id: 'b',
      title: 'Component B',
      figures: true,
      cell: (pour) => figure(pour.componentBTempF, 'degF'),
    },
    { id: 'row', title: 'Cells', cell: (pour) => `${pour.sheet}!${pour.row}` },
  ];
  return (
    <section aria-labelledby="pours">
      <SectionHead title="Pours" id="pours" aside={counted(pours.length, 'pour')} />
      {pours.length === 0 ? (
        <p className="px-gutter py-2.5 text-table text-ink-2">No pour is written for this line.</p>
      ) : (
        <PlainTable
          caption="Pours of this line"
          columns={columns}
          rows={pours}
          rowKey={(pour) => `${pour.sheet} ${pour.row} ${pour.event} ${pour.pourNumber}`}
        />
      )}
    </section>
  );
}
