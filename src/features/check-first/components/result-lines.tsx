import { useMemo, useRef, useState } from 'react';
import { CheckedLineItem } from './checked-line-item.tsx';
import type { WorkbookResult } from '../lib/check-workbook.ts';
import { passes, wantsLook, type Show } from '../lib/result-view.ts';
import { FindingWords } from '#src/components/evidence/finding-words.tsx';
import { useListWindow } from '#src/components/table/use-list-window.ts';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { classNames } from '#src/lib/class-names.ts';
import { counted, formatCount } from '#src/lib/formats.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';

type Props = { readonly result: WorkbookResult; readonly context: CheckContextData };

/** Every line of a checked workbook; only those in the window are drawn. */
export function ResultLines({ result, context }: Props) {
  const body = useRef<HTMLDivElement>(null);
  const want = useMemo(() => result.lines.filter(wantsLook).length, [result]);
  const [chosen, setChosen] = useState<Show | null>(null);
  const show = chosen ?? (want > 0 || result.loose.length > 0 ? 'want' : 'all');
  const lines = useMemo(() => result.lines.filter((line) => passes(line, show)), [result, show]);
  const loose = show === 'clean' ? [] : result.loose;
  const { virtualizer, items, margin } = useListWindow({
    body,
    count: lines.length,
    rowHeight: 120,
    keyOf: (index) => keyOf(lines[index], index),
    onNearEnd: null,
  });
  return (
    <>
      <ShowBar
        show={show}
        onShow={setChosen}
        choices={[
          { value: 'want', text: `${counted(want, 'line wants', 'lines want')} a look` },
          { value: 'clean', text: `${formatCount(result.lines.length - want)} clean` },
          { value: 'all', text: `all ${formatCount(result.lines.length)}` },
        ]}
      />
      {loose.length > 0 ? (
        <section aria-label="Findings of the workbook as a whole">
          <SectionHead title="The workbook as a whole" aside={`${loose.length}`} />
          <ul className="border-b border-hairline px-gutter">
            {loose.map((finding) => (
              <FindingWords key={finding.fingerprint} finding={finding} />
            ))}
          </ul>
        </section>
      ) : null}
      {lines.length === 0 && loose.length === 0 ? (
        <EmptyState title="No line of this kind">Show all lines.</EmptyState>
      ) : null}
      {lines.length > 0 ? (
        <div
          ref={body}
          role="list"
          aria-label="Lines"
          className="relative"
          style={{ height: virtualizer.getTotalSize() }}
        >
          {items.map((item) => {
            const line = lines[item.index];
            return line ? (
              <div
                key={item.key}
                ref={virtualizer.measureElement}
                data-index={item.index}
                role="listitem"
                aria-setsize={lines.length}
                aria-posinset={item.index + 1}
                className="absolute inset-x-0 top-0"
                style={{ transform: `translateY(${item.start - margin}px)` }}
              >
                <CheckedLineItem line={line} context={context} />
              </div>
            ) : null;
          })}
        </div>
      ) : null}
    </>
  );
}

const keyOf = (line: WorkbookResult['lines'][number] | undefined, index: number): string =>
  line ? `${line.kind} ${line.sheet} ${line.row} ${line.occurrence}` : String(index);

type BarProps = {
  readonly show: Show;
  readonly onShow: (show: Show) => void;
  readonly choices: readonly { readonly value: Show; readonly text: string }[];
};

function ShowBar({ show, onShow, choices }: BarProps) {
  return (
    <div
      role="group"
      aria-label="Which lines"
      className="flex flex-wrap gap-x-4 border-b border-hairline px-gutter py-1 text-table"
    >
      {choices.map(({ value, text }) => (
        <button
          key={value}
          type="button"
          aria-pressed={show === value}
          onClick={() => onShow(value)}
          className={classNames(
            'min-h-7 border-b-2 pointer-coarse:min-h-11',
            show === value
              ? 'border-ink font-semibold text-ink'
              : 'border-transparent text-muted hover:text-ink',
          )}
        >
          {text}
        </button>
      ))}
    </div>
  );
}
