import { Tooltip as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

/** A few more words on hover and focus; never the only place where something is said. `children`: one focusable element. */
export function Tooltip({ text, children }: { text: string; children: ReactNode }) {
  return (
    <Radix.Provider delayDuration={300}>
      <Radix.Root>
        <Radix.Trigger asChild>{children}</Radix.Trigger>
        <Radix.Portal>
          <Radix.Content
            sideOffset={5}
            collisionPadding={8}
            className="z-50 max-w-xs border border-ink bg-sheet px-2.5 py-1.5 text-small text-ink"
          >
            {text}
          </Radix.Content>
        </Radix.Portal>
      </Radix.Root>
    </Radix.Provider>
  );
}
