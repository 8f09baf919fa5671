import { photoAddress, photoFacts, viewWord } from '#src/components/evidence/photo-words.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { classNames } from '#src/lib/class-names.ts';
import type { Photo } from '#shared/generated/api-types.ts';

type Props = {
  readonly photos: readonly Photo[];
  readonly onOpen: (index: number) => void;
  readonly wide?: boolean;
};

/** Photographs of a line as prints: picture, view, time and distance. */
export function PhotoGrid({ photos, onOpen, wide }: Props) {
  const metric = useUnitSystem() === 'metric';
  return (
    <ul className={classNames('grid gap-2 px-3 py-2.5', columnsFor(photos.length, wide))}>
      {photos.map((photo, index) => (
        <li key={photo.id} className="min-w-0">
          <button
            type="button"
            onClick={() => onOpen(index)}
            className="block w-full border border-rule bg-paper text-left hover:border-ink"
          >
            <Picture photo={photo} />
            <span className="block px-1.5 py-1">
              <span className="block truncate text-small font-semibold">{viewWord(photo.view)}</span>
              <span className="block text-micro text-ink-2">
                {photoFacts(photo, { metric, short: !wide && photos.length > 4 })}
              </span>
            </span>
          </button>
        </li>
      ))}
    </ul>
  );
}

/** The place of prints that are still to come, as large as they will be, so that nothing moves when they do. */
export function PhotoGridSpace({ photos }: { readonly photos: readonly Pick<Photo, 'id' | 'view'>[] }) {
  return (
    <ul aria-hidden className={classNames('grid gap-2 px-3 py-2.5', columnsFor(photos.length))}>
      {photos.map((photo) => (
        <li key={photo.id} className="min-w-0 border border-rule bg-paper">
          <span className="block aspect-3/2 bg-sunk" />
          <span className="block px-1.5 py-1">
            <span className="block truncate text-small font-semibold">{viewWord(photo.view)}</span>
            <span className="block text-micro">{'\u00A0'}</span>
          </span>
        </li>
      ))}
    </ul>
  );
}

/** More prints stand closer, so that what is said of them stays in sight. */
function columnsFor(count: number, wide = false): string {
  if (wide) return 'grid-cols-[repeat(auto-fill,minmax(9rem,1fr))]';
  return count > 4 ? 'grid-cols-3' : 'grid-cols-2';
}

function Picture({ photo }: { photo: Photo }) {
  if (photo.state !== 'ready') {
    return (
      <span className="flex aspect-3/2 items-center justify-center bg-sunk px-2 text-center text-micro text-ink-2">
        {photo.state === 'stored' && photo.problem === null ? 'Being prepared' : 'Cannot be shown'}
      </span>
    );
  }
  return (
    <img
      src={photoAddress(photo.id, 'thumb')}
      alt={`${viewWord(photo.view)}, ${photo.fileName}`}
      loading="lazy"
      decoding="async"
      className="aspect-3/2 w-full bg-sunk object-cover"
    />
  );
}
