import { useState } from 'react';
import { usePlacePhoto } from '../api/place-photo.ts';
import { VIEWS, VIEWS_OF_KIND, viewWord } from '#shared/records/photo-views.ts';
import { CONTROL } from '#src/components/form/field-frame.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { classNames } from '#src/lib/class-names.ts';
import type { Photo, PhotoMatchBody, RecordRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly photo: Photo;
  readonly batchId: string;
  readonly records: readonly RecordRow[];
  /** Id of the page's one list of structures: a list in each form would be thousands of options. */
  readonly listId: string;
  readonly onPlaced?: () => void;
};

/** Structure and view of a photograph, by hand. */
export function PlaceForm({ photo, batchId, records, listId, onPlaced }: Props) {
  const place = usePlacePhoto(batchId);
  const current = records.find((record) => record.lineId === photo.lineId);
  const [structure, setStructure] = useState(current ? lineName(current) : '');
  const [view, setView] = useState(photo.view ?? '');
  const [fault, setFault] = useState<string | null>(null);
  const line = records.find((record) => lineName(record).toLowerCase() === structure.trim().toLowerCase());
  const views = line ? VIEWS_OF_KIND[line.kind] : VIEWS;
  const id = `place-${photo.id}`;

  function submit(): void {
    if (!line) return setFault('Choose a structure that has a line in this batch.');
    if (!views.includes(view)) return setFault('Choose what the photograph shows.');
    setFault(null);
    place.mutate(
      { photoId: photo.id, match: { lineId: line.lineId, view: view as PhotoMatchBody['view'] } },
      { onSuccess: onPlaced },
    );
  }

  return (
    <form
      aria-label={`Place ${photo.fileName}`}
      className="grid gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        submit();
      }}
    >
      <div className="grid grid-cols-2 gap-2">
        <label className="block min-w-0 text-small">
          Structure
          <input
            list={listId}
            value={structure}
            autoComplete="off"
            aria-invalid={fault !== null && !line ? true : undefined}
            aria-describedby={fault ? `${id}-fault` : undefined}
            onChange={(event) => setStructure(event.target.value)}
            className={CONTROL}
          />
        </label>
        <label className="block min-w-0 text-small">
          Shows
          <select
            value={views.includes(view) ? view : ''}
            aria-describedby={fault ? `${id}-fault` : undefined}
            onChange={(event) => setView(event.target.value)}
            className={classNames(CONTROL, 'px-1.5')}
          >
            <option value="">Choose</option>
            {views.map((one) => (
              <option key={one} value={one}>
                {viewWord(one)}
              </option>
            ))}
          </select>
        </label>
      </div>
      {fault || place.isError ? (
        <p id={`${id}-fault`} role="alert" className="text-small font-semibold text-nonconform">
          {fault ?? place.error?.message}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" size="small" busy={place.isPending ? 'Placing' : false}>
          {photo.lineId ? 'Move it here' : 'Place it'}
        </Button>
        {photo.can.includes('take-off') ? (
          <Button
            size="small"
            kind="quiet"
            onClick={() => place.mutate({ photoId: photo.id, match: null }, { onSuccess: onPlaced })}
          >
            Take it off its line
          </Button>
        ) : null}
      </div>
    </form>
  );
}

export const lineName = ({ structureNumber, occurrence }: RecordRow): string =>
  occurrence > 1 ? `${structureNumber} (entry ${occurrence})` : structureNumber;
