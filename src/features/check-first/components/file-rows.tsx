import { FileButton } from '#src/features/batches/components/file-button.tsx';
import { IntakeRow } from '#src/features/batches/components/intake-row.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Progress } from '#src/components/ui/progress.tsx';
import { counted, formatCount } from '#src/lib/formats.ts';
import type { WorkbookCheck } from '../lib/use-workbook-check.ts';

const ACCEPT = '.xlsx';

/** The file, and how far its check has come. */
export function FileRows({ check }: { check: WorkbookCheck }) {
  const { file, state, take, cancel } = check;
  const bad = state?.phase === 'refused' || state?.phase === 'failed';
  return (
    <>
      <IntakeRow
        glyph={bad ? 'triangle' : file ? 'tick' : 'dotted'}
        title="Workbook"
        action={
          file ? (
            <FileButton
              kind="quiet"
              size="small"
              accept={ACCEPT}
              label="Choose another workbook"
              onFiles={([chosen]) => chosen && take(chosen)}
            >
              another
            </FileButton>
          ) : null
        }
      >
        <p className="break-words">
          {file ? file.name : 'Drop it on this page or choose it. It stays on this device.'}
        </p>
        {file ? null : (
          <div className="mt-2">
            <FileButton
              kind="primary"
              accept={ACCEPT}
              label="Choose the workbook"
              onFiles={([chosen]) => chosen && take(chosen)}
            >
              Choose the workbook
            </FileButton>
          </div>
        )}
        {bad ? (
          <div role="alert" className="mt-1 text-nonconform">
            <p className="font-semibold">
              {state.phase === 'refused' ? 'It would not be taken' : 'It was not checked'}
            </p>
            <p>{state.detail}</p>
          </div>
        ) : null}
      </IntakeRow>
      <IntakeRow
        glyph={state?.phase === 'done' ? 'tick' : 'dotted'}
        title="Check"
        action={
          state?.phase === 'running' ? (
            <Button kind="quiet" size="small" onClick={cancel}>
              stop
            </Button>
          ) : null
        }
      >
        <div aria-live="polite">
          <CheckWords check={check} />
        </div>
      </IntakeRow>
    </>
  );
}

function CheckWords({ check: { state } }: { check: WorkbookCheck }) {
  if (state === null) return <p>Begins when the workbook is here.</p>;
  switch (state.phase) {
    case 'running':
      return (
        <Progress
          done={state.done}
          // Until the first lines come, how far it is cannot be told, and the bar makes no claim.
          total={state.done > 0 ? state.lines : 0}
          things="lines checked"
          label={readingWords(state)}
        />
      );
    case 'done':
      return <p>{counted(state.result.lines.length, 'line')} checked, here in the browser.</p>;
    default:
      return <p>It ended without a result; see the workbook above.</p>;
  }
}

function readingWords({ rows, lines }: { readonly rows: number; readonly lines: number }): string {
  if (lines > 0) return `${counted(lines, 'line')} read; the rules run over them`;
  return rows > 0 ? `${formatCount(rows)} rows read` : 'The workbook is being read';
}
