import { useId, useMemo, useRef } from 'react';
import { WHO_DECIDES } from '#src/components/ui/caution.tsx';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { useWidth } from '#src/lib/use-width.ts';
import { MaterialPatterns, materialsOf } from './materials.tsx';
import { sheetContent } from './sheet-content.tsx';
import { SheetEventsContext } from './sheet-events.ts';
import { SheetStamp, type SheetStampData } from './sheet-stamp.tsx';
import { NARROW, WIDE } from './sheet-spec.ts';
import type { SheetFinding, SheetLimits, SheetRecord, TitleBlockData } from './sheet-types.ts';
import { TitleBlock, titleBlockHeight } from './title-block.tsx';

type Props = {
  readonly record: SheetRecord;
  readonly findings: readonly SheetFinding[];
  readonly titleBlock: TitleBlockData;
  readonly limits?: SheetLimits;
  readonly stamp?: SheetStampData | null;
  /** The finding that list and drawing both mark. */
  readonly activeFinding?: string | null;
  /** Hover or focus of a balloon. Without it the sheet only shows. */
  readonly onActive?: (findingId: string | null) => void;
  /** Click or Enter on a balloon: go to its row. */
  readonly onPick?: (findingId: string) => void;
  /** The line below the frame; off where the page says it already. */
  readonly caution?: boolean;
};

const NO_LIMITS: SheetLimits = {};
const NARROW_BELOW = 560;

/** One structure as a drawing sheet, to scale from its own numbers, with a text alternative that says the same. */
export function RecordSheet(props: Props) {
  const {
    record,
    findings,
    titleBlock,
    limits = NO_LIMITS,
    stamp,
    activeFinding = null,
    onActive,
    onPick,
  } = props;
  const figure = useRef<HTMLElement>(null);
  const width = useWidth(figure);
  const spec = width > 0 && width < NARROW_BELOW ? NARROW : WIDE;
  const metric = useUnitSystem() === 'metric';
  const id = useId();
  const materials = materialsOf(id);
  const titleTop = spec.title.bottom - titleBlockHeight(titleBlock, spec.title.width);
  const { drawing, sentences } = useMemo(
    () => sheetContent({ record, findings, limits, spec, metric, titleTop, materials: materialsOf(id) }),
    [record, findings, limits, spec, metric, titleTop, id],
  );
  const events = useMemo(
    () => ({ active: activeFinding, onActive, onPick }),
    [activeFinding, onActive, onPick],
  );
  return (
    <figure ref={figure} className="min-w-0 print:break-inside-avoid">
      <div className="border border-hairline bg-sheet p-1 print:border-none">
        <svg
          viewBox={`0 0 ${spec.width} ${spec.height}`}
          role="group"
          aria-label={`Drawing of structure ${record.structureNumber}`}
          aria-describedby={`${id}-words`}
          className="block h-auto max-h-[calc(100dvh-8rem)] w-full border-[1.5px] border-ink font-sans max-sm:max-h-none print:max-h-[24cm]"
        >
          <MaterialPatterns names={materials} />
          <SheetEventsContext value={events}>{drawing}</SheetEventsContext>
          <TitleBlock data={titleBlock} {...spec.title} />
          {stamp ? <SheetStamp stamp={stamp} {...spec.stamp} /> : null}
        </svg>
      </div>
      <figcaption id={`${id}-words`} className="sr-only">
        {sentences.join(' ')}
      </figcaption>
      {props.caution === false ? null : <p className="mt-1.5 text-small text-query">{WHO_DECIDES}</p>}
    </figure>
  );
}
