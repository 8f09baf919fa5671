import type { QueryClient } from '@tanstack/react-query';
import { batchFindingsQuery } from '#src/features/review/api/batch-findings.ts';
import { reviewLinesQuery } from '#src/features/review/api/review-lines.ts';
import { withFinding } from '#src/features/review/desk/local-decision.ts';
import { recordSheetQuery } from '#src/lib/api/record-sheet.ts';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';

type Place = { readonly client: QueryClient; readonly batchId: string };

/** Puts a finding wherever the desk shows it: its sheet, its line, or the findings of the batch itself. */
export function placeFinding({ client, batchId }: Place, finding: FindingRow): void {
  if (finding.recordId === null) {
    client.setQueryData(batchFindingsQuery(batchId).queryKey, (found) =>
      found?.map((one) => (one.id === finding.id ? finding : one)),
    );
    return;
  }
  const key = recordSheetQuery(finding.recordId).queryKey;
  const sheet = client.getQueryData(key);
  if (!sheet) return;
  const next = withFinding(sheet, finding);
  client.setQueryData(key, next);
  placeInList({ client, batchId }, next.record);
}

export function placeRecord({ client, batchId }: Place, record: RecordRow): void {
  client.setQueryData(recordSheetQuery(record.id).queryKey, (sheet) =>
    sheet ? { ...sheet, record } : sheet,
  );
  placeInList({ client, batchId }, record);
}

function placeInList({ client, batchId }: Place, record: RecordRow): void {
  client.setQueryData(reviewLinesQuery(batchId).queryKey, (lines) =>
    lines?.map((line) => (line.id === record.id ? record : line)),
  );
}
