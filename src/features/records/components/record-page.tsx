import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { LineRevisions } from '#src/components/evidence/line-revisions.tsx';
import { lineState } from '#src/components/evidence/line-words.ts';
import { HistoryList } from '#src/components/evidence/history-list.tsx';
import { PhotoGrid } from '#src/components/evidence/photo-grid.tsx';
import { PhotoViewer } from '#src/components/evidence/photo-viewer.tsx';
import { PrintMenu } from '#src/components/drawing/print-menu.tsx';
import { RecordSheet } from '#src/components/drawing/record-sheet.tsx';
import { useSheetData } from '#src/components/drawing/use-sheet-data.ts';
import { Cautions } from '#src/components/ui/caution.tsx';
import { Fact, PageBand, SectionHead } from '#src/components/ui/page-band.tsx';
import { StateWord } from '#src/components/ui/state-word.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { DerivedFigures } from '#src/features/records/components/derived-figures.tsx';
import { LineMoves } from '#src/features/records/components/line-moves.tsx';
import { Measurements } from '#src/features/records/components/measurements.tsx';
import { PoursTable } from '#src/features/records/components/pours-table.tsx';
import { PrintFindings } from '#src/features/records/components/print-findings.tsx';
import { RecordFindings } from '#src/features/records/components/record-findings.tsx';
import { StrengthTable } from '#src/features/records/components/strength-table.tsx';
import { UncertaintyTable } from '#src/features/records/components/uncertainty-table.tsx';
import { sheetLimitsQuery } from '#src/lib/api/sheet-limits.ts';
import { counted } from '#src/lib/formats.ts';
import { useUser } from '#src/lib/session/session.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';

/** One structure: its drawing, all that was written of it, and what became of it. Printed, it is the sheet alone. */
export function RecordPage({ data }: { data: RecordSheetData }) {
  const { record, findings, photos, batch, registerEntry } = data;
  const user = useUser();
  const sheet = useSheetData(data);
  const limits = useQuery(sheetLimitsQuery(record.standard));
  const [photo, setPhoto] = useState<number | null>(null);
  const [marked, setMarked] = useState<string | null>(null);
  const batchTo = user.role === 'contractor' ? paths.batch.to(batch.id) : paths.reviewBatch.to(batch.id);
  return (
    <>
      <div className="print:hidden">
        <PageBand
          title={record.structureNumber}
          facts={
            <>
              <Fact>
                <StateWord {...lineState(record)} />
              </Fact>
              <Fact word="batch">
                <TextLink to={user.role === 'contractor' ? batchTo : `${batchTo}?line=${record.id}&tab=all`}>
                  {batch.number}
                </TextLink>
              </Fact>
              <Fact word="work order">
                {batch.workOrder.number} · {batch.workOrder.title}
              </Fact>
              <Fact word="from">{batch.contractor.name}</Fact>
              {registerEntry ? (
                <Fact word="on record as">
                  <TextLink to={paths.registerRecord.to(registerEntry.recordNumber)}>
                    {registerEntry.recordNumber}
                  </TextLink>
                  , version {registerEntry.version}
                </Fact>
              ) : null}
            </>
          }
          actions={
            <>
              <LineMoves record={record} />
              <PrintMenu recordId={record.id} />
            </>
          }
        />
      </div>
      <div className="grid flex-1 lg:grid-cols-[minmax(0,1fr)_26rem] print:block">
        <div className="min-w-0 lg:border-r print:border-none">
          <div className="mx-auto max-w-5xl px-3 py-2.5 print:max-w-none print:p-0">
            <RecordSheet
              {...sheet}
              limits={limits.data}
              activeFinding={marked}
              onActive={setMarked}
              onPick={(id) => document.getElementById(`finding-${id}`)?.focus()}
            />
            <PrintFindings findings={findings} />
          </div>
          <div className="border-t border-hairline print:hidden">
            <DerivedFigures record={record} hint={data.uncertainty.length === 0} limits={limits.data} />
            <UncertaintyTable data={data} />
            <StrengthTable data={data} />
            <Measurements data={data} />
            <PoursTable pours={data.pours} />
          </div>
        </div>
        <div className="min-w-0 print:hidden">
          <RecordFindings findings={findings} marked={marked} onMark={setMarked} />
          <section aria-labelledby="photographs">
            <SectionHead
              title="Photographs"
              id="photographs"
              aside={photos.length === 0 ? 'none' : counted(photos.length, 'photograph')}
            />
            {photos.length > 0 ? <PhotoGrid photos={photos} onOpen={setPhoto} wide /> : null}
          </section>
          <section aria-labelledby="history">
            <SectionHead title="History" id="history" />
            <LineRevisions batch={batch} record={record} />
            <HistoryList entries={data.history} />
          </section>
          <div className="px-gutter py-4">
            <Cautions />
          </div>
        </div>
      </div>
      <PhotoViewer photos={photos} index={photo} onIndex={setPhoto} title={record.structureNumber} />
    </>
  );
}
