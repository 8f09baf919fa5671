import { Tabs as Radix } from 'radix-ui';
import { useEffect, useRef, type ReactNode } from 'react';

type Tab<T extends string> = { readonly value: T; readonly label: string; readonly count?: number };

type Props<T extends string> = {
  readonly label: string;
  readonly value: T;
  readonly onChange: (value: T) => void;
  readonly tabs: readonly Tab<T>[];
  readonly children: ReactNode;
};

/** Views of one thing, each with its count. The panel is one: its content follows `value`. */
export function Tabs<T extends string>({ label, value, onChange, tabs, children }: Props<T>) {
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
        className="flex shrink-0 gap-4 overflow-x-auto border-b border-hairline px-3 pt-1.5 text-table"
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
      <Radix.Content value={value} tabIndex={-1} className="min-h-0 flex-1 outline-none">
        {children}
      </Radix.Content>
    </Radix.Root>
  );
}
