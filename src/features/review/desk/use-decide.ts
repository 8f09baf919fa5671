import { useMutation, useQueryClient } from '@tanstack/react-query';
import { batchFindingsQuery } from '#src/features/review/api/batch-findings.ts';
import { reviewLinesQuery } from '#src/features/review/api/review-lines.ts';
import { reviewBatchQuery } from '#src/features/review/api/review-batch.ts';
import { sendDecision, type Decided, type Decision } from '#src/features/review/api/send-decision.ts';
import { expectedFinding, expectedRecord } from '#src/features/review/desk/local-decision.ts';
import { placeFinding, placeRecord } from '#src/features/review/desk/place-decided.ts';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { recordSheetQuery } from '#src/lib/api/record-sheet.ts';
import { useUser } from '#src/lib/session/session.ts';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';

/** Writes of one review follow one another: a list fetched after one must not be older than the one before it. */
export const reviewScope = (batchId: string) => ({ id: `review ${batchId}` });

/** Shows a decision at once, sends it, and takes it back where the server refuses. A stale one brings the newer state. */
export function useDecide(
  batchId: string,
  tell: { readonly refused: (error: Error, decision: Decision) => void },
) {
  const client = useQueryClient();
  const user = useUser();
  const place = { client, batchId };

  function show({ finding, record }: Decided): void {
    if (finding) placeFinding(place, finding);
    if (record) placeRecord(place, record);
  }

  return useMutation({
    mutationFn: sendDecision,
    scope: reviewScope(batchId),
    onMutate: async (decision) => {
      const recordId = recordOf(decision);
      // An answer under way would put the old state back; what it was to bring is asked for again afterwards.
      const cut = client.isFetching({ queryKey: reviewLinesQuery(batchId).queryKey }) > 0;
      await client.cancelQueries({ queryKey: ['review', batchId] });
      if (recordId) await client.cancelQueries({ queryKey: recordSheetQuery(recordId).queryKey });
      const author = { name: user.name, at: new Date().toISOString() };
      const findings = recordId ? client.getQueryData(recordSheetQuery(recordId).queryKey)?.findings : null;
      show({
        finding: expectedFinding(decision, author) ?? undefined,
        record: expectedRecord(decision, { findings: findings ?? [], author }) ?? undefined,
      });
      return { cut };
    },
    onSuccess: (decided) => show(decided),
    onError: (error, decision) => {
      show('finding' in decision ? { finding: decision.finding } : { record: decision.record });
      if (error instanceof ApiProblem && error.status === 412) {
        const current = error.body.current;
        if ('finding' in decision) show({ finding: current as FindingRow });
        else show({ record: current as RecordRow });
      }
      tell.refused(error, decision);
    },
    onSettled: (_reply, _error, decision, seen) => {
      const recordId = recordOf(decision);
      void client.invalidateQueries({ queryKey: reviewBatchQuery(batchId).queryKey, exact: true });
      if (seen?.cut) void client.invalidateQueries({ queryKey: reviewLinesQuery(batchId).queryKey });
      if (recordId) void client.invalidateQueries({ queryKey: recordSheetQuery(recordId).queryKey });
      else void client.invalidateQueries({ queryKey: batchFindingsQuery(batchId).queryKey });
    },
  });
}

function recordOf(decision: Decision): string | null {
  return 'finding' in decision ? decision.finding.recordId : decision.record.id;
}
