import { Button } from '#src/components/ui/button.tsx';
import { StateWord, LINE_WORDS } from '#src/components/ui/state-word.tsx';
import { ReasonForm } from '#src/features/review/components/reason-form.tsx';
import type { Decision } from '#src/features/review/api/send-decision.ts';
import { mayApproveLine } from '#src/features/review/desk/desk-tabs.ts';
import type { Saying } from '#src/features/review/desk/use-hand.ts';
import { formatInstant } from '#src/lib/formats.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly record: RecordRow;
  readonly saying: Saying | null;
  readonly sending: boolean;
  readonly say: (saying: Saying | null) => void;
  readonly send: (decision: Decision) => Promise<unknown>;
  /** Without a form: what is refused is told elsewhere. */
  readonly sendPlain: (decision: Decision) => void;
};

/** The word on the line itself: approve one without findings, return any. */
export function LineDecision({ record, saying, sending, say, send, sendPlain }: Props) {
  const approvable = mayApproveLine(record);
  const mayDecide = record.can.includes('decide');
  const { decision } = record;
  if (!mayDecide && decision === null) return null;
  return (
    <div className="border-b border-hairline px-3 py-2.5">
      {decision ? (
        <p className="text-table">
          <span className="font-semibold">
            <StateWord {...LINE_WORDS[decision.decision === 'approve' ? 'approved' : 'returned']}>
              line {decision.decision === 'approve' ? 'approved' : 'returned'}
            </StateWord>
          </span>{' '}
          <span className="text-ink-2">
            {decision.reason ? `${decision.reason} ` : ''}
            <span className="text-muted">
              {decision.by}, {formatInstant(decision.at)}
            </span>
          </span>
        </p>
      ) : null}
      {mayDecide && saying !== 'return' ? (
        <div className="mt-1 flex flex-wrap items-center gap-2">
          {approvable ? (
            <Button
              size="small"
              kind="primary"
              hotkey="A"
              onClick={() => sendPlain({ type: 'line', record, request: { decision: 'approve' } })}
            >
              Approve the line
            </Button>
          ) : null}
          {decision === null ? (
            <Button
              size="small"
              kind={approvable ? 'secondary' : 'quiet'}
              hotkey={approvable ? 'R' : undefined}
              onClick={() => say('return')}
            >
              Return the line…
            </Button>
          ) : (
            <Button size="small" hotkey="U" onClick={() => sendPlain({ type: 'undo-line', record })}>
              Undo
            </Button>
          )}
        </div>
      ) : null}
      {saying === 'return' ? (
        <ReasonForm
          key={record.id}
          draftKey={`${record.id}.return`}
          sending={sending}
          onCancel={() => say(null)}
          title={`Return ${record.structureNumber}`}
          label="Why the line is returned, in words for the contractor"
          missing="Say why, so that the contractor knows what to mend."
          action="Return the line"
          onSend={(reason) => send({ type: 'line', record, request: { decision: 'return', reason } })}
        />
      ) : null}
    </div>
  );
}
