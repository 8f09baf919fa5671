import type { FilterDefinition } from '#src/components/table/filter-bar.tsx';
import type { FilterValues } from '#src/lib/filters/filter-params.ts';

/** `contractor Brindle, lot LK-2291`: filters in words; empty when nothing is filtered. */
export function describeFilters(define: readonly FilterDefinition[], values: FilterValues): string {
  return define
    .flatMap(({ name, label, options }) => {
      const value = values[name];
      if (!value) return [];
      return `${label.toLowerCase()} ${options?.find((one) => one.value === value)?.label ?? value}`;
    })
    .join(', ');
}
