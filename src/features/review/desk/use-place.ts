import { useEffect, useRef, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { DESK_TABS, type DeskTab } from '#src/features/review/desk/desk-tabs.ts';

/** What stands in `line` for the findings that belong to no line. */
export const WHOLE_BATCH = 'batch';
export type DeskStep = 'lines' | 'sheet' | 'evidence';

/** Where one is on the desk: tab and line stand in the address; the step counts on a narrow screen only. */
export function usePlace() {
  const [search, setSearch] = useSearchParams();
  const [step, setStep] = useState<DeskStep>('lines');
  const change = (changes: Record<string, string>) =>
    setSearch(
      (now) => {
        const next = new URLSearchParams(now);
        for (const [name, value] of Object.entries(changes)) next.set(name, value);
        return next;
      },
      { replace: true, preventScrollReset: true },
    );
  const line = search.get('line');
  // A line that was chosen and is not in the address yet: nothing may name another meanwhile.
  const chosen = useRef<string | null>(null);
  useEffect(() => {
    if (chosen.current === line) chosen.current = null;
  }, [line]);
  const tab = DESK_TABS.find((one) => one === search.get('tab')) ?? 'undecided';
  return {
    tab,
    line,
    step,
    setStep,
    setTab: (next: DeskTab) => change({ tab: next }),
    setLine: (next: string) => {
      if (next !== line) chosen.current = next;
      change({ line: next });
    },
    /** Puts the line that was chosen for the person into the address; their own choice goes before it. */
    nameLine: (next: string) => {
      if (chosen.current === null) change({ line: next });
    },
  };
}
