import type { ReactNode } from 'react';

/** A key, shown where it acts. Screen readers hear the shortcut from the control itself. */
export function Kbd({ children }: { children: ReactNode }) {
  return (
    <kbd
      aria-hidden="true"
      className="inline-flex h-4.5 min-w-4.5 items-center justify-center rounded-key border border-b-2 border-rule bg-sheet px-1 font-sans text-micro font-normal text-ink-2 pointer-coarse:hidden"
    >
      {children}
    </kbd>
  );
}
