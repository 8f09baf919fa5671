import type { ReactNode } from 'react';
import type { Show } from '../lib/filter-lines.ts';
import { isIncomplete, wantsLook, type BatchView } from '../lib/line-view.ts';
import { classNames } from '#src/lib/class-names.ts';
import { counted, formatCount } from '#src/lib/formats.ts';

type Props = {
  readonly view: BatchView;
  readonly show: Show;
  readonly onShow: (show: Show) => void;
  readonly children?: ReactNode;
};

/** `5 lines want a look   17 clean   all 22`: each shows its own. */
export function ShowBar({ view, show, onShow, children }: Props) {
  const want = view.lines.filter(wantsLook).length;
  const incomplete = [...view.loose, ...view.lines.flatMap((line) => line.findings)].filter(
    isIncomplete,
  ).length;
  const choices: { value: Show; text: string }[] = [
    { value: 'want', text: `${counted(want, 'line wants', 'lines want')} a look` },
    { value: 'clean', text: `${formatCount(view.lines.length - want)} clean` },
    { value: 'all', text: `all ${formatCount(view.lines.length)}` },
  ];
  if (incomplete > 0) choices.push({ value: 'incomplete', text: `${incomplete} to complete first` });
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
      {children}
    </div>
  );
}
