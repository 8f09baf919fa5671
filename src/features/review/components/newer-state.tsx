import { DecisionLine } from '#src/components/evidence/decision-line.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import type { FindingRow } from '#shared/generated/api-types.ts';

/** After a refusal because somebody was faster: what stands now, above what was typed. */
export function NewerState({ finding }: { finding: FindingRow }) {
  return (
    <div role="alert" className="mt-2">
      <Callout tone="query" title="Changed by someone else meanwhile">
        {finding.state === 'undecided' ? (
          <p>It is undecided now. What you typed is below; send it again if it still holds.</p>
        ) : (
          <>
            <DecisionLine finding={finding} />
            <p className="mt-1">
              What you typed is below. Send it again to replace that decision, or cancel.
            </p>
          </>
        )}
      </Callout>
    </div>
  );
}
