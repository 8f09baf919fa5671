import type { ReactNode } from 'react';
import { classNames } from '#src/lib/class-names.ts';
import { Glyph, type GlyphName } from '#src/components/ui/glyph.tsx';

type Props = {
  readonly glyph: GlyphName;
  readonly title: string;
  readonly action?: ReactNode;
  /** Nothing to do here: left out on a phone. */
  readonly settled?: boolean;
  readonly children: ReactNode;
};

/** One thing that a batch is made of: workbook, photographs, check. */
export function IntakeRow({ glyph, title, action, settled, children }: Props) {
  return (
    <section
      aria-label={title}
      className={classNames(
        'grid grid-cols-[auto_minmax(0,1fr)_auto] gap-x-2.5 border-b border-hairline px-gutter py-3',
        settled && 'max-lg:hidden',
      )}
    >
      <Glyph name={glyph} className="mt-1" />
      <h2 className="text-base font-semibold">{title}</h2>
      <div className="pointer-coarse:-my-2.5">{action}</div>
      <div className="col-span-2 col-start-2 text-table text-muted">{children}</div>
    </section>
  );
}
