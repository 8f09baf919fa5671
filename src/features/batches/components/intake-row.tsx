import type { ReactNode } from 'react';
import { Glyph, type GlyphName } from '#src/components/ui/glyph.tsx';

type Props = {
  readonly glyph: GlyphName;
  readonly title: string;
  readonly action?: ReactNode;
  readonly children: ReactNode;
};

/** One thing that a batch is made of: workbook, photographs, check. */
export function IntakeRow({ glyph, title, action, children }: Props) {
  return (
    <section
      aria-label={title}
      className="grid grid-cols-[auto_minmax(0,1fr)_auto] gap-x-2.5 border-b border-hairline px-gutter py-3"
    >
      <Glyph name={glyph} className="mt-1" />
      <h2 className="text-base font-semibold">{title}</h2>
      <div className="pointer-coarse:-my-2.5">{action}</div>
      <div className="col-span-2 col-start-2 text-table text-muted">{children}</div>
    </section>
  );
}
