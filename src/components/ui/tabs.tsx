import { Tabs as Radix } from 'radix-ui';
import { useEffect, useRef, type ReactNode } from 'react';
import { classNames } from '#src/lib/class-names.ts';

type Tab<T extends string> = { readonly value: T; readonly label: string; readonly count?: number };

type Props<T extends string> = {
  readonly label: string;
  readonly value: T;
  readonly onChange: (value: T) => void;
  readonly tabs: readonly Tab<T>[];
  /** In a pane: set in less than on a page. */
  readonly pane?: boolean;
  readonly children: ReactNode;
};

/** Views of one thing, each with its count. The panel is one: its content follows `value`. */
export function Tabs<T extends string>({ label, value, onChange, tabs, pane, children }: Props<T>) {
  // A press tells of the same tab twice, by pointer and by focus, before an address has changed: once counts.
  const asked = useRef(value);
  useEffect(() => {
    asked.current = value;
  }, [value]);
  return (
    <Radix.Root
      value={value}
      onValueChange={(next) => {
        const tab = tabs.find((one) => one.value === next);
        if (!tab || tab.value === asked.current) return;
        asked.current = tab.value;
        onChange(tab.value);
      }}
      className="flex min-h-0 flex-1 flex-col"
    >
      <Radix.List
        aria-label={label}
        className={classNames(
          'flex shrink-0 gap-4 overflow-x-auto border-b border-hairline pt-1.5 text-table',
          pane ? 'px-3' : 'px-gutter',
        )}
      >
        {tabs.map((tab) => (
          <Radix.Trigger
            key={tab.value}
            value={tab.value}
            className="mb-1.5 border-b-2 border-transparent pt-1 pb-0.5 whitespace-nowrap text-muted hover:text-ink data-[state=active]:border-ink data-[state=active]:font-semibold data-[state=active]:text-ink pointer-coarse:min-h-10"
          >
            {tab.label}
            {tab.count === undefined ? null : ` ${tab.count.toLocaleString('en-US')}`}
          </Radix.Trigger>
        ))}
      </Radix.List>
      <Radix.Content value={value} tabIndex={-1} className="flex min-h-0 flex-1 flex-col outline-none">
        {children}
      </Radix.Content>
    </Radix.Root>
  );
}
