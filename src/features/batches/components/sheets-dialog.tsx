import { useQuery, useQueryClient } from '@tanstack/react-query';
import { sheetFileQuery } from '../api/sheet-file.ts';
import { Callout } from '#src/components/ui/callout.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { ExportLink } from '#src/components/ui/export-link.tsx';
import { Progress } from '#src/components/ui/progress.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { useProgress } from '#src/lib/api/use-progress.ts';
import { counted } from '#src/lib/formats.ts';
import type { SheetFile } from '#shared/generated/api-types.ts';

type Props = {
  /** Null: none is asked for. */
  readonly fileId: string | null;
  /** Why it could not be asked for. */
  readonly error: Error | null;
  readonly onClose: () => void;
};

/** How far the PDF is, and where it is when it is ready. */
export function SheetsDialog({ fileId, error, onClose }: Props) {
  const found = useQuery({ ...sheetFileQuery(fileId ?? ''), enabled: fileId !== null });
  return (
    <Dialog
      open={fileId !== null || error !== null}
      onOpenChange={(open) => (open ? undefined : onClose())}
      title="Record sheets as a PDF"
    >
      {error ? <ErrorState error={error} what="The PDF" /> : null}
      {found.isError ? (
        <ErrorState error={found.error} what="The PDF" onRetry={() => void found.refetch()} />
      ) : null}
      {fileId !== null && found.isPending ? <Skeleton lines={2} label="Looking for the PDF" /> : null}
      {found.data ? <FileState file={found.data} /> : null}
    </Dialog>
  );
}

function FileState({ file }: { file: SheetFile }) {
  const client = useQueryClient();
  const atWork = file.state === 'queued' || file.state === 'running';
  const progress = useProgress(atWork ? `sheets:${file.id}` : null, {
    poll: async () => {
      const now = await client.fetchQuery({ ...sheetFileQuery(file.id), staleTime: 0 });
      return {
        state: now.state === 'ready' ? 'done' : now.state,
        done: now.done,
        total: now.sheets,
        problem: now.problem,
      };
    },
    onFinal: () => void client.invalidateQueries({ queryKey: ['sheet-files', file.id] }),
  });
  if (file.state === 'failed')
    return (
      <Callout tone="nonconform" title="The sheets could not be written">
        <p>{file.problem ?? 'No reason was kept. Ask for them again.'}</p>
      </Callout>
    );
  if (file.state === 'ready')
    return (
      <div className="flex flex-wrap items-center justify-between gap-3">
        <p>
          {counted(file.sheets, 'sheet')} on {counted(file.pages ?? 0, 'page')}, {paperWord(file.paper)}.
        </p>
        <ExportLink kind="primary" path={`/api/sheets/${file.id}/file`}>
          Download the PDF
        </ExportLink>
      </div>
    );
  return (
    <>
      <Progress
        done={progress?.done ?? file.done}
        total={progress?.total ?? file.sheets}
        things={
          (progress?.state ?? file.state) === 'queued' ? 'sheets drawn; waits for its turn' : 'sheets drawn'
        }
        label="Drawing the sheets"
      />
      <p className="mt-2 text-table text-muted">
        You can close this or leave the page: the PDF is made all the same, and this address finds it again.
      </p>
    </>
  );
}

function paperWord(paper: SheetFile['paper']): string {
  return paper === 'a4' ? 'A4' : 'US Letter';
}
