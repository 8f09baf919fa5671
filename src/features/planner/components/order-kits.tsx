import type { ReactNode } from 'react';
import { sayMoney } from '../lib/say-money.ts';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { counted, formatCount, formatDay } from '#src/lib/formats.ts';
import { lotBarred, type Allotted, type StockLot } from '#shared/planner/allot-stock.ts';
import { formatNumber } from '#shared/units/format-quantity.ts';

type Props = {
  readonly allotted: readonly Allotted[];
  readonly priceOf: (kitFt3: number) => number | null;
  /** Null: lots are not this reader's to see. */
  readonly lots: readonly StockLot[] | null;
  readonly day: string;
};

/** Kits of the whole order by size: to have, at hand by lot, and what is short. */
export function OrderKits({ allotted, priceOf, lots, day }: Props) {
  const short = allotted.reduce((sum, line) => sum + line.short, 0);
  const priced = allotted.some((line) => priceOf(line.kitFt3) !== null);
  return (
    <section aria-label="Kits to order">
      <SectionHead
        title="Kits for the work order"
        aside={
          allotted.length === 0 ? null : short > 0 ? (
            <span className="inline-flex items-center gap-1.5">
              <Glyph name="triangle" /> {counted(short, 'kit')} to order
            </span>
          ) : (
            <span className="inline-flex items-center gap-1.5">
              <Glyph name="tick" /> all at hand
            </span>
          )
        }
      />
      {allotted.length === 0 ? (
        <p className="px-gutter py-3 text-ink-2">No structure has kits yet.</p>
      ) : (
        <PlainTable
          caption="Kits by size"
          rows={allotted}
          rowKey={(line) => String(line.kitFt3)}
          columns={columnsOf({ priceOf: priced ? priceOf : null, known: lots !== null })}
        />
      )}
      {priced ? <Costs allotted={allotted} priceOf={priceOf} /> : null}
      <Barred lots={lots} day={day} />
    </section>
  );
}

function columnsOf({
  priceOf,
  known,
}: {
  readonly priceOf: Props['priceOf'] | null;
  /** What stands in stock is known even where nobody counted. */
  readonly known: boolean;
}): readonly PlainColumn<Allotted>[] {
  const cost: PlainColumn<Allotted> = {
    id: 'cost',
    title: 'Cost',
    figures: true,
    cell: (line) => {
      const price = priceOf?.(line.kitFt3) ?? null;
      return price === null ? '–' : sayMoney(price * line.wanted);
    },
  };
  return [
    {
      id: 'kit',
      title: 'Kit, ft³',
      figures: true,
      cell: (line) => <b className="font-semibold">{formatNumber(line.kitFt3, { digits: 4 })}</b>,
    },
    { id: 'planned', title: 'Planned', figures: true, cell: (line) => formatCount(line.planned) },
    { id: 'spares', title: 'Spares', figures: true, cell: (line) => formatCount(line.spares) },
    { id: 'wanted', title: 'To have', figures: true, cell: (line) => formatCount(line.wanted) },
    {
      id: 'hand',
      title: 'At hand',
      figures: true,
      cell: (line) => (known || line.byHand ? formatCount(line.atHand) : '–'),
    },
    {
      id: 'short',
      title: 'To order',
      figures: true,
      cell: (line) => (
        <span className={line.short > 0 ? 'font-semibold text-nonconform' : undefined}>
          {formatCount(line.short)}
        </span>
      ),
    },
    ...(priceOf ? [cost] : []),
    { id: 'lots', title: 'From lots', cell: (line) => <FromLots line={line} /> },
  ];
}

function FromLots({ line }: { readonly line: Allotted }): ReactNode {
  if (line.from.length === 0)
    return <span className="text-muted">{line.byHand ? 'counted by hand' : '–'}</span>;
  return line.from.map(({ lot, expiresOn, kits }) => (
    <span key={lot} className="mr-3 inline-block whitespace-nowrap">
      {formatCount(kits)} of {lot}
      {expiresOn ? <span className="text-muted"> to {formatDay(expiresOn)}</span> : null}
    </span>
  ));
}

function Costs({ allotted, priceOf }: Pick<Props, 'allotted' | 'priceOf'>) {
  const unpriced = allotted.filter((line) => priceOf(line.kitFt3) === null);
  const total = allotted.reduce((sum, line) => sum + (priceOf(line.kitFt3) ?? 0) * line.wanted, 0);
  const toOrder = allotted.reduce((sum, line) => sum + (priceOf(line.kitFt3) ?? 0) * line.short, 0);
  return (
    <p className="px-gutter py-2 text-table text-ink-2">
      Kits to have cost <b className="font-semibold text-ink">{sayMoney(total)}</b>, those to order{' '}
      <b className="font-semibold text-ink">{sayMoney(toOrder)}</b>
      {unpriced.length > 0
        ? `; without ${unpriced.map(({ kitFt3 }) => `${formatNumber(kitFt3, { digits: 4 })} ft³`).join(', ')}, which have no price`
        : null}
      .
    </p>
  );
}

/** Lots that are there and do not count, and why. */
function Barred({ lots, day }: Pick<Props, 'lots' | 'day'>) {
  if (lots === null)
    return (
      <p className="px-gutter py-2 text-small text-muted">
        What the owner holds in stock is not shown here. Write your own count under “Kits at hand”.
      </p>
    );
  const barred = lots.flatMap((lot) => {
    const why = lotBarred(lot, day);
    return why === null ? [] : [`${lot.number} (${why})`];
  });
  if (barred.length === 0) return null;
  return <p className="px-gutter py-2 text-small text-muted">Not counted: {barred.join(', ')}.</p>;
}
