import { photoFile } from '../api/batch-photos.ts';
import { viewWord } from '#shared/records/photo-views.ts';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { formatWallClock } from '#src/lib/formats.ts';
import type { Photo } from '#shared/generated/api-types.ts';

type Props = { readonly photo: Photo; readonly onOpen: () => void };

/** Picture, view, when and how far from the structure. */
export function PhotoTile({ photo, onOpen }: Props) {
  const title = photo.view ? viewWord(photo.view) : photo.fileName;
  return (
    <button
      type="button"
      onClick={onOpen}
      className="block w-full border border-rule bg-sheet text-left hover:border-ink"
    >
      <PhotoPicture photo={photo} />
      <span className="block px-2 py-1.5">
        <span className="block truncate text-table font-semibold first-letter:uppercase">{title}</span>
        <span className="block text-small text-muted">
          {photo.takenAt ? formatWallClock(photo.takenAt) : 'time not known'}
          {photo.distanceFt === null ? null : (
            <>
              , <Quantity value={Math.round(photo.distanceFt)} unit="ft" /> from position
            </>
          )}
        </span>
      </span>
    </button>
  );
}

export function PhotoPicture({ photo }: { photo: Photo }) {
  if (photo.state === 'ready') {
    return (
      <img
        src={photoFile(photo.id, 'thumb')}
        alt=""
        loading="lazy"
        className="aspect-[3/2] w-full border-b border-rule object-cover"
      />
    );
  }
  return (
    <span className="flex aspect-[3/2] w-full items-center justify-center border-b border-rule bg-sunk px-3 text-center text-small text-muted">
      {photo.problem ?? (photo.state === 'stored' ? 'being prepared' : 'cannot be read')}
    </span>
  );
}
