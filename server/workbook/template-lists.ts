import type { Column, SheetLayout } from '#shared/workbook/layout.ts';
import { columnLetters } from '#shared/workbook/xml/cell-address.ts';
import type { TemplateInput } from './template-types.ts';
import type { SheetWriter } from './workbook-writer.ts';

export const LISTS_SHEET = 'Lists';

type List = { readonly name: string; readonly items: readonly (string | number)[] };

/** Drop-downs of the template: the lists, and which column takes which. */
export type TemplateLists = {
  readonly lists: readonly List[];
  /** Range of the list for a column, as `Lists!$A$2:$A$9`; null where there is none. */
  readonly rangeOf: (layout: SheetLayout, column: Column) => string | null;
};

const unique = <T>(items: readonly T[]): T[] => [...new Set(items)];

export function templateLists(
  { design, products, lots }: TemplateInput,
  layouts: readonly SheetLayout[],
): TemplateLists {
  const lists: List[] = [
    { name: 'structures', items: unique(design.map((one) => one.structureNumber)) },
    { name: 'products', items: unique(products.map((one) => one.code)) },
    { name: 'lots', items: unique(lots.map((one) => one.number)) },
    { name: 'kits', items: unique(products.flatMap((one) => one.kitsFt3 ?? [])).sort((a, b) => a - b) },
  ];
  const codes = (column: Column): string => `codes ${column.allowed?.join(' ') ?? ''}`;
  for (const column of layouts.flatMap((layout) => layout.columns)) {
    if (column.allowed === null || lists.some((list) => list.name === codes(column))) continue;
    lists.push({ name: codes(column), items: column.allowed });
  }
  const nameFor = (layout: SheetLayout, column: Column): string => {
    if (column.allowed !== null) return codes(column);
    if (layout.record === 'pour' && column.key === 'product') return 'products';
    if (layout.record === 'pour' && column.key === 'lot') return 'lots';
    if (layout.record === 'pour' && column.key === 'kitFt3') return 'kits';
    return ['pour', 'event', 'photo'].includes(layout.record) && column.key === 'structureNumber'
      ? 'structures'
      : '';
  };
  return {
    lists,
    rangeOf: (layout, column) => {
      const index = lists.findIndex((list) => list.name === nameFor(layout, column));
      const length = lists[index]?.items.length ?? 0;
      const letters = columnLetters(index + 1);
      return length === 0 ? null : `${LISTS_SHEET}!$${letters}$2:$${letters}$${length + 1}`;
    },
  };
}

/** Writes the hidden sheet behind the drop-downs: one list a column, its name on top. */
export function writeLists(sheet: SheetWriter, { lists }: TemplateLists): void {
  const longest = Math.max(...lists.map((list) => list.items.length));
  sheet.addRow(lists.map((list) => list.name.split(' ')[0])).commit();
  for (let index = 0; index < longest; index++) {
    sheet.addRow(lists.map((list) => list.items[index] ?? null)).commit();
  }
}
