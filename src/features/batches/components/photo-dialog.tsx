import { photoFile } from '../api/batch-photos.ts';
import { PlaceForm } from './place-form.tsx';
import { viewWord } from '#shared/records/photo-views.ts';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { Fact } from '#src/components/ui/page-band.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { formatWallClock } from '#src/lib/formats.ts';
import type { Photo, RecordRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly photo: Photo;
  readonly batchId: string;
  readonly records: readonly RecordRow[];
  readonly listId: string;
  readonly onClose: () => void;
};

const METHODS = { sheet: 'by the Photos sheet', name: 'by its file name', hand: 'by hand' } as const;

export function PhotoDialog({ photo, batchId, records, listId, onClose }: Props) {
  const place = photo.structureNumber
    ? `${photo.structureNumber}, ${viewWord(photo.view ?? 'other')}`
    : 'On no line yet';
  return (
    <Dialog
      open
      wide
      onOpenChange={(open) => !open && onClose()}
      title={place}
      description={
        <p className="flex flex-wrap gap-x-5 text-table">
          <Fact>{photo.fileName}</Fact>
          {photo.method ? <Fact word="placed">{METHODS[photo.method]}</Fact> : null}
          <Fact word="taken">{photo.takenAt ? formatWallClock(photo.takenAt) : 'not known'}</Fact>
          {photo.distanceFt === null ? null : (
            <Fact>
              <Quantity value={Math.round(photo.distanceFt)} unit="ft" /> from position
            </Fact>
          )}
          {photo.width && photo.height ? (
            <Fact>
              {photo.width} × {photo.height} px
            </Fact>
          ) : null}
        </p>
      }
    >
      <div className="grid gap-4">
        {photo.state === 'ready' ? (
          <img
            src={photoFile(photo.id, 'display')}
            alt={`Photograph: ${place}`}
            className="max-h-[60dvh] w-full border border-hairline object-contain"
          />
        ) : (
          <p>{photo.problem ?? 'The picture is being prepared.'}</p>
        )}
        {photo.can.includes('place') ? (
          <PlaceForm photo={photo} batchId={batchId} records={records} listId={listId} onPlaced={onClose} />
        ) : null}
        <div>
          <Button onClick={onClose}>Close</Button>
        </div>
      </div>
    </Dialog>
  );
}
