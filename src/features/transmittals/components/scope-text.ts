import type { FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { describeFilters } from '#src/lib/filters/describe-filters.ts';

type Known = {
  readonly workOrders: readonly { readonly value: string; readonly label: string }[];
  readonly filters: readonly FilterDefinition[];
};

/** What a transmittal was issued of, in words. `scope` as it is kept: a work order, record numbers, or the register's filter. */
export function scopeText(scope: Readonly<Record<string, unknown>>, { workOrders, filters }: Known): string {
  const order = scope['workOrder'];
  if (typeof order === 'string') {
    const name = workOrders.find((one) => one.value === order)?.label;
    return name ? `work order ${name}` : 'one work order';
  }
  const numbers = scope['recordNumbers'];
  if (Array.isArray(numbers)) {
    const first = numbers.slice(0, 5).map(String).join(', ');
    return numbers.length > 5 ? `records ${first} and ${numbers.length - 5} more` : `records ${first}`;
  }
  const filter = scope['filter'];
  if (typeof filter === 'object' && filter !== null) {
    const words = describeFilters(filters, filter as Record<string, string>);
    return words ? `the register: ${words}` : 'the whole register';
  }
  return 'a scope this page does not know';
}

/** Record numbers as pasted from anywhere, each once. */
export function readRecordNumbers(text: string): readonly string[] {
  return [...new Set(text.split(/[\s,;]+/).filter((part) => part !== ''))];
}
