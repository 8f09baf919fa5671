import { sayMoney } from '../lib/say-money.ts';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { Figure } from '#src/components/ui/figure.tsx';
import { useUnitWord } from '#src/components/ui/quantity.tsx';
import { kitsCost, kitsText } from '#shared/planner/kits-text.ts';
import type { KitAnswer, Plan } from '#shared/planner/plan-types.ts';
import { formatNumber } from '#shared/units/format-quantity.ts';

type PriceOf = (kitFt3: number) => number | null;
type Props = { readonly plan: Plan; readonly priceOf: PriceOf; readonly productCode: string };

/** The kits to take, why, and what they leave over. */
export function KitAnswers({ plan, priceOf, productCode }: Props) {
  const { kits, voidFt3, assumptions } = plan;
  const answer = kits.likely;
  const cost = answer ? kitsCost(answer.kits, priceOf) : null;
  return (
    <section aria-label="Kits">
      <SectionHead title="Kits to take" aside={productCode} />
      <div className="px-gutter py-3">
        {answer && voidFt3 ? (
          <>
            <p className="text-display font-semibold">
              {kitsText(answer.kits)} <span className="text-lead font-normal text-muted">ft³</span>
            </p>
            <p className="mt-1 text-table text-ink-2">
              Need <Quantity value={answer.needFt3} unit="ft3" className="font-semibold text-ink" />: void{' '}
              <Quantity value={voidFt3.likely} unit="ft3" /> and{' '}
              {formatNumber(assumptions.allowanceShare * 100, { digits: 1 })} %, over the yield at the
              temperature planned. Left over <Quantity value={answer.surplusFt3} unit="ft3" />.
              {cost === null ? null : (
                <>
                  {' '}
                  Cost <span className="font-semibold text-ink">{sayMoney(cost)}</span>.
                </>
              )}
            </p>
            {answer.placedFt3 < voidFt3.high ? (
              <p className="mt-1 text-table text-query">
                Were the void at its high end, these kits would be{' '}
                <Quantity value={voidFt3.high - answer.placedFt3} unit="ft3" /> short: measure bore and pole
                before mixing.
              </p>
            ) : null}
          </>
        ) : (
          <p className="text-ink-2">{missingWords(plan)}</p>
        )}
      </div>
      {voidFt3 ? <RangeTable plan={plan} priceOf={priceOf} /> : null}
    </section>
  );
}

function missingWords({ voidFt3, assumptions }: Plan): string {
  if (voidFt3 === null) return 'The void is not known yet: see what is marked beside the fields.';
  if (assumptions.kitsFt3.length === 0) return 'No kit size to choose from: enter a foam, or kit sizes.';
  return 'No set of these kits meets the need. Check the kit sizes and the void.';
}

type Row = { readonly word: string; readonly voidFt3: number; readonly answer: KitAnswer | null };

function RangeTable({ plan, priceOf }: { readonly plan: Plan; readonly priceOf: PriceOf }) {
  const volume = useUnitWord('ft3');
  const { voidFt3, kits } = plan;
  if (voidFt3 === null) return null;
  const rows: Row[] = (['low', 'likely', 'high'] as const).map((word) => ({
    word,
    voidFt3: voidFt3[word],
    answer: kits[word],
  }));
  const priced = kits.likely !== null && kitsCost(kits.likely.kits, priceOf) !== null;
  return (
    <PlainTable
      caption="Void and kits over the tolerances"
      rows={rows}
      rowKey={({ word }) => word}
      columns={rangeColumns(volume, priced ? priceOf : null)}
    />
  );
}

function rangeColumns(volume: string, priceOf: PriceOf | null): readonly PlainColumn<Row>[] {
  const cost: PlainColumn<Row> = {
    id: 'cost',
    title: 'Cost',
    figures: true,
    cell: ({ answer }) => {
      const sum = answer && priceOf ? kitsCost(answer.kits, priceOf) : null;
      return sum === null ? '–' : sayMoney(sum);
    },
  };
  return [
    { id: 'word', title: 'Void', cell: ({ word }) => word },
    { id: 'void', title: volume, figures: true, cell: (row) => <Figure value={row.voidFt3} unit="ft3" /> },
    {
      id: 'need',
      title: 'Need',
      figures: true,
      cell: ({ answer }) => <Figure value={answer?.needFt3 ?? null} unit="ft3" />,
    },
    {
      id: 'kits',
      title: 'Kits, ft³',
      cell: ({ answer }) => <span className="whitespace-nowrap">{answer ? kitsText(answer.kits) : '–'}</span>,
    },
    {
      id: 'over',
      title: 'Over',
      figures: true,
      cell: ({ answer }) => <Figure value={answer?.surplusFt3 ?? null} unit="ft3" />,
    },
    ...(priceOf ? [cost] : []),
  ];
}
