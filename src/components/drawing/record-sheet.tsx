import { useId, useMemo, useRef } from 'react';
import { drawSheet } from '#shared/drawing/draw-sheet.ts';
import type {
  SheetFinding,
  SheetLimits,
  SheetPurpose,
  SheetRecord,
  SheetStampData,
  TitleBlockData,
} from '#shared/drawing/sheet-types.ts';
import { WHO_DECIDES } from '#shared/drawing/who-decides.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { useWidth } from '#src/lib/use-width.ts';
import { MaterialPatterns } from './material-patterns.tsx';
import { SheetEventsContext } from './sheet-events.ts';
import { SheetMarks } from './sheet-marks.tsx';

type Props = {
  /** Values may be partial: what is lacking is drawn as lacking. */
  readonly record: SheetRecord;
  readonly findings?: readonly SheetFinding[];
  /** Without one there is no corner block, as in a plan that is not a record yet. */
  readonly titleBlock?: TitleBlockData | null;
  readonly limits?: SheetLimits;
  readonly stamp?: SheetStampData | null;
  /** `plan`: what only a crew can measure is not missed. */
  readonly purpose?: SheetPurpose;
  /** The finding that list and drawing both mark. */
  readonly activeFinding?: string | null;
  /** Hover or focus of a balloon. Without it the sheet only shows. */
  readonly onActive?: (findingId: string | null) => void;
  /** Click or Enter on a balloon: go to its row. */
  readonly onPick?: (findingId: string) => void;
  /** The line below the frame; off where the page says it already. */
  readonly caution?: boolean;
};

const NONE: readonly SheetFinding[] = [];
const NARROW_BELOW = 560;

/** One structure as a drawing sheet, to scale from its own numbers, with a text alternative that says the same. */
export function RecordSheet(props: Props) {
  const { record, findings = NONE, titleBlock, limits, stamp, purpose } = props;
  const { activeFinding = null, onActive, onPick } = props;
  const figure = useRef<HTMLElement>(null);
  const width = useWidth(figure);
  const narrow = width > 0 && width < NARROW_BELOW;
  const metric = useUnitSystem() === 'metric';
  const id = useId();
  const drawing = useMemo(
    () => drawSheet({ record, findings, limits, titleBlock, stamp, purpose, narrow, metric }),
    [record, findings, limits, titleBlock, stamp, purpose, narrow, metric],
  );
  const events = useMemo(
    () => ({ active: activeFinding, onActive, onPick }),
    [activeFinding, onActive, onPick],
  );
  return (
    <figure ref={figure} className="min-w-0 print:break-inside-avoid">
      <div className="border border-hairline bg-sheet p-1 print:border-none">
        <svg
          viewBox={`0 0 ${drawing.width} ${drawing.height}`}
          role="group"
          aria-label={`Drawing of structure ${record.structureNumber}`}
          aria-describedby={`${id}-words`}
          className="block h-auto max-h-[calc(100dvh-8rem)] w-full border-[1.5px] border-ink font-sans max-sm:max-h-none print:max-h-[24cm]"
        >
          <MaterialPatterns sheet={id} />
          <SheetEventsContext value={events}>
            <SheetMarks marks={drawing.marks} sheet={id} />
          </SheetEventsContext>
        </svg>
      </div>
      {drawing.leftOut.length > 0 ? (
        <p className="mt-1.5 text-small text-muted">
          No room on the drawing for{' '}
          {drawing.leftOut.map(({ number, title }) => `${number}, ${title}`).join('; ')}: see the list of
          findings.
        </p>
      ) : null}
      <figcaption id={`${id}-words`} className="sr-only">
        {drawing.sentences.join(' ')}
      </figcaption>
      {props.caution === false ? null : <p className="mt-1.5 text-small text-query">{WHO_DECIDES}</p>}
    </figure>
  );
}
