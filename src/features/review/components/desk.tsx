import { useState } from 'react';
import { lineState } from '#src/components/evidence/line-words.ts';
import { PhotoViewer } from '#src/components/evidence/photo-viewer.tsx';
import { WHO_DECIDES } from '#shared/drawing/who-decides.ts';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { useMoveBatch } from '#src/features/review/api/move-batch.ts';
import { CloseDialog } from '#src/features/review/components/close-dialog.tsx';
import { DeskBand } from '#src/features/review/components/desk-band.tsx';
import { DeskNotices } from '#src/features/review/components/desk-notices.tsx';
import { DeskSteps } from '#src/features/review/components/desk-steps.tsx';
import { EvidencePane } from '#src/features/review/components/evidence-pane.tsx';
import { DESK_KEYS, KeysDialog } from '#src/features/review/components/keys-dialog.tsx';
import { LinesPane } from '#src/features/review/components/lines-pane.tsx';
import { SheetPane } from '#src/features/review/components/sheet-pane.tsx';
import { deskCounts } from '#src/features/review/desk/desk-tabs.ts';
import { useDesk } from '#src/features/review/desk/use-desk.ts';
import { useDeskKeys } from '#src/features/review/desk/use-desk-keys.ts';
import type { DeskStep } from '#src/features/review/desk/use-place.ts';
import { classNames } from '#src/lib/class-names.ts';
import type { Batch, RecordRow } from '#shared/generated/api-types.ts';

const MOVE_KEYS = DESK_KEYS.filter((hint) => ['J', 'N', 'P', '?'].includes(hint.keys[0] ?? ''));

/** One batch under review: lines, drawing, evidence side by side; one after the other where there is no room. */
export function Desk({
  batch,
  lines,
  onClosed,
}: {
  batch: Batch;
  lines: readonly RecordRow[];
  onClosed: () => void;
}) {
  const desk = useDesk(batch, lines);
  const [photo, setPhoto] = useState<number | null>(null);
  const [keys, setKeys] = useState(false);
  const [closing, setClosing] = useState(false);
  const move = useMoveBatch(batch.id);
  const photos = desk.whole ? [] : (desk.sheet.data?.photos ?? []);
  const counts = deskCounts(lines);
  const decides = batch.can.includes('close-review') || desk.record?.can.includes('decide') === true;
  useDeskKeys(desk, {
    onPhoto: () => photos.length > 0 && setPhoto(0),
    onKeys: () => setKeys(true),
  });
  const openOfBatch = desk.own.filter((one) => one.severity !== 'note' && one.state === 'undecided').length;
  const pane = (step: DeskStep) =>
    classNames('min-h-0 flex-col lg:flex', desk.place.step === step ? 'flex' : 'hidden');

  return (
    <div className="flex flex-1 flex-col lg:h-[calc(100dvh-2.75rem-1.5px)] lg:flex-none">
      <DeskBand batch={batch} counts={counts} onClose={() => setClosing(true)} move={move} />
      <DeskNotices desk={desk} moveError={move.error} />
      <DeskSteps desk={desk} lines={lines.length} />
      <div className="grid min-h-0 flex-1 lg:grid-cols-[15rem_minmax(0,1fr)_21rem] xl:grid-cols-[19.5rem_minmax(0,1fr)_25rem]">
        <section
          aria-label="Lines of the batch"
          className={classNames(pane('lines'), 'bg-sheet lg:border-r')}
        >
          <LinesPane desk={desk} batch={batch} lines={lines} clean={counts.clean} />
        </section>
        <section aria-label="Record sheet" className={classNames(pane('sheet'), 'overflow-y-auto')}>
          <SheetPane desk={desk} onShowEvidence={() => desk.place.setStep('evidence')} />
        </section>
        <section
          aria-label="Evidence and findings"
          className={classNames(pane('evidence'), 'overflow-y-auto bg-sheet lg:border-l')}
        >
          <EvidencePane desk={desk} onPhoto={setPhoto} />
        </section>
      </div>
      <StatusBar
        left={<span className="sr-only">{spoken(desk.record)}</span>}
        keys={decides ? DESK_KEYS : MOVE_KEYS}
        right={WHO_DECIDES}
      />
      <PhotoViewer
        photos={photos}
        index={photo}
        onIndex={setPhoto}
        title={desk.record?.structureNumber ?? batch.number}
      />
      <KeysDialog open={keys} onOpenChange={setKeys} />
      <CloseDialog
        open={closing}
        onOpenChange={setClosing}
        batch={batch}
        counts={counts}
        lines={lines}
        openOfBatch={openOfBatch}
        onGo={desk.select}
        onClosed={onClosed}
      />
    </div>
  );
}

/** What a decision did, for those who hear the page. */
function spoken(line: RecordRow | null): string {
  return line ? `${line.structureNumber}: ${lineState(line).word}` : '';
}
