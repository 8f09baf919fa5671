import { formatQuantity } from '#shared/units/format-quantity.ts';
import { dimensionText } from './dimension-text.ts';
import { foamPlacedSentence } from './fact-labels.ts';
import { findingSentence } from './finding-text.ts';
import type { LayoutInput } from './layout-input.ts';
import { missingName } from './missing-name.ts';
import type { RelevelSection } from './relevel-section.ts';
import type { Lean, StraightenSection } from './straighten-section.ts';

type Said = readonly (string | false | null)[];

function said(sentences: Said): string[] {
  return sentences.filter((one): one is string => typeof one === 'string');
}

function common({ record, findings, purpose, metric }: LayoutInput, missing: readonly string[]): Said {
  return [
    foamPlacedSentence(record.derived, { purpose, metric }),
    missing.length > 0 && `Not given: ${missing.map(missingName).join(', ').toLowerCase()}.`,
    ...findings.map((finding) => findingSentence(finding, metric)),
  ];
}

/** The drawing of a straightened pole in sentences. */
export function describeStraighten(section: StraightenSection, input: LayoutInput): string[] {
  const { metric, record } = input;
  const { before, after, wedge, rake, springback, embedmentFt, waterIn } = section;
  const inches = (value: number) => dimensionText(value, 'in', metric);
  const lean = ({ amount, azimuthDeg }: Lean) =>
    `${dimensionText(amount, 'in-per-10ft', metric)}${azimuthDeg === null ? '' : ` towards ${formatQuantity(azimuthDeg, 'deg', { digits: 0 })}`}`;
  return said([
    `Section through structure ${record.structureNumber}, a pole that was straightened.`,
    embedmentFt !== null && `It stands ${dimensionText(embedmentFt, 'ft', metric)} deep.`,
    before ? `It leaned ${lean(before)} before.` : 'Its lean before is not given.',
    after ? `It leans ${lean(after)} after.` : 'Its lean after is not given.',
    rake && `Its design rake is ${lean(rake)}.`,
    springback !== null &&
      `It sprang back ${dimensionText(springback, 'in-per-10ft', metric)} when it was let go.`,
    wedge
      ? `The gap behind it is ${inches(wedge.gapAtGradeIn)} at grade${wedge.gapAtDepthIn > 0 ? ` and ${inches(wedge.gapAtDepthIn)} at its foot` : ''}, ${inches(wedge.widthIn)} wide, and is foamed ${dimensionText(wedge.depthFt, 'ft', metric)} deep.`
      : 'The gap behind it is not given, so it is drawn dashed as a sign.',
    'The opposite gap below the pivot is not counted.',
    waterIn !== null && `Water stands ${inches(waterIn)} deep with the pole in.`,
    ...common(input, section.missing),
  ]);
}

/** The drawing of a re-levelled pad in sentences. */
export function describeRelevel(section: RelevelSection, input: LayoutInput): string[] {
  const { metric, record } = input;
  const { lengthIn, widthIn, gapsIn, opening, planeIn, slopes } = section;
  const inches = (value: number) => dimensionText(value, 'in', metric);
  const slope = (value: number) => dimensionText(value, 'in-per-ft', metric);
  return said([
    `Plan and section of structure ${record.structureNumber}, a pad that was re-levelled.`,
    lengthIn !== null && widthIn !== null
      ? `The pad is ${inches(lengthIn)} from front to back and ${inches(widthIn)} from left to right.`
      : 'The size of the pad is not given, so it is drawn dashed as a sign.',
    opening && `Its opening is ${inches(opening.lengthIn)} by ${inches(opening.widthIn)} and is not filled.`,
    gapsIn
      ? `Seen from above, facing the doors, the gaps are ${inches(gapsIn[0])} front left, ${inches(gapsIn[1])} back left, ${inches(gapsIn[2])} back right and ${inches(gapsIn[3])} front right.`
      : 'Not all four gaps are given.',
    planeIn !== null && `The four gaps are ${inches(planeIn)} from those of a flat pad.`,
    slopes.beforeAcross !== null &&
      slopes.beforeAlong !== null &&
      `It sloped ${slope(slopes.beforeAcross)} across and ${slope(slopes.beforeAlong)} along before.`,
    slopes.afterAcross !== null &&
      slopes.afterAlong !== null &&
      `It slopes ${slope(slopes.afterAcross)} across and ${slope(slopes.afterAlong)} along after.`,
    ...common(input, section.missing),
  ]);
}
