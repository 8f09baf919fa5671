import { Callout } from '#src/components/ui/callout.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { counted, formatCount } from '#src/lib/formats.ts';
import type { TrailVerification } from '#shared/generated/api-types.ts';

/** What the reading of the chain found. */
export function Verification({ verdict, error }: { verdict: TrailVerification | undefined; error: unknown }) {
  if (error) return <ErrorState error={error} what="The verification" />;
  if (!verdict) return null;
  return (
    <div role="status" className="max-w-4xl px-gutter py-3">
      {verdict.ok ? (
        <Callout
          tone="conform"
          title={`The trail is unbroken: ${counted(verdict.entries, 'entry', 'entries')} verified`}
        >
          <p>Each entry has the hash of its content and follows the one before.</p>
          {verdict.head ? (
            <p className="mt-1 text-small break-all">
              Head: {verdict.head}. Keep it: whoever has it can prove later that nothing before it was
              changed.
            </p>
          ) : null}
        </Callout>
      ) : (
        <Callout
          tone="nonconform"
          title={
            verdict.brokenAt === null
              ? 'The trail is broken'
              : `The trail is broken at entry ${formatCount(verdict.brokenAt)}`
          }
        >
          <p>{verdict.problem}</p>
          <p className="mt-1">
            What stands before it still verifies. Tell the administrator, and compare with a backup from
            before.
          </p>
        </Callout>
      )}
    </div>
  );
}
