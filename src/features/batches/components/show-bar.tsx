import type { ReactNode } from 'react';
import type { Show } from '../lib/filter-lines.ts';
import { isIncomplete, wantsLook, type BatchView } from '../lib/line-view.ts';
import { ChoiceBar } from '#src/components/table/choice-bar.tsx';
import { counted, formatCount } from '#src/lib/formats.ts';

type Props = {
  readonly view: BatchView;
  readonly show: Show;
  readonly onShow: (show: Show) => void;
  readonly children?: ReactNode;
};

/** Which lines are shown; those that must be completed before submitting have a choice of their own. */
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
    <ChoiceBar label="Which lines" chosen={show} onChoose={onShow} choices={choices}>
      {children}
    </ChoiceBar>
  );
}
