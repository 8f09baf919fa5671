import { Callout } from '#src/components/ui/callout.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { counted } from '#src/lib/formats.ts';
import type { RegisterEntriesReply } from '#shared/generated/api-types.ts';

/** What was entered, each with its number. */
export function EnteredResult({ reply }: { reply: RegisterEntriesReply }) {
  const later = reply.entries.filter((entry) => entry.version > 1).length;
  return (
    <div role="status" className="px-gutter py-3">
      <Callout
        tone="conform"
        title={`${counted(reply.entries.length, 'line')} entered${later > 0 ? `, ${later} as a further version` : ''}`}
      >
        <ul className="mt-1 flex max-h-40 flex-wrap gap-x-4 gap-y-1 overflow-y-auto">
          {reply.entries.map((entry) => (
            <li key={entry.id}>
              <TextLink to={paths.registerRecord.to(entry.recordNumber)}>{entry.recordNumber}</TextLink>
              {entry.version > 1 ? ` version ${entry.version}` : ''}
            </li>
          ))}
        </ul>
      </Callout>
    </div>
  );
}
