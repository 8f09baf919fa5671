import { useQuery } from '@tanstack/react-query';
import { RecordSheet } from '#src/components/drawing/record-sheet.tsx';
import { useSheetData } from '#src/components/drawing/use-sheet-data.ts';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { findingElementId } from '#src/features/review/desk/restore-focus.ts';
import type { DeskModel } from '#src/features/review/desk/use-desk.ts';
import { sheetLimitsQuery } from '#src/lib/api/sheet-limits.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';

/** The drawing of the line in hand. */
export function SheetPane({ desk, onShowEvidence }: { desk: DeskModel; onShowEvidence: () => void }) {
  const { sheet, whole } = desk;
  if (whole) {
    return (
      <EmptyState title="Findings of the batch itself">
        They concern the workbook as a whole, so there is no drawing. They are beside this, and the review
        cannot be closed while one is undecided.
      </EmptyState>
    );
  }
  if (sheet.isError)
    return <ErrorState error={sheet.error} what="The record" onRetry={() => void sheet.refetch()} />;
  if (!sheet.data) return <Skeleton lines={14} label="Loading the record sheet" />;
  return <DrawnLine data={sheet.data} desk={desk} onShowEvidence={onShowEvidence} />;
}

type DrawnProps = { data: RecordSheetData; desk: DeskModel; onShowEvidence: () => void };

function DrawnLine({ data, desk, onShowEvidence }: DrawnProps) {
  const { hand } = desk;
  const limits = useQuery(sheetLimitsQuery(data.record.standard));
  return (
    <div className="px-3 py-2.5 lg:[&_figure_svg]:max-h-[calc(100dvh-11rem)]">
      <RecordSheet
        {...useSheetData(data)}
        limits={limits.data}
        activeFinding={hand.marked}
        onActive={hand.hover}
        onPick={(id) => {
          hand.take(id);
          onShowEvidence();
          requestAnimationFrame(() => document.getElementById(findingElementId(id))?.focus());
        }}
        caution={false}
      />
      <p className="mt-1 text-small text-ink-2">
        <TextLink to={paths.record.to(data.record.id)}>Open the record page</TextLink>: measurements, pours
        and history.
      </p>
    </div>
  );
}
