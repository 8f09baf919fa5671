import { Dialog } from '#src/components/ui/dialog.tsx';
import { Kbd } from '#src/components/ui/kbd.tsx';
import type { KeyHint } from '#src/components/ui/status-bar.tsx';

export const DESK_KEYS: readonly KeyHint[] = [
  { keys: ['J', 'K'], does: 'line' },
  { keys: ['N'], does: 'next finding' },
  { keys: ['A'], does: 'approve' },
  { keys: ['R'], does: 'reject' },
  { keys: ['C'], does: 'concession' },
  { keys: ['P'], does: 'photograph' },
  { keys: ['U'], does: 'undo' },
  { keys: ['?'], does: 'all keys' },
];

const ALL: readonly { readonly title: string; readonly keys: readonly KeyHint[] }[] = [
  {
    title: 'Moving',
    keys: [
      { keys: ['J'], does: 'next line' },
      { keys: ['K'], does: 'line before' },
      { keys: ['N'], does: 'next finding that is open, on this line or a later one' },
      { keys: ['Shift', 'N'], does: 'the one before' },
    ],
  },
  {
    title: 'Deciding',
    keys: [
      { keys: ['A'], does: 'approve the finding, or a line without findings' },
      { keys: ['R'], does: 'reject the finding, or return a line without findings' },
      { keys: ['C'], does: 'ask the engineers for a concession' },
      { keys: ['U'], does: 'undo, until the review is closed' },
      { keys: ['Ctrl', 'Enter'], does: 'send what is typed' },
      { keys: ['Esc'], does: 'close the form; what is typed is kept' },
    ],
  },
  {
    title: 'Photographs',
    keys: [
      { keys: ['P'], does: 'open the first, then the next' },
      { keys: ['←', '→'], does: 'before and next' },
      { keys: ['+', '−', '0'], does: 'nearer, farther, whole' },
    ],
  },
];

export function KeysDialog({ open, onOpenChange }: { open: boolean; onOpenChange: (open: boolean) => void }) {
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title="Keys of the review desk">
      <div className="grid gap-4">
        {ALL.map((group) => (
          <section key={group.title} aria-label={group.title}>
            <h3 className="text-table font-semibold text-ink-2">{group.title}</h3>
            <dl className="mt-1 grid grid-cols-[6.5rem_minmax(0,1fr)] gap-y-1 text-table">
              {group.keys.map((hint) => (
                <div key={hint.does} className="contents">
                  <dt className="flex items-center gap-1">
                    {hint.keys.map((key) => (
                      <Kbd key={key}>{key}</Kbd>
                    ))}
                    <span className="sr-only">{hint.keys.join(' ')}</span>
                  </dt>
                  <dd>{hint.does}</dd>
                </div>
              ))}
            </dl>
          </section>
        ))}
      </div>
    </Dialog>
  );
}
