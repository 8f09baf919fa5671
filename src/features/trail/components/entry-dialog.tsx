import { ButtonLink } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { formatInstant } from '#src/lib/formats.ts';
import type { TrailEntry } from '#shared/generated/api-types.ts';
import { payloadLines } from './payload-lines.ts';
import { subjectLink } from './subject-link.ts';

/** One step whole: what was written down with it and its place in the chain. */
export function EntryDialog({ entry, onClose }: { entry: TrailEntry; onClose: () => void }) {
  const to = subjectLink(entry.subject);
  const lines = [
    { name: 'of', text: `${entry.subject.type} ${entry.subject.label ?? entry.subject.id}` },
    ...payloadLines(entry.payload),
    { name: 'number in the trail', text: String(entry.seq) },
    { name: 'hash', text: entry.hash },
  ];
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={entry.title}
      description={`${formatInstant(entry.at)}, ${entry.actor ?? 'Upstand itself'}${entry.role ? `, ${entry.role}` : ''}`}
    >
      <dl className="text-table">
        {lines.map((line) => (
          <div
            key={line.name}
            className="grid gap-x-4 border-b border-hairline py-1.5 sm:grid-cols-[9.5rem_minmax(0,1fr)]"
          >
            <dt className="text-muted">{line.name}</dt>
            <dd className="break-words">{line.text}</dd>
          </div>
        ))}
      </dl>
      {to ? (
        <div className="mt-4">
          <ButtonLink to={to}>Go to it</ButtonLink>
        </div>
      ) : null}
    </Dialog>
  );
}
