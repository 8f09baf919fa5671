import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { classNames } from '#src/lib/class-names.ts';

type Props = {
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly title: string;
  /** What this is about and what follows from it. */
  readonly description?: ReactNode;
  readonly wide?: boolean;
  /** The person must choose: neither Escape nor a click beside it closes. */
  readonly insistent?: boolean;
  readonly children: ReactNode;
};

export function Dialog({ open, onOpenChange, title, description, wide, insistent, children }: Props) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-scrim" />
        <Radix.Content
          {...(description ? {} : { 'aria-describedby': undefined })}
          onEscapeKeyDown={insistent ? (event) => event.preventDefault() : undefined}
          onInteractOutside={insistent ? (event) => event.preventDefault() : undefined}
          className={classNames(
            'fixed top-1/2 left-1/2 z-50 max-h-[calc(100dvh-1.5rem)] w-[calc(100vw-1.5rem)] -translate-x-1/2 -translate-y-1/2 overflow-y-auto border border-hairline bg-sheet p-1 outline-none',
            wide ? 'max-w-4xl' : 'max-w-lg',
          )}
        >
          <div className="border-[1.5px] border-ink">
            <div className="border-b border-hairline px-5 py-3">
              <Radix.Title className="text-title font-semibold">{title}</Radix.Title>
              {description ? (
                <Radix.Description asChild>
                  <div className="mt-0.5 text-ink-2">{description}</div>
                </Radix.Description>
              ) : null}
            </div>
            <div className="px-5 py-4">{children}</div>
          </div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
