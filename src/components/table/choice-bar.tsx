import type { ReactNode } from 'react';
import { classNames } from '#src/lib/class-names.ts';

type Props<Choice extends string> = {
  /** What is chosen among, for those who do not see it. */
  readonly label: string;
  readonly chosen: Choice;
  readonly onChoose: (choice: Choice) => void;
  readonly choices: readonly { readonly value: Choice; readonly text: string }[];
  readonly children?: ReactNode;
};

/** `5 lines want a look   17 clean   all 22`: each shows its own. */
export function ChoiceBar<Choice extends string>({
  label,
  chosen,
  onChoose,
  choices,
  children,
}: Props<Choice>) {
  return (
    <div
      role="group"
      aria-label={label}
      className="flex flex-wrap gap-x-4 border-b border-hairline px-gutter py-1 text-table"
    >
      {choices.map(({ value, text }) => (
        <button
          key={value}
          type="button"
          aria-pressed={chosen === value}
          onClick={() => onChoose(value)}
          className={classNames(
            'min-h-7 border-b-2 pointer-coarse:min-h-11',
            chosen === value
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
