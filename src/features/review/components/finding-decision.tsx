import { Button } from '#src/components/ui/button.tsx';
import { ApproveForm } from '#src/features/review/components/approve-form.tsx';
import { NewerState } from '#src/features/review/components/newer-state.tsx';
import { ReasonForm } from '#src/features/review/components/reason-form.tsx';
import { RejectForm } from '#src/features/review/components/reject-form.tsx';
import type { Decision } from '#src/features/review/api/send-decision.ts';
import { restoreFocus } from '#src/features/review/desk/restore-focus.ts';
import type { Saying } from '#src/features/review/desk/use-hand.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly finding: FindingRow;
  readonly saying: Saying | null;
  readonly sending: boolean;
  /** Somebody else decided it after it was opened here. */
  readonly stale: boolean;
  readonly say: (saying: Saying | null) => void;
  readonly send: (decision: Decision) => Promise<unknown>;
  /** Without a form: what is refused is told elsewhere. */
  readonly sendPlain: (decision: Decision) => void;
};

/** The controls of the finding in hand, or the form that one of them opened. */
export function FindingDecision({ finding, saying, sending, stale, say, send, sendPlain }: Props) {
  const may = (word: string) => finding.can.includes(word);
  const open = finding.state === 'undecided' || saying !== null;
  const frame = {
    draftKey: `${finding.id}.${saying ?? ''}`,
    sending,
    newerIsShown: true,
    onCancel: () => {
      say(null);
      restoreFocus(finding.id);
    },
  };
  return (
    <>
      {stale && saying !== null ? <NewerState finding={finding} /> : null}
      {may('decide') && saying === null && open ? (
        <div className="mt-1.5 flex flex-wrap gap-2">
          <Button size="small" hotkey="A" onClick={() => say('approve')}>
            Approve
          </Button>
          <Button size="small" hotkey="R" onClick={() => say('reject')}>
            Reject
          </Button>
          {may('ask-concession') ? (
            <Button size="small" hotkey="C" onClick={() => say('concession')}>
              Concession…
            </Button>
          ) : null}
        </div>
      ) : null}
      {may('undo') && saying === null && finding.state !== 'undecided' ? (
        <div className="mt-1.5">
          <Button size="small" hotkey="U" onClick={() => sendPlain({ type: 'undo-finding', finding })}>
            {finding.state === 'concession-asked' ? 'Withdraw the question' : 'Undo'}
          </Button>
        </div>
      ) : null}
      {saying === 'approve' ? (
        <ApproveForm
          {...frame}
          key={frame.draftKey}
          finding={finding}
          onSend={(request) => send({ type: 'finding', finding, request })}
        />
      ) : null}
      {saying === 'reject' ? (
        <RejectForm
          {...frame}
          key={frame.draftKey}
          finding={finding}
          onSend={(request) => send({ type: 'finding', finding, request })}
        />
      ) : null}
      {saying === 'concession' ? (
        <ReasonForm
          {...frame}
          key={frame.draftKey}
          title={`Ask for a concession: ${finding.title}`}
          label="Why it might be accepted as built"
          hint="The engineers read this with the record. The line is held until one of them answers."
          missing="Say why a concession is asked for."
          action="Ask the engineers"
          onSend={(reason) => send({ type: 'concession', finding, reason })}
        />
      ) : null}
    </>
  );
}
