import { Popover } from 'radix-ui';
import { useState, type ReactNode } from 'react';
import { Button } from '#src/components/ui/button.tsx';

type Props = {
  readonly label: string;
  readonly type: 'text' | 'date';
  readonly value: string;
  readonly trigger: ReactNode;
  readonly onChange: (value: string | null) => void;
};

/** A filter whose value is typed. */
export function FilterEntry({ label, type, value, trigger, onChange }: Props) {
  const [open, setOpen] = useState(false);
  return (
    <Popover.Root open={open} onOpenChange={setOpen}>
      <Popover.Trigger asChild>{trigger}</Popover.Trigger>
      <Popover.Portal>
        <Popover.Content
          align="start"
          sideOffset={6}
          collisionPadding={8}
          aria-label={label}
          className="z-40 w-64 border border-ink bg-sheet p-3"
        >
          <form
            onSubmit={(event) => {
              event.preventDefault();
              const typed = new FormData(event.currentTarget).get('value');
              onChange(typeof typed === 'string' ? typed : null);
              setOpen(false);
            }}
          >
            <label className="block text-table">
              <span className="font-semibold">{label}</span>
              <input
                name="value"
                type={type}
                defaultValue={value}
                className="mt-1 h-9 w-full border border-rule bg-sheet px-2.5"
              />
            </label>
            <div className="mt-2.5 flex gap-2">
              <Button type="submit" size="small">
                Show
              </Button>
              {value ? (
                <Button
                  kind="quiet"
                  size="small"
                  onClick={() => {
                    onChange(null);
                    setOpen(false);
                  }}
                >
                  Clear
                </Button>
              ) : null}
            </div>
          </form>
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}
