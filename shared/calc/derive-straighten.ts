import type { DeriveInput } from './derive-set.ts';
import { dueColumns } from './due-depth.ts';
import { fillOf } from './fill.ts';
import type { ReadingGroup } from './fill-uncertainty.ts';
import { GROUND_LINE_FIELDS } from './pole-sizes.ts';
import { wedgeOf, wedgeVoid, type Wedge } from './straighten-void.ts';
import { numberOf, positiveOf } from './values.ts';
import type { Derived, FieldValues } from '#shared/records/types.ts';
import type { Standard } from '#shared/standard/types.ts';

/** Gaps move together, if measured: a blank gap is exact. Width by the pole's uncertainty, foamed depth by that of depths. */
function readings(values: FieldValues, wedge: Wedge, { uncertainty }: Standard): ReadingGroup[] {
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
      u: uncertainty.gapIn,
      shifted: (by) => shiftBy({ grade: by, depth: by * atDepth }),
      readings: [
        { field: 'gapAtGradeIn', shifted: (by) => shiftBy({ grade: by }) },
        { field: 'gapAtDepthIn', shifted: (by) => shiftBy({ depth: by * atDepth }) },
      ],
    },
    {
      u: wedge.widthFrom === 'table' ? uncertainty.poleTableIn : uncertainty.poleTapedIn,
      shifted: byWidth,
      readings: [{ field: width, shifted: byWidth }],
    },
    {
      u: uncertainty.depthIn,
      shifted: byHeight,
      readings: [{ field: 'gapDepthFt', shifted: byHeight }],
    },
  ];
}

/** Derived figures of a *straighten* record; water is always measured with the pole in. Total: a figure whose values are missing is null. */
export function deriveStraighten(input: DeriveInput): Derived {
  const { values, pours, standard, product } = input;
  const lengthFt = positiveOf(values, 'poleLengthFt');
  const usualFt = lengthFt === null ? null : dueColumns(standard.dueDepth, lengthFt).soilFt;
  const wedge = wedgeOf(values, usualFt);
  const voidFt3 = wedge === null ? null : wedgeVoid(wedge);
  const groups = wedge === null ? [] : readings(values, wedge, standard);
  return {
    ...fillOf({ voidFt3, groups, pours, product, standard }),
    dueFt: null,
    waterWithPoleIn: numberOf(values, 'waterIn'),
    leastAnnulusIn: null,
    poleTaped: wedge === null ? null : wedge.widthFrom !== 'table',
  };
}
