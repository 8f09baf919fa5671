import { useRef } from 'react';
import { FilterEntry } from '#src/components/table/filter-entry.tsx';
import { Menu, MenuChoice } from '#src/components/ui/menu.tsx';
import type { Filters } from '#src/lib/filters/use-filters.ts';
import { counted, formatDay } from '#src/lib/formats.ts';
import { useHotkeys } from '#src/lib/use-hotkeys.ts';

export type FilterDefinition = {
  readonly name: string;
  readonly label: string;
  /** Shown when nothing is chosen: `any`, `all`. */
  readonly any?: string;
  /** A choice; without options the value is typed. */
  readonly options?: readonly { readonly value: string; readonly label: string }[];
  readonly type?: 'text' | 'date';
};

/** `Rule any   Severity nonconformity …` in one line, bound to the address. Key F goes to the first. */
export function FilterBar({ filters, define }: { filters: Filters; define: readonly FilterDefinition[] }) {
  const bar = useRef<HTMLDivElement>(null);
  useHotkeys({ f: () => bar.current?.querySelector('button')?.focus() });
  return (
    <div
      ref={bar}
      role="group"
      aria-label="Filters"
      className="flex min-h-9 flex-wrap items-center gap-x-5 gap-y-1 border-b border-hairline px-gutter py-1.5 text-table print:hidden"
    >
      {define.map((definition) => (
        <FilterControl key={definition.name} definition={definition} filters={filters} />
      ))}
      {filters.count > 0 ? (
        <button
          type="button"
          onClick={filters.clear}
          className="ml-auto min-h-6 text-accent hover:underline pointer-coarse:min-h-11"
        >
          Clear {counted(filters.count, 'filter')}
        </button>
      ) : null}
    </div>
  );
}

function FilterControl({ definition, filters }: { definition: FilterDefinition; filters: Filters }) {
  const { name, label, any = 'any', options, type = 'text' } = definition;
  const value = filters.values[name] ?? '';
  const shown =
    options?.find((option) => option.value === value)?.label ?? (type === 'date' ? formatDay(value) : value);
  const trigger = (
    <button type="button" className="min-h-6 text-left pointer-coarse:min-h-11">
      <span className="text-muted">{label}</span>{' '}
      <span className="border-b border-rule font-semibold text-ink hover:border-ink">{shown || any}</span>
    </button>
  );
  if (!options) {
    return (
      <FilterEntry
        label={label}
        type={type}
        value={value}
        trigger={trigger}
        onChange={(next) => filters.set(name, next)}
      />
    );
  }
  return (
    <Menu align="start" trigger={trigger}>
      <MenuChoice
        label={label}
        value={value}
        options={[{ value: '', label: any }, ...options]}
        onChange={(next) => filters.set(name, next)}
      />
    </Menu>
  );
}
