import type { CheckState } from '../api/use-check.ts';
import { CameraButton } from './camera-button.tsx';
import { CheckRow } from './check-row.tsx';
import { PhotographsRow } from './photographs-row.tsx';
import { ReviewRow } from './review-row.tsx';
import type { useIntake } from './use-intake.ts';
import { WorkbookRow } from './workbook-row.tsx';
import type { BatchView } from '../lib/line-view.ts';
import { problemText } from '#src/lib/api/problem-text.ts';
import type { Batch } from '#shared/generated/api-types.ts';

type Props = {
  readonly batch: Batch;
  readonly view: BatchView;
  readonly check: CheckState | null;
  readonly intake: ReturnType<typeof useIntake>;
  readonly onUnplaced: () => void;
};

/** What the batch is made of, and the way to add to it. */
export function Intake({ batch, view, check, intake, onUnplaced }: Props) {
  const open = batch.can.includes('upload');
  const refused =
    check?.state === 'failed' ? (problemText(check.problem) ?? 'It could not be checked.') : null;
  return (
    <>
      <WorkbookRow
        batch={batch}
        open={open}
        sent={intake.workbook.sent}
        error={intake.workbook.error}
        refused={refused}
        onFile={intake.sendWorkbook}
      />
      <PhotographsRow
        batch={batch}
        open={open}
        files={intake.files}
        counts={intake.counts}
        onFiles={intake.take}
        onRetry={intake.queue.retry}
        onClear={intake.queue.clear}
        onUnplaced={onUnplaced}
      />
      <CheckRow batch={batch} check={check} />
      <ReviewRow batch={batch} />
      {intake.told.map((text) => (
        <p key={text} role="alert" className="border-b border-hairline px-gutter py-2 text-table text-query">
          {text}
        </p>
      ))}
      {open ? (
        <CameraButton lines={view.lines} files={intake.files} onPhotograph={intake.photograph} />
      ) : null}
      {open ? (
        <p className="px-gutter py-3 text-table text-muted pointer-coarse:hidden max-lg:hidden">
          Drop the workbook and the photographs, or whole folders, anywhere on this page.
        </p>
      ) : null}
    </>
  );
}
