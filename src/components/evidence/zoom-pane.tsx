import { useLayoutEffect, useRef, useState, type PointerEvent } from 'react';
import { photoAddress, viewWord } from '#src/components/evidence/photo-words.ts';
import { classNames } from '#src/lib/class-names.ts';
import type { Photo } from '#shared/generated/api-types.ts';

/** The picture at a multiple of the window; what does not fit is scrolled or dragged. Keeps its middle while zooming. */
export function ZoomPane({ photo, zoom }: { photo: Photo; zoom: number }) {
  const pane = useRef<HTMLDivElement>(null);
  const before = useRef(zoom);
  const [missing, setMissing] = useState(false);
  useLayoutEffect(() => {
    const node = pane.current;
    const factor = zoom / before.current;
    before.current = zoom;
    if (!node || factor === 1) return;
    node.scrollLeft = (node.scrollLeft + node.clientWidth / 2) * factor - node.clientWidth / 2;
    node.scrollTop = (node.scrollTop + node.clientHeight / 2) * factor - node.clientHeight / 2;
  }, [zoom]);

  function drag(event: PointerEvent<HTMLDivElement>): void {
    if (event.buttons !== 1 || event.pointerType === 'touch' || !pane.current) return;
    pane.current.scrollLeft -= event.movementX;
    pane.current.scrollTop -= event.movementY;
  }

  if (photo.state !== 'ready' || missing) {
    return (
      <p role="status" className="flex flex-1 items-center justify-center p-8 text-center text-ink-2">
        {photo.problem ?? 'The picture is still being prepared. Open it again in a moment.'}
      </p>
    );
  }
  return (
    <div
      ref={pane}
      role="region"
      aria-label="Picture"
      // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- what scrolls must be reachable by keyboard
      tabIndex={0}
      onPointerMove={drag}
      className={classNames(
        'min-h-0 flex-1 overflow-auto bg-sunk',
        zoom > 1 && 'cursor-grab active:cursor-grabbing',
      )}
    >
      <div
        className="flex items-center justify-center"
        style={{ width: `${zoom * 100}%`, height: `${zoom * 100}%` }}
      >
        <img
          src={photoAddress(photo.id, 'display')}
          alt={`${viewWord(photo.view)}, ${photo.fileName}`}
          draggable={false}
          onError={() => setMissing(true)}
          className="h-full w-full object-contain"
        />
      </div>
    </div>
  );
}
