import type { ReactNode } from 'react';
import { Glyph, type GlyphName } from '#src/components/ui/glyph.tsx';
import { classNames } from '#src/lib/class-names.ts';

type Tone = 'note' | 'query' | 'nonconform' | 'conform';

const TONES: Record<Tone, { glyph: GlyphName; edge: string }> = {
  note: { glyph: 'info', edge: 'border-l-ink' },
  query: { glyph: 'circle', edge: 'border-l-query' },
  nonconform: { glyph: 'triangle', edge: 'border-l-nonconform' },
  conform: { glyph: 'tick', edge: 'border-l-conform' },
};

/** Something to know before going on. */
export function Callout({
  tone = 'note',
  title,
  children,
}: {
  tone?: Tone;
  title?: string;
  children?: ReactNode;
}) {
  const { glyph, edge } = TONES[tone];
  return (
    <div className={classNames('flex gap-3 border border-l-[3px] border-hairline bg-sheet px-4 py-3', edge)}>
      <Glyph name={glyph} className="mt-1" />
      <div className="min-w-0">
        {title ? <p className="font-semibold">{title}</p> : null}
        {children ? <div className="text-ink-2">{children}</div> : null}
      </div>
    </div>
  );
}
