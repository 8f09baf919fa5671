import { FileButton } from './file-button.tsx';
import { IntakeRow } from './intake-row.tsx';
import { Progress } from '#src/components/ui/progress.tsx';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { counted } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

type Props = {
  readonly batch: Batch;
  readonly open: boolean;
  readonly sent: { readonly bytes: number; readonly total: number } | null;
  readonly error: Error | null;
  /** Why the check could not read it. */
  readonly refused: string | null;
  readonly onFile: (file: File) => void;
};

const KB = 1024;

export function WorkbookRow({ batch, open, sent, error, refused, onFile }: Props) {
  const { fileName } = batch.workbook;
  // Lines came back, and nothing was handed in since: the workbook shown is that of the revision before.
  const due = open && batch.revision.number > 0 && batch.input === 0;
  const bad = error !== null || refused !== null;
  return (
    <IntakeRow
      glyph={bad ? 'triangle' : fileName && !due ? 'tick' : 'dotted'}
      title="Workbook"
      action={
        open ? (
          <FileButton
            kind="quiet"
            size="small"
            accept=".xlsx"
            label={fileName && !due ? 'Replace the workbook' : 'Choose the workbook'}
            busy={sent ? 'sending' : false}
            onFiles={([file]) => file && onFile(file)}
          >
            {fileName && !due ? 'replace' : 'choose'}
          </FileButton>
        ) : null
      }
    >
      {due ? (
        <p>
          The corrected one is not here yet; {counted(batch.counts.lines, 'line waits', 'lines wait')} for it.
        </p>
      ) : fileName ? (
        <p className="break-words">
          {fileName}
          {batch.counts.lines > 0 ? `, ${counted(batch.counts.lines, 'line')}` : ''}
        </p>
      ) : (
        <p>{open ? 'Not here yet. Drop it on this page or choose it.' : 'None was handed in.'}</p>
      )}
      {sent ? (
        <Progress
          done={Math.round(sent.bytes / KB)}
          total={Math.max(1, Math.round(sent.total / KB))}
          things="kB sent"
          label="The workbook is being sent"
        />
      ) : null}
      {error ? (
        <p role="alert" className="mt-1 text-nonconform">
          {error instanceof ApiProblem ? error.message : 'It could not be sent. Choose it again.'}
        </p>
      ) : null}
      {refused ? (
        <div role="alert" className="mt-1 text-nonconform">
          <p className="font-semibold">The workbook was not taken</p>
          <p>{refused}</p>
        </div>
      ) : null}
    </IntakeRow>
  );
}
