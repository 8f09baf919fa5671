import { useMemo } from 'react';
import { lineStamp } from '#shared/drawing/line-stamp.ts';
import { sheetFindings } from '#shared/drawing/number-findings.ts';
import { titleBlockData } from '#shared/drawing/title-block-data.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** A record as its sheet takes it; the same object until the data change, so that hovering does not draw it anew. */
export function useSheetData(data: RecordSheetData) {
  const metric = useUnitSystem() === 'metric';
  return useMemo(
    () => ({
      record: {
        ...data.record,
        values: data.record.values as FieldValues,
        pours: data.pours,
        events: data.events.map((event) => event.values as FieldValues),
      },
      findings: sheetFindings(data.findings),
      titleBlock: titleBlockData(data.titleBlock, { metric }),
      stamp: lineStamp(data.record, data.findings),
    }),
    [data, metric],
  );
}
