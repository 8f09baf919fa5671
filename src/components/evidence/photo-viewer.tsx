import { Dialog as Radix } from 'radix-ui';
import { useState, type KeyboardEvent } from 'react';
import { photoAddress, photoFacts, viewWord } from '#src/components/evidence/photo-words.ts';
import { ZoomPane } from '#src/components/evidence/zoom-pane.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import type { Photo } from '#shared/generated/api-types.ts';

type Props = {
  readonly photos: readonly Photo[];
  /** Null: closed. */
  readonly index: number | null;
  readonly onIndex: (index: number | null) => void;
  readonly title: string;
};

const STEPS = [1, 1.5, 2, 3, 4, 6] as const;

/** One photograph as large as the window: arrows go on, + and − zoom, 0 fits, Escape closes. */
export function PhotoViewer({ photos, index, onIndex, title }: Props) {
  const photo = index === null ? undefined : photos[index];
  const metric = useUnitSystem() === 'metric';
  const [zoom, setZoom] = useState(0);

  function go(step: number): void {
    if (index === null || photos.length === 0) return;
    setZoom(0);
    onIndex((index + step + photos.length) % photos.length);
  }
  const nearer = () => setZoom((now) => Math.min(STEPS.length - 1, now + 1));
  const farther = () => setZoom((now) => Math.max(0, now - 1));

  function onKey(event: KeyboardEvent): void {
    const actions: Record<string, () => void> = {
      ArrowRight: () => go(1),
      ArrowLeft: () => go(-1),
      p: () => go(1),
      '+': nearer,
      '=': nearer,
      '-': farther,
      '0': () => setZoom(0),
    };
    // Zoomed in, the arrows move over the picture; the letter still goes on.
    if (zoom > 0 && event.key.startsWith('Arrow')) return;
    const action = actions[event.key];
    if (!action) return;
    event.preventDefault();
    action();
  }

  return (
    <Radix.Root
      open={photo !== undefined}
      onOpenChange={(open) => {
        if (open) return;
        setZoom(0);
        onIndex(null);
      }}
    >
      <Radix.Portal>
        <Radix.Content
          aria-describedby={undefined}
          onKeyDown={onKey}
          // The window itself has the keyboard, so that the arrows act at once and no button looks chosen.
          onOpenAutoFocus={(event) => {
            event.preventDefault();
            if (event.currentTarget instanceof HTMLElement) event.currentTarget.focus();
          }}
          className="fixed inset-0 z-50 flex flex-col bg-sheet outline-none"
        >
          {photo && index !== null ? (
            <>
              <div className="flex flex-wrap items-center gap-x-5 gap-y-1 border-b-[1.5px] border-ink px-gutter py-2">
                <Radix.Title className="text-lead font-semibold">
                  {title}: {viewWord(photo.view)}
                </Radix.Title>
                <span className="text-table text-ink-2">
                  {photoFacts(photo, { metric, withDay: true })} · {photo.fileName}
                </span>
                <span className="ml-auto flex flex-wrap items-center gap-2">
                  <span className="text-table text-ink-2">
                    {index + 1} of {photos.length}
                  </span>
                  <Button size="small" hotkey="←" aria-label="Photograph before" onClick={() => go(-1)}>
                    Before
                  </Button>
                  <Button size="small" hotkey="→" aria-label="Next photograph" onClick={() => go(1)}>
                    Next
                  </Button>
                  <Button size="small" hotkey="−" onClick={farther} disabled={zoom === 0}>
                    Farther
                  </Button>
                  <Button size="small" hotkey="+" onClick={nearer} disabled={zoom === STEPS.length - 1}>
                    Nearer
                  </Button>
                  <a
                    href={photoAddress(photo.id, 'original')}
                    className="text-table underline decoration-rule underline-offset-4 hover:decoration-ink"
                  >
                    Original file
                  </a>
                  <Radix.Close asChild>
                    <Button size="small" hotkey="Esc">
                      Close
                    </Button>
                  </Radix.Close>
                </span>
              </div>
              <ZoomPane key={photo.id} photo={photo} zoom={STEPS[zoom] ?? 1} />
            </>
          ) : null}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
