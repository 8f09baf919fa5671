import { useMemo } from 'react';
import { usePlanForm } from '../lib/plan-form.ts';
import { PlanInput } from './plan-input.tsx';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { Figure } from '#src/components/ui/figure.tsx';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { classNames } from '#src/lib/class-names.ts';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Quantity, useUnitWord } from '#src/components/ui/quantity.tsx';
import {
  mostOpenWaterIn,
  waterAnswer,
  waterLimitIn,
  waterWhatIfs,
  type WaterAnswer,
} from '#shared/planner/water-answer.ts';
import type { Plan } from '#shared/planner/plan-types.ts';
import type { Standard } from '#shared/standard/types.ts';

/** What water in the open bore comes to with the pole in, and what to do about it. */
export function WaterSection({ plan, standard }: { readonly plan: Plan; readonly standard: Standard }) {
  const { texts } = usePlanForm();
  const { values } = plan;
  const typed =
    typeof values['waterIn'] === 'number' && (texts['waterIn'] ?? '').trim() !== ''
      ? values['waterIn']
      : null;
  const met = useMemo(
    () => (typed === null ? null : waterAnswer(values, typed, standard)),
    [values, typed, standard],
  );
  const rows = useMemo(() => waterWhatIfs(values, standard), [values, standard]);
  const most = useMemo(() => mostOpenWaterIn(values, standard), [values, standard]);
  const limit = waterLimitIn(standard);
  const goesIn = plan.leastAnnulusIn === null || plan.leastAnnulusIn > 0;
  return (
    <section aria-label="Water in the bore" className="print:break-inside-avoid">
      <SectionHead
        title="If water stands in the bore"
        aside={
          limit === null ? null : (
            <>
              limit with the pole in <Quantity value={limit} unit="in" />
            </>
          )
        }
      />
      <div
        className={classNames(
          'grid grid-cols-[9rem_minmax(0,1fr)] items-end gap-3 px-gutter py-3',
          met === null && 'print:hidden',
        )}
      >
        <PlanInput name="waterIn" label="Standing now" />
        <div aria-live="polite" className="text-table">
          {met && goesIn ? <Action answer={met} most={most} /> : null}
        </div>
      </div>
      {most === null || !goesIn ? (
        <p className="px-gutter pb-3 text-table text-ink-2">
          {goesIn ? 'Bore and pole are not known yet.' : 'The pole does not go into this bore.'}
        </p>
      ) : (
        <WaterTable rows={rows} most={most} />
      )}
    </section>
  );
}

function Action({ answer, most }: { readonly answer: WaterAnswer; readonly most: number | null }) {
  if (answer.withPoleIn === null) return <span className="text-muted">not known</span>;
  return (
    <span className="flex items-start gap-1.5">
      <Glyph name={answer.over ? 'triangle' : 'tick'} className="mt-0.5" />
      <span>
        <Quantity value={answer.withPoleIn} unit="in" digits={2} className="font-semibold" /> with the pole
        in.{' '}
        {answer.over && most !== null ? (
          <>
            Bail or pump to <Quantity value={tenthBelow(most)} unit="in" digits={1} /> or less before the pole
            goes in.
          </>
        ) : (
          'Pour.'
        )}
      </span>
    </span>
  );
}

function WaterTable({ rows, most }: { readonly rows: readonly WaterAnswer[]; readonly most: number }) {
  const inch = useUnitWord('in');
  return (
    <PlainTable
      caption="Water by depth met"
      rows={rows}
      rowKey={(row) => String(row.openIn)}
      columns={waterColumns(inch, most)}
    />
  );
}

function waterColumns(inch: string, most: number): readonly PlainColumn<WaterAnswer>[] {
  return [
    {
      id: 'open',
      title: `Open bore, ${inch}`,
      figures: true,
      cell: (row) => <Figure value={row.openIn} unit="in" digits={0} />,
    },
    {
      id: 'pole',
      title: `Pole in, ${inch}`,
      figures: true,
      cell: (row) => <Figure value={row.withPoleIn} unit="in" digits={2} />,
    },
    {
      id: 'do',
      title: 'Do',
      cell: (row) => (
        <span className="inline-flex items-center gap-1.5 whitespace-nowrap">
          <Glyph name={row.over ? 'triangle' : 'tick'} />
          {row.over ? (
            <>
              remove to <Quantity value={tenthBelow(most)} unit="in" digits={1} />
            </>
          ) : (
            'pour'
          )}
        </span>
      ),
    },
  ];
}

/** Rounded up, what may stand would be too much. */
const tenthBelow = (inches: number) => Math.floor(inches * 10 + 1e-6) / 10;
