import { useMemo } from 'react';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { Figure } from '#src/components/ui/figure.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Quantity, useUnitWord } from '#src/components/ui/quantity.tsx';
import { kitsText } from '#shared/planner/kits-text.ts';
import { rockWhatIfs, type RockAnswer } from '#shared/planner/rock-what-ifs.ts';
import type { PlanReading } from '#shared/planner/read-plan.ts';
import type { PlanContext } from '#shared/planner/plan-types.ts';

/** What the plan becomes when the auger meets rock. */
export function RockSection({
  reading,
  context,
}: {
  readonly reading: PlanReading;
  readonly context: PlanContext;
}) {
  const rows = useMemo(() => rockWhatIfs(reading, context), [reading, context]);
  const foot = useUnitWord('ft');
  const inch = useUnitWord('in');
  const volume = useUnitWord('ft3');
  return (
    <section aria-label="Rock" className="print:break-inside-avoid">
      <SectionHead title="If the auger meets rock" />
      <PlainTable
        caption="Depth and kits by ground met"
        rows={rows}
        rowKey={(row) => String(row.met)}
        columns={rockColumns({ foot, inch, volume })}
      />
      <p className="px-gutter py-2 text-small text-muted">
        By the rule for rock of the owner’s standard. A depth by design is kept where it is the greater.
      </p>
    </section>
  );
}

function Met({ met }: { readonly met: RockAnswer['met'] }) {
  if (met === 'soil') return 'soil all the way';
  if (met === 'rock') return 'rock from grade';
  return (
    <>
      rock from <Quantity value={met} unit="ft" />
    </>
  );
}

type UnitWords = { readonly foot: string; readonly inch: string; readonly volume: string };

function rockColumns(words: UnitWords): readonly PlainColumn<RockAnswer>[] {
  return [
    { id: 'met', title: 'Ground', cell: (row) => <Met met={row.met} /> },
    {
      id: 'due',
      title: `Due, ${words.foot}`,
      figures: true,
      cell: (row) => <Figure value={row.dueFt} unit="ft" />,
    },
    {
      id: 'bore',
      title: `Bore, ${words.inch}`,
      figures: true,
      cell: (row) => <Figure value={row.boreIn} unit="in" digits={0} />,
    },
    {
      id: 'void',
      title: `Void, ${words.volume}`,
      figures: true,
      cell: (row) => <Figure value={row.voidFt3} unit="ft3" />,
    },
    {
      id: 'kits',
      title: 'Kits, ft³',
      cell: (row) => <span className="whitespace-nowrap">{row.kits ? kitsText(row.kits.kits) : '–'}</span>,
    },
  ];
}
