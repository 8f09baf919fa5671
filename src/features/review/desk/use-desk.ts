import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { batchChangesQuery } from '#src/features/review/api/batch-changes.ts';
import { batchFindingsQuery } from '#src/features/review/api/batch-findings.ts';
import type { Decision } from '#src/features/review/api/send-decision.ts';
import { changedKeys, changesOf, isUnder } from '#src/features/review/desk/desk-tabs.ts';
import { restoreFocus } from '#src/features/review/desk/restore-focus.ts';
import { stepTo, stepToFinding } from '#src/features/review/desk/steps.ts';
import { useDecide } from '#src/features/review/desk/use-decide.ts';
import { useHand, type Saying } from '#src/features/review/desk/use-hand.ts';
import { usePlace, WHOLE_BATCH } from '#src/features/review/desk/use-place.ts';
import { inOrder } from '#shared/drawing/number-findings.ts';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { recordSheetQuery } from '#src/lib/api/record-sheet.ts';
import type { Batch, FindingRow, RecordRow } from '#shared/generated/api-types.ts';

/** A refusal that has no open form to stand in. */
export type Notice = {
  readonly text: string;
  readonly line: string;
  readonly finding: string | null;
  readonly saying: Saying | null;
};

const NO_FINDINGS: readonly FindingRow[] = [];

/** Everything that the desk of one batch knows and does. */
export function useDesk(batch: Batch, lines: readonly RecordRow[]) {
  const client = useQueryClient();
  const place = usePlace();
  const ownQuery = useQuery(batchFindingsQuery(batch.id));
  const own = ownQuery.data ?? NO_FINDINGS;
  const changes = useQuery(batchChangesQuery(batch.id)).data;
  const changed = changedKeys(changes);

  const line = currentLine(place.line, { lines, own });
  const whole = line === WHOLE_BATCH;
  const { line: asked, nameLine } = place;
  // The line that was chosen for the person is named too: else a decision on it would choose another.
  useEffect(() => {
    if (line !== null && line !== asked && !ownQuery.isPending) nameLine(line);
  });
  const record = lines.find((one) => one.id === line) ?? null;
  // The line in hand stays in sight under every tab, though its decision may have taken it from there.
  const listed = lines.filter((one) => one.id === line || isUnder(place.tab, one, changed));
  const sheet = useQuery({ ...recordSheetQuery(record?.id ?? ''), enabled: record !== null });
  const findings = inOrder(whole ? own : (sheet.data?.findings ?? NO_FINDINGS));
  const due = findings.filter((finding) => finding.severity !== 'note');
  const hand = useHand(line, due);

  const [notice, setNotice] = useState<Notice | null>(null);
  const [stale, setStale] = useState<string | null>(null);
  const decide = useDecide(batch.id, {
    refused(error, decision) {
      const target = targetOf(decision);
      if (error instanceof ApiProblem && error.status === 412) setStale(target.finding ?? target.line);
      setNotice({ ...target, text: error.message });
    },
  });
  const sending = decide.isPending ? decide.variables : null;

  async function send(decision: Decision): Promise<void> {
    setNotice(null);
    await decide.mutateAsync(decision);
    setStale(null);
    hand.said(targetOf(decision).line);
    if ('finding' in decision) restoreFocus(decision.finding.id);
  }
  /** For decisions without a form: what is refused is told by the notice. */
  const sendPlain = (decision: Decision): void => void send(decision).catch(() => undefined);

  function select(id: string): void {
    place.setLine(id);
    if (place.step === 'lines') place.setStep('sheet');
  }
  const ids = [...(own.length > 0 ? [WHOLE_BATCH] : []), ...listed.map((one) => one.id)];
  const following = stepTo(ids, line, 1);
  useEffect(() => {
    if (following && following !== WHOLE_BATCH) void client.prefetchQuery(recordSheetQuery(following));
  }, [client, following]);

  function moveLine(step: 1 | -1): void {
    const next = stepTo(ids, line, step);
    if (next) place.setLine(next);
  }
  function moveFinding(step: 1 | -1): void {
    const next = stepToFinding({ lines, line, findings: due, active: hand.finding?.id ?? null, step });
    if (!next) return;
    if ('finding' in next) hand.take(next.finding);
    else {
      hand.takeEnd(next.line, next.end);
      place.setLine(next.line);
    }
  }

  return {
    place,
    line,
    whole,
    record,
    listed,
    changed,
    sheet,
    findings,
    due,
    hand,
    own,
    changes: record ? changesOf(changes, record) : [],
    notice,
    setNotice,
    stale,
    sending,
    send,
    sendPlain,
    select,
    moveLine,
    moveFinding,
    goTo(target: Notice): void {
      setNotice(null);
      place.setLine(target.line);
      if (target.saying) hand.sayOn({ line: target.line, finding: target.finding, saying: target.saying });
    },
  };
}

export type DeskModel = ReturnType<typeof useDesk>;

/** The line of the address; without one, the first that waits. */
function currentLine(
  asked: string | null,
  { lines, own }: { lines: readonly RecordRow[]; own: readonly FindingRow[] },
): string | null {
  if (asked === WHOLE_BATCH && own.length > 0) return WHOLE_BATCH;
  if (lines.some((line) => line.id === asked)) return asked;
  return (lines.find((line) => line.state === 'undecided') ?? lines[0])?.id ?? null;
}

function targetOf(decision: Decision): Omit<Notice, 'text'> {
  const saying =
    decision.type === 'concession'
      ? 'concession'
      : decision.type === 'finding'
        ? decision.request.decision
        : decision.type === 'line' && decision.request.decision === 'return'
          ? 'return'
          : null;
  return 'finding' in decision
    ? { line: decision.finding.recordId ?? WHOLE_BATCH, finding: decision.finding.id, saying }
    : { line: decision.record.id, finding: null, saying };
}
