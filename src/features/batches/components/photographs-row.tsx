import { FileButton } from './file-button.tsx';
import { IntakeRow } from './intake-row.tsx';
import { UploadFaults } from './upload-faults.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Progress } from '#src/components/ui/progress.tsx';
import type { QueuedFile, UploadCounts } from '#src/lib/api/upload-queue.ts';
import { counted } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

type Props = {
  readonly batch: Batch;
  readonly open: boolean;
  readonly files: readonly QueuedFile[];
  readonly counts: UploadCounts;
  readonly onFiles: (files: readonly File[]) => void;
  readonly onRetry: () => void;
  readonly onClear: () => void;
  readonly onUnplaced: () => void;
};

/** `61 of 85 stored, 1 to try again`, while they are sent and after. */
export function PhotographsRow({ batch, open, files, counts, onFiles, onRetry, onClear, onUnplaced }: Props) {
  const { photos, unplacedPhotos } = batch.counts;
  return (
    <IntakeRow
      glyph={counts.failed > 0 ? 'triangle' : !counts.busy && photos > 0 ? 'tick' : 'dotted'}
      title="Photographs"
      action={
        open ? (
          <span className="flex flex-wrap justify-end gap-x-3">
            <FileButton
              kind="quiet"
              size="small"
              label="Choose photographs"
              accept="image/jpeg,image/png,image/webp"
              multiple
              onFiles={onFiles}
            >
              choose
            </FileButton>
            <span className="pointer-coarse:hidden">
              <FileButton
                kind="quiet"
                size="small"
                label="Choose a folder of photographs"
                folder
                onFiles={onFiles}
              >
                folder
              </FileButton>
            </span>
          </span>
        ) : null
      }
    >
      {counts.all === 0 ? (
        <p>{photos > 0 ? `${counted(photos, 'photograph')} stored` : 'None yet.'}</p>
      ) : (
        <div aria-live="polite">
          <p>{uploadWords(counts)}</p>
          <Progress
            done={counts.stored + counts.duplicate}
            total={counts.all}
            things="photographs stored"
            label="Photographs are being stored"
            bare
          />
        </div>
      )}
      {unplacedPhotos > 0 && batch.status === 'checking' ? (
        <p>The check places them; what it cannot place comes to you.</p>
      ) : null}
      {unplacedPhotos > 0 && batch.status !== 'checking' ? (
        <button
          type="button"
          onClick={onUnplaced}
          className="min-h-6 text-left text-query underline underline-offset-4 pointer-coarse:min-h-11"
        >
          {counted(unplacedPhotos, 'photograph lies', 'photographs lie')} on no line yet: place by hand
        </button>
      ) : null}
      <UploadFaults files={files} />
      {counts.failed > 0 || (!counts.busy && counts.all > 0) ? (
        <div className="mt-2 flex flex-wrap gap-3">
          {counts.failed > counts.refused ? (
            <Button size="small" onClick={onRetry}>
              Try {counted(counts.failed - counts.refused, 'photograph')} again
            </Button>
          ) : null}
          {!counts.busy ? (
            <Button size="small" kind="quiet" onClick={onClear}>
              Clear this list
            </Button>
          ) : null}
        </div>
      ) : null}
    </IntakeRow>
  );
}

function uploadWords({ all, stored, duplicate, failed, refused }: UploadCounts): string {
  return [
    `${stored + duplicate} of ${all} stored`,
    duplicate > 0 ? `${duplicate} here already` : '',
    refused > 0 ? `${refused} not accepted` : '',
    failed > refused ? `${failed - refused} to try again` : '',
  ]
    .filter(Boolean)
    .join(', ');
}
