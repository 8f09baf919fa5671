import { mayApproveLine } from '#src/features/review/desk/desk-tabs.ts';
import type { DeskModel } from '#src/features/review/desk/use-desk.ts';
import { useHotkeys } from '#src/lib/use-hotkeys.ts';

/** The desk by keyboard. A key does what the button that shows it does, and nothing where there is no such button. */
export function useDeskKeys(
  desk: DeskModel,
  also: { readonly onPhoto: () => void; readonly onKeys: () => void },
): void {
  const { hand, sheet } = desk;
  const record = sheet.data?.record ?? null;
  const finding = hand.finding;
  const open = finding?.state === 'undecided';
  const lineWaits = record !== null && mayApproveLine(record);

  function approve(): void {
    if (open && finding.can.includes('decide')) hand.say('approve');
    else if (lineWaits) desk.sendPlain({ type: 'line', record, request: { decision: 'approve' } });
  }
  function reject(): void {
    if (open && finding.can.includes('decide')) hand.say('reject');
    else if (lineWaits) hand.say('return');
  }
  function undo(): void {
    if (finding?.can.includes('undo') && finding.state !== 'undecided')
      desk.sendPlain({ type: 'undo-finding', finding });
    else if (record?.decision && record.can.includes('decide')) desk.sendPlain({ type: 'undo-line', record });
  }
  useHotkeys({
    j: () => desk.moveLine(1),
    k: () => desk.moveLine(-1),
    n: () => desk.moveFinding(1),
    'shift+n': () => desk.moveFinding(-1),
    a: approve,
    r: reject,
    c: () => {
      if (open && finding.can.includes('ask-concession')) hand.say('concession');
    },
    u: undo,
    p: also.onPhoto,
    '?': also.onKeys,
    escape: () => hand.say(null),
  });
}
