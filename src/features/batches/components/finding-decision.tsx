import { Glyph } from '#src/components/ui/glyph.tsx';
import { formatDay } from '#src/lib/formats.ts';
import { classNames } from '#src/lib/class-names.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

const ACTIONS = {
  correct: 'correct the record',
  rework: 'rework: make it conform',
  repair: 'repair: make it usable',
} as const;

/** What the owner said of it, once the review is closed. */
export function FindingDecision({ finding, className }: { finding: FindingRow; className?: string }) {
  const { decision, concession } = finding;
  if (decision === null && concession === null) return null;
  const rejected = decision?.decision === 'reject';
  return (
    <div className={classNames('flex gap-2 text-table', className)}>
      <Glyph name={rejected ? 'cross' : concession ? 'lozenge' : 'tick'} className="mt-0.5" />
      <p className="min-w-0 text-ink-2">
        <span className="font-semibold text-ink">{words(finding)}</span>
        {decision?.reason ? ` “${decision.reason}”` : ''}
        {decision ? <span className="text-muted"> {decision.by}</span> : null}
      </p>
    </div>
  );
}

function words({ decision, concession }: FindingRow): string {
  if (decision?.decision === 'reject') {
    const what = decision.action ? ACTIONS[decision.action] : 'put it right';
    return `Came back: ${what}${decision.dueOn ? ` by ${formatDay(decision.dueOn)}` : ''}.`;
  }
  if (concession) {
    const state = {
      asked: 'asked for; an engineer decides',
      granted: 'granted',
      refused: 'refused',
    }[concession.state];
    return `Concession ${concession.number} ${state}.`;
  }
  return decision?.grounds === 'answer' ? 'Your answer was accepted.' : 'Accepted on the evidence.';
}
