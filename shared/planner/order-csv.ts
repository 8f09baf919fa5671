import { csvLine, type CsvCell } from '#shared/export/csv.ts';
import type { Allotted } from './allot-stock.ts';
import { kitsText } from './kits-text.ts';
import type { OrderPlan } from './plan-order.ts';

const round = (value: number | null | undefined): number | null =>
  value === null || value === undefined ? null : Math.round(value * 1e4) / 1e4;

/** A work order's plan as CSV: a line for each structure, then the kits to order. */
export function orderCsv(
  plan: OrderPlan,
  {
    allotted,
    priceOf,
  }: { readonly allotted: readonly Allotted[]; readonly priceOf: (kitFt3: number) => number | null },
): string {
  const rows = plan.rows.map(({ structure, plan }): CsvCell[] => [
    structure.structureNumber,
    structure.kind,
    round(plan.depthFt),
    round(plan.boreIn),
    round(plan.voidFt3?.low),
    round(plan.voidFt3?.likely),
    round(plan.voidFt3?.high),
    plan.kits.likely === null ? null : kitsText(plan.kits.likely.kits),
    plan.faults.map(({ text }) => text).join(' '),
  ]);
  const kits = allotted.map((line): CsvCell[] => {
    const price = priceOf(line.kitFt3);
    return [
      line.kitFt3,
      line.planned,
      line.spares,
      line.wanted,
      line.atHand,
      line.short,
      price === null ? null : round(price * line.wanted),
    ];
  });
  return [
    [
      'Structure',
      'Kind',
      'Depth (ft)',
      'Bore (in)',
      'Void, low (ft³)',
      'Void, likely (ft³)',
      'Void, high (ft³)',
      'Kits (ft³)',
      'What is missing',
    ],
    ...rows,
    [],
    ['Kit (ft³)', 'Planned', 'Spares', 'To have', 'At hand', 'Short', 'Cost'],
    ...kits,
  ]
    .map(csvLine)
    .join('');
}
