import type { ReactNode } from 'react';
import { Moment } from '#src/components/ui/moment.tsx';
import { formatCount } from '#src/lib/formats.ts';
import type { Transmittal } from '#shared/generated/api-types.ts';
import { useScopeWords } from './use-scope-words.ts';

/** What it holds, who asked, and the digests by which a copy can be proved. */
export function TransmittalFacts({ one }: { one: Transmittal }) {
  const words = useScopeWords();
  return (
    <dl className="max-w-4xl border-b border-hairline">
      <Line term="Title">{one.title}</Line>
      <Line term="Issued of">{words(one.scope)}</Line>
      <Line term="Records">{formatCount(one.rows)}, the versions that stood when it was asked for</Line>
      <Line term="Asked for">
        <Moment at={one.requestedAt} /> by {one.requestedBy}
      </Line>
      {one.issuedAt ? (
        <Line term="Issued">
          <Moment at={one.issuedAt} />
        </Line>
      ) : null}
      {one.size === null ? null : <Line term="File">{formatCount(one.size)} bytes</Line>}
      {one.sha256 ? (
        <Line term="SHA-256 of the file" note="A copy with this digest is the file as issued.">
          <code className="font-sans break-all">{one.sha256}</code>
        </Line>
      ) : null}
      {one.contentDigest ? (
        <Line
          term="Digest of the content"
          note="The same records give the same digest, whenever and however often they are issued."
        >
          <code className="font-sans break-all">{one.contentDigest}</code>
        </Line>
      ) : null}
    </dl>
  );
}

function Line({ term, note, children }: { term: string; note?: string; children: ReactNode }) {
  return (
    <div className="grid gap-x-6 border-t border-hairline px-gutter py-2 first:border-t-0 sm:grid-cols-[11rem_minmax(0,1fr)]">
      <dt className="text-muted">{term}</dt>
      <dd>
        {children}
        {note ? <span className="block text-small text-muted">{note}</span> : null}
      </dd>
    </div>
  );
}
