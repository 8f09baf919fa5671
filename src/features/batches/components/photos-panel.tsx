import { useQuery } from '@tanstack/react-query';
import { useId, useMemo, useState } from 'react';
import { batchLinesQuery } from '../api/batch-lines.ts';
import { batchPhotosQuery } from '../api/batch-photos.ts';
import { PhotoDialog } from './photo-dialog.tsx';
import { PhotoPicture, PhotoTile } from './photo-tile.tsx';
import { lineName, PlaceForm } from './place-form.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { counted, formatWallClock } from '#src/lib/formats.ts';
import type { Batch, Photo, RecordRow } from '#shared/generated/api-types.ts';

type Props = { readonly batch: Batch; readonly records: readonly RecordRow[] };

/** Lines drawn at once; more on demand, so that thousands of pictures do not stall a phone. */
const STEP = 40;

/** Photographs by line, and first those that lie on none. */
export function PhotosPanel({ batch, records: checked }: Props) {
  const batchId = batch.id;
  const { number } = batch.revision;
  // Before the first check of a later revision, photographs go on the lines that came back.
  const before = useQuery({
    ...batchLinesQuery(batchId, number - 1),
    enabled: checked.length === 0 && number > 0,
  });
  const records = checked.length > 0 ? checked : (before.data ?? checked);
  const photos = useQuery(batchPhotosQuery(batchId));
  const listId = useId();
  const [openId, setOpenId] = useState<string | null>(null);
  const [shown, setShown] = useState(STEP);
  const groups = useMemo(() => byLine(photos.data ?? [], records), [photos.data, records]);
  if (photos.isPending) return <Skeleton lines={6} />;
  if (photos.isError) {
    return <ErrorState error={photos.error} what="The photographs" onRetry={() => void photos.refetch()} />;
  }
  const unplaced = photos.data.filter((photo) => photo.lineId === null);
  const open = photos.data.find((photo) => photo.id === openId);
  if (photos.data.length === 0) {
    return (
      <EmptyState title="No photographs yet">
        Drop a folder of photographs on this page. A file named after its structure and view, such as “17-0426
        bore-depth.jpg”, finds its line by itself.
      </EmptyState>
    );
  }
  return (
    <>
      <datalist id={listId}>
        {records.map((record) => (
          <option key={record.id} value={lineName(record)}>
            {lineName(record)}
          </option>
        ))}
      </datalist>
      {unplaced.length > 0 ? (
        <section aria-label="Photographs on no line">
          <SectionHead
            title="On no line yet: place them by hand"
            aside={counted(unplaced.length, 'photograph')}
          />
          <ul className="grid grid-cols-[repeat(auto-fill,minmax(17rem,1fr))] gap-4 border-b border-hairline px-gutter py-4">
            {unplaced.slice(0, shown).map((photo) => (
              <li key={photo.id} className="border border-rule bg-sheet">
                <button type="button" className="block w-full text-left" onClick={() => setOpenId(photo.id)}>
                  <PhotoPicture photo={photo} />
                  <span className="block truncate px-2.5 pt-1.5 text-table font-semibold">
                    {photo.fileName}
                  </span>
                  <span className="block px-2.5 text-small text-muted">
                    {photo.takenAt ? formatWallClock(photo.takenAt) : 'time not known'}
                  </span>
                </button>
                {photo.can.includes('place') ? (
                  <div className="p-2.5">
                    <PlaceForm photo={photo} batchId={batchId} records={records} listId={listId} />
                  </div>
                ) : null}
              </li>
            ))}
          </ul>
        </section>
      ) : null}
      {groups.slice(0, shown).map(({ name, items }) => (
        <section key={name} aria-label={`Photographs of ${name}`}>
          <SectionHead title={name} aside={counted(items.length, 'photograph')} />
          <ul className="grid grid-cols-[repeat(auto-fill,minmax(9rem,1fr))] gap-2.5 border-b border-hairline px-gutter py-3">
            {items.map((photo) => (
              <li key={photo.id}>
                <PhotoTile photo={photo} onOpen={() => setOpenId(photo.id)} />
              </li>
            ))}
          </ul>
        </section>
      ))}
      {Math.max(groups.length, unplaced.length) > shown ? (
        <p className="px-gutter py-4">
          <Button onClick={() => setShown(shown + STEP)}>Show more</Button>
        </p>
      ) : null}
      {open ? (
        <PhotoDialog
          photo={open}
          batchId={batchId}
          records={records}
          listId={listId}
          onClose={() => setOpenId(null)}
        />
      ) : null}
    </>
  );
}

/** In the order of the lines; those on lines of another revision after them. */
function byLine(photos: readonly Photo[], records: readonly RecordRow[]): { name: string; items: Photo[] }[] {
  const groups = new Map<string, { name: string; items: Photo[] }>();
  for (const record of records) groups.set(record.lineId, { name: lineName(record), items: [] });
  for (const photo of photos) {
    if (photo.lineId === null) continue;
    const group = groups.get(photo.lineId) ?? { name: photo.structureNumber ?? 'Another line', items: [] };
    group.items.push(photo);
    groups.set(photo.lineId, group);
  }
  return [...groups.values()].filter((group) => group.items.length > 0);
}
