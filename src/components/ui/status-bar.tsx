import type { ReactNode } from 'react';
import { Kbd } from '#src/components/ui/kbd.tsx';

export type KeyHint = { readonly keys: readonly string[]; readonly does: string };

type Props = {
  readonly left?: ReactNode;
  readonly keys?: readonly KeyHint[];
  readonly right?: ReactNode;
};

/** The bar at the foot of a working page: where one is, and which keys act. */
export function StatusBar({ left, keys = [], right }: Props) {
  return (
    <footer className="sticky bottom-0 z-10 mt-auto flex min-h-7 flex-wrap items-center gap-x-5 gap-y-1 border-t border-hairline bg-paper px-gutter py-1 text-small text-ink-2 print:hidden">
      {left ? <span aria-live="polite">{left}</span> : null}
      {keys.map((hint) => (
        <span key={hint.does} className="inline-flex items-center gap-1.5 pointer-coarse:hidden">
          {hint.keys.map((key) => (
            <Kbd key={key}>{key}</Kbd>
          ))}
          {hint.does}
        </span>
      ))}
      {right ? <span className="ml-auto text-query">{right}</span> : null}
    </footer>
  );
}
