import { useMemo } from 'react';
import { balloonsOf } from '../lib/result-view.ts';
import { RecordSheet } from '#src/components/drawing/record-sheet.tsx';
import { sheetLimits } from '#shared/drawing/sheet-limits.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import type { Standard } from '#shared/standard/types.ts';
import type { CheckedLine } from '#src/workers/check/protocol.ts';

/** A checked line drawn to scale, its findings as balloons. */
export function LineDrawing({ line, context }: { line: CheckedLine; context: CheckContextData }) {
  const findings = useMemo(() => balloonsOf(line.findings), [line.findings]);
  const limits = useMemo(() => {
    const standard = context.standards.find(({ n }) => n === line.standardNumber);
    return standard ? sheetLimits(standard.body as unknown as Standard) : undefined;
  }, [context, line.standardNumber]);
  return <RecordSheet record={line} findings={findings} limits={limits} caution={false} />;
}
