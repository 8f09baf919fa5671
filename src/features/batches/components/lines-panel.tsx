import { useMemo, useState } from 'react';
import { FindingItem, type FindingActions } from './finding-item.tsx';
import { LineList } from './line-list.tsx';
import { ShowBar } from './show-bar.tsx';
import { filterLines, rulesOf, shownOf } from '../lib/filter-lines.ts';
import type { BatchView } from '../lib/line-view.ts';
import { FilterBar, type FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { LINE_WORDS } from '#src/components/ui/state-word.tsx';
import { LINE_STATES } from '#shared/review/states.ts';
import type { Filters } from '#src/lib/filters/use-filters.ts';

type Props = FindingActions & {
  readonly view: BatchView;
  readonly filters: Filters;
  readonly decided: boolean;
};

export function LinesPanel({ view, filters, decided, ...actions }: Props) {
  const shown = useMemo(() => filterLines(view, filters.values), [view, filters.values]);
  const [filtering, setFiltering] = useState(filters.count > 1);
  const define = useMemo(() => definitions(view, decided), [view, decided]);
  return (
    <>
      <ShowBar view={view} show={shownOf(filters.values, view)} onShow={(show) => filters.set('show', show)}>
        <button
          type="button"
          aria-expanded={filtering}
          onClick={() => setFiltering(!filtering)}
          className="ml-auto min-h-7 text-muted underline underline-offset-4 lg:hidden pointer-coarse:min-h-11"
        >
          Filter
        </button>
      </ShowBar>
      <div className={filtering ? undefined : 'max-lg:hidden'}>
        <FilterBar filters={filters} define={define} />
      </div>
      {shown.loose.length > 0 ? (
        <section aria-label="Findings of the workbook as a whole">
          <SectionHead title="The workbook as a whole" aside={`${shown.loose.length}`} />
          <ul className="border-b border-hairline px-gutter">
            {shown.loose.map((finding) => (
              <FindingItem key={finding.id} finding={finding} {...actions} />
            ))}
          </ul>
        </section>
      ) : null}
      {shown.lines.length > 0 ? (
        <LineList lines={shown.lines} decided={decided} {...actions} />
      ) : shown.loose.length === 0 ? (
        <EmptyState title="No line passes these filters">Clear a filter, or show all lines.</EmptyState>
      ) : null}
    </>
  );
}

function definitions(view: BatchView, decided: boolean): FilterDefinition[] {
  return [
    {
      name: 'severity',
      label: 'Severity',
      options: [
        { value: 'nonconformity', label: 'nonconformity' },
        { value: 'query', label: 'query' },
        { value: 'note', label: 'note' },
      ],
    },
    {
      name: 'rule',
      label: 'Rule',
      options: rulesOf(view).map(({ code, title, count }) => ({ value: code, label: `${title} (${count})` })),
    },
    ...(decided
      ? [
          {
            name: 'state',
            label: 'State',
            any: 'all',
            options: LINE_STATES.map((state) => ({ value: state, label: LINE_WORDS[state].word })),
          },
        ]
      : []),
    { name: 'structure', label: 'Structure', any: 'all' },
  ];
}
