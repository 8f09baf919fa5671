import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { PhotoGrid } from '#src/components/evidence/photo-grid.tsx';
import { PhotoViewer } from '#src/components/evidence/photo-viewer.tsx';
import { RecordSheet } from '#src/components/drawing/record-sheet.tsx';
import { useSheetData } from '#src/components/drawing/use-sheet-data.ts';
import { recordSheetQuery } from '#src/lib/api/record-sheet.ts';
import { sheetLimitsQuery } from '#src/lib/api/sheet-limits.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';

/** The drawing and the photographs, so that the answer is given with the evidence in sight. */
export function ConcessionSheet({ recordId }: { recordId: string }) {
  const sheet = useQuery(recordSheetQuery(recordId));
  // The words above stand on their own; the record has its own page and tells there what is wrong.
  return sheet.data ? <Evidence data={sheet.data} /> : null;
}

function Evidence({ data }: { data: RecordSheetData }) {
  const limits = useQuery(sheetLimitsQuery(data.record.standard));
  const [photo, setPhoto] = useState<number | null>(null);
  const { record, photos } = data;
  return (
    <div className="border-t border-hairline">
      {photos.length > 0 ? <PhotoGrid photos={photos} onOpen={setPhoto} wide /> : null}
      <div className="max-w-3xl px-3 py-2.5">
        <RecordSheet {...useSheetData(data)} limits={limits.data} />
      </div>
      <PhotoViewer photos={photos} index={photo} onIndex={setPhoto} title={record.structureNumber} />
    </div>
  );
}
