import { formatNumber } from '#shared/units/format-quantity.ts';
import { dimensionText } from './dimension-text.ts';
import { findingSentence } from './finding-text.ts';
import type { LayoutInput } from './set-layout.ts';
import type { RelevelSection } from './relevel-section.ts';
import type { StraightenSection } from './straighten-section.ts';

function common({ record, findings, metric }: LayoutInput): string[] {
  const { placedFt3, voidFt3, fillRatio } = record.derived;
  return [
    ...(placedFt3 !== null && voidFt3 !== null && fillRatio !== null
      ? [
          `${dimensionText(placedFt3, 'ft3', metric)} of foam were placed in a void of ${dimensionText(voidFt3, 'ft3', metric)}: a fill ratio of ${formatNumber(fillRatio, { fixed: true })}.`,
        ]
      : []),
    ...findings.map((finding) => findingSentence(finding, metric)),
  ];
}

/** The drawing of a straightened pole in sentences. */
export function describeStraighten(section: StraightenSection, input: LayoutInput): string[] {
  const { metric, record } = input;
  const { before, after, wedge } = section;
  const lean = (amount: number) => dimensionText(amount, 'in-per-10ft', metric);
  return [
    `Section through structure ${record.structureNumber}, a pole that was straightened.`,
    before ? `It leaned ${lean(before.amount)} before.` : 'Its lean before is not given.',
    after ? `It leans ${lean(after.amount)} after.` : 'Its lean after is not given.',
    wedge
      ? `The gap behind it is ${dimensionText(wedge.gapAtGradeIn, 'in', metric)} at grade and is foamed ${dimensionText(wedge.depthFt, 'ft', metric)} deep.`
      : 'The gap behind it is not given, so it is not drawn.',
    'The opposite gap below the pivot is not counted.',
    ...common(input),
  ];
}

/** The drawing of a re-levelled pad in sentences. */
export function describeRelevel(section: RelevelSection, input: LayoutInput): string[] {
  const { metric, record } = input;
  const { lengthIn, widthIn, gapsIn } = section;
  const inches = (value: number) => dimensionText(value, 'in', metric);
  return [
    `Plan and section of structure ${record.structureNumber}, a pad that was re-levelled.`,
    lengthIn !== null && widthIn !== null
      ? `The pad is ${inches(lengthIn)} by ${inches(widthIn)}.`
      : 'The size of the pad is not given.',
    gapsIn
      ? `Seen from above, facing the doors, the gaps are ${inches(gapsIn[0])} front left, ${inches(gapsIn[1])} back left, ${inches(gapsIn[2])} back right and ${inches(gapsIn[3])} front right.`
      : 'Not all four gaps are given.',
    ...common(input),
  ];
}
