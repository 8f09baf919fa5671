import { useQuery } from '@tanstack/react-query';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { recordSheetQuery } from '#src/lib/api/record-sheet.ts';
import { sheetLimitsQuery } from '#src/lib/api/sheet-limits.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';
import { RecordSheet } from './record-sheet.tsx';
import { useSheetData } from './use-sheet-data.ts';

/** The drawing of a record by its id, where a page shows it beside something else. */
export function RecordDrawing({ recordId }: { recordId: string }) {
  const sheet = useQuery(recordSheetQuery(recordId));
  if (sheet.isError)
    return <ErrorState error={sheet.error} what="The drawing" onRetry={() => void sheet.refetch()} />;
  if (!sheet.data) return <Skeleton lines={12} label="Loading the drawing" />;
  return <Drawn data={sheet.data} />;
}

function Drawn({ data }: { data: RecordSheetData }) {
  const limits = useQuery(sheetLimitsQuery(data.record.standard));
  return <RecordSheet {...useSheetData(data)} limits={limits.data} />;
}
