import { useMemo, useRef, useState } from 'react';
import { CheckedLineItem } from './checked-line-item.tsx';
import type { WorkbookResult } from '../lib/check-workbook.ts';
import { passes, wantsLook, type Show } from '../lib/result-view.ts';
import { FindingWords } from '#src/components/evidence/finding-words.tsx';
import { ChoiceBar } from '#src/components/table/choice-bar.tsx';
import { useListWindow } from '#src/components/table/use-list-window.ts';
import { WindowList } from '#src/components/table/window-list.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
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
  const window = useListWindow({
    body,
    count: lines.length,
    rowHeight: 120,
    keyOf: (index) => keyOf(lines[index], index),
    onNearEnd: null,
  });
  return (
    <>
      <ChoiceBar
        label="Which lines"
        chosen={show}
        onChoose={setChosen}
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
        <WindowList label="Lines" body={body} window={window} rows={lines}>
          {(line) => <CheckedLineItem line={line} context={context} />}
        </WindowList>
      ) : null}
    </>
  );
}

const keyOf = (line: WorkbookResult['lines'][number] | undefined, index: number): string =>
  line ? `${line.kind} ${line.sheet} ${line.row} ${line.occurrence}` : String(index);
