import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { lineStamp } from '#shared/drawing/line-stamp.ts';
import { sheetFindings } from '#shared/drawing/number-findings.ts';
import { PhotoGrid } from '#src/components/evidence/photo-grid.tsx';
import { PhotoViewer } from '#src/components/evidence/photo-viewer.tsx';
import { titleBlockData } from '#shared/drawing/title-block-data.ts';
import { RecordSheet } from '#src/components/drawing/record-sheet.tsx';
import { recordSheetQuery } from '#src/lib/api/record-sheet.ts';
import { sheetLimitsQuery } from '#src/lib/api/sheet-limits.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** The drawing and the photographs, so that the answer is given with the evidence in sight. */
export function ConcessionSheet({ recordId }: { recordId: string }) {
  const sheet = useQuery(recordSheetQuery(recordId));
  const limits = useQuery(sheetLimitsQuery(sheet.data?.record.standard ?? 0));
  const [photo, setPhoto] = useState<number | null>(null);
  // The words above stand on their own; the record has its own page and tells there what is wrong.
  if (!sheet.data) return null;
  const { record, findings, photos, titleBlock } = sheet.data;
  return (
    <div className="border-t border-hairline">
      {photos.length > 0 ? <PhotoGrid photos={photos} onOpen={setPhoto} wide /> : null}
      <div className="max-w-3xl px-3 py-2.5">
        <RecordSheet
          record={{ ...record, values: record.values as FieldValues }}
          findings={sheetFindings(findings)}
          titleBlock={titleBlockData(titleBlock)}
          limits={limits.data}
          stamp={lineStamp(record, findings)}
        />
      </div>
      <PhotoViewer photos={photos} index={photo} onIndex={setPhoto} title={record.structureNumber} />
    </div>
  );
}
