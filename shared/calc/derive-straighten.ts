import type { DeriveInput, ReadInput, SpaceRead } from './derive-set.ts';
import { dueColumns } from './due-depth.ts';
import { fillOf } from './fill.ts';
import type { SourcedGroup } from './fill-uncertainty.ts';
import { GROUND_LINE_FIELDS } from './pole-sizes.ts';
import { wedgeOf, wedgeVoid, type Wedge } from './straighten-void.ts';
import { numberOf, positiveOf } from './values.ts';
import type { Derived, FieldValues } from '#shared/records/types.ts';
import type { Standard } from '#shared/standard/types.ts';

/** Gaps move together, if measured: a blank gap is exact. Width by the pole's uncertainty, foamed depth by that of depths. */
function readings(values: FieldValues, wedge: Wedge, { uncertainty }: Standard): SourcedGroup[] {
  const shiftBy = (change: Partial<Record<'grade' | 'depth' | 'width' | 'height', number>>) =>
    wedgeVoid({
      gapAtGradeIn: wedge.gapAtGradeIn + (change.grade ?? 0),
      gapAtDepthIn: wedge.gapAtDepthIn + (change.depth ?? 0),
      widthIn: wedge.widthIn + (change.width ?? 0),
      depthFt: wedge.depthFt + (change.height ?? 0) / 12,
    });
  const atDepth = numberOf(values, 'gapAtDepthIn') === null ? 0 : 1;
  const girth = positiveOf(values, GROUND_LINE_FIELDS[0]) !== null || wedge.widthFrom === 'table';
  const width = wedge.widthFrom === 'gapWidthIn' ? 'gapWidthIn' : GROUND_LINE_FIELDS[girth ? 0 : 1];
  const byWidth = (by: number) => shiftBy({ width: by });
  const byHeight = (by: number) => shiftBy({ height: by });
  return [
    {
      source: 'gap',
      u: uncertainty.gapIn,
      shifted: (by) => shiftBy({ grade: by, depth: by * atDepth }),
      readings: [
        { field: 'gapAtGradeIn', shifted: (by) => shiftBy({ grade: by }) },
        { field: 'gapAtDepthIn', shifted: (by) => shiftBy({ depth: by * atDepth }) },
      ],
    },
    {
      source: 'width',
      u: wedge.widthFrom === 'table' ? uncertainty.poleTableIn : uncertainty.poleTapedIn,
      shifted: byWidth,
      readings: [{ field: width, shifted: byWidth }],
    },
    {
      source: 'depth',
      u: uncertainty.depthIn,
      shifted: byHeight,
      readings: [{ field: 'gapDepthFt', shifted: byHeight }],
    },
  ];
}

function wedgeFor({ values, standard }: ReadInput): Wedge | null {
  const lengthFt = positiveOf(values, 'poleLengthFt');
  const usualFt = lengthFt === null ? null : dueColumns(standard.dueDepth, lengthFt).soilFt;
  return wedgeOf(values, usualFt);
}

/** The void of a *straighten* record with the readings that it hangs on. */
export function straightenSpaceRead(input: ReadInput): SpaceRead {
  const wedge = wedgeFor(input);
  if (wedge === null) return { voidFt3: null, groups: [] };
  return { voidFt3: wedgeVoid(wedge), groups: readings(input.values, wedge, input.standard) };
}

/** Derived figures of a *straighten* record; water is always measured with the pole in. Total: a figure whose values are missing is null. */
export function deriveStraighten(input: DeriveInput): Derived {
  const { values, pours, standard, product } = input;
  const wedge = wedgeFor(input);
  return {
    ...fillOf({ ...straightenSpaceRead(input), pours, product, standard }),
    dueFt: null,
    waterWithPoleIn: numberOf(values, 'waterIn'),
    leastAnnulusIn: null,
    poleTaped: wedge === null ? null : wedge.widthFrom !== 'table',
  };
}
