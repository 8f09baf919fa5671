import { useEffect, useRef, useState } from 'react';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import { checkWorkbook, type WorkbookCheckState } from './check-workbook.ts';

export type WorkbookCheck = {
  readonly file: File | null;
  readonly state: WorkbookCheckState | null;
  readonly take: (file: File) => void;
  readonly cancel: () => void;
};

/** The check of the file chosen last; leaving the page ends it. */
export function useWorkbookCheck(context: () => Promise<CheckContextData>): WorkbookCheck {
  const [file, setFile] = useState<File | null>(null);
  const [state, setState] = useState<WorkbookCheckState | null>(null);
  const stop = useRef<() => void>(() => undefined);
  const turn = useRef(0);
  useEffect(() => () => stop.current(), []);
  function cancel(): void {
    turn.current += 1;
    stop.current();
    setFile(null);
    setState(null);
  }
  function take(chosen: File): void {
    cancel();
    const mine = turn.current;
    setFile(chosen);
    setState({ phase: 'running', rows: 0, done: 0, lines: 0 });
    context().then(
      (known) => {
        if (mine === turn.current) stop.current = checkWorkbook({ file: chosen, context: known }, setState);
      },
      (error: unknown) => {
        if (mine !== turn.current) return;
        const detail = error instanceof Error ? error.message : 'What it is checked against did not come.';
        setState({ phase: 'failed', detail });
      },
    );
  }
  return { file, state, take, cancel };
}
