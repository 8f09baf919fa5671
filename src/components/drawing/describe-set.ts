import { textOf } from '#shared/calc/values.ts';
import { formatNumber } from '#shared/units/format-quantity.ts';
import { dimensionText } from './dimension-text.ts';
import { findingSentence } from './finding-text.ts';
import { missingName } from './missing-name.ts';
import type { SetSection } from './set-section.ts';
import type { SheetFinding, SheetRecord } from './sheet-types.ts';

/** The same as the drawing says, in sentences. */
export function describeSet(
  record: SheetRecord,
  { section, findings, metric }: { section: SetSection; findings: readonly SheetFinding[]; metric: boolean },
): string[] {
  const ft = (value: number) => dimensionText(value, 'ft', metric);
  const inches = (value: number) => dimensionText(value, 'in', metric);
  const { derived, values } = record;
  const said: (string | false | null)[] = [
    `Section through structure ${record.structureNumber}, a pole set in ${groundWord(textOf(values, 'ground'))}.`,
    section.bore && boreSentence(section, { ft, inches }),
    section.pole &&
      `The pole is ${inches(section.pole.groundLineIn)} thick at the ground line and ${inches(section.pole.buttIn)} at the butt.`,
    section.embedmentFt !== null &&
      `It stands ${ft(section.embedmentFt)} deep${section.dueFt === null ? '' : `; ${ft(section.dueFt)} is due`}.`,
    derived.leastAnnulusIn !== null &&
      `The space between bore and pole is at least ${inches(derived.leastAnnulusIn)}.`,
    derived.placedFt3 !== null &&
      derived.voidFt3 !== null &&
      derived.fillRatio !== null &&
      `${dimensionText(derived.placedFt3, 'ft3', metric)} of foam were placed in a void of ${dimensionText(derived.voidFt3, 'ft3', metric)}: a fill ratio of ${formatNumber(derived.fillRatio, { digits: 2, fixed: true })}.`,
    section.foam !== null && foamSentence(section.foam, ft),
    derived.waterWithPoleIn !== null &&
      (derived.waterWithPoleIn > 0
        ? `Water stands ${inches(derived.waterWithPoleIn)} deep with the pole in.`
        : 'No water stood in the bore.'),
    section.bed !== null && `Below the butt lies a bed of ${ft(section.bed.heightFt)}.`,
    section.missing.length > 0 &&
      `Not given, so not drawn: ${section.missing.map(missingName).join(' ').toLowerCase()}.`,
    ...findings.map((finding) => findingSentence(finding, metric)),
  ];
  return said.filter((sentence): sentence is string => typeof sentence === 'string' && sentence !== '');
}

type Words = { ft: (value: number) => string; inches: (value: number) => string };

function boreSentence({ bore }: SetSection, { ft, inches }: Words): string {
  const shaft = bore?.parts[0];
  const bell = bore?.parts[1];
  if (!bore || !shaft) return '';
  return `The bore is ${ft(bore.depthFt)} deep, ${inches(shaft.top.a)} wide at the top and ${inches(shaft.bottom.a)} at the bottom${bell ? `, belled to ${inches(bell.bottom.a)}` : ''}.`;
}

function foamSentence(foam: NonNullable<SetSection['foam']>, ft: Words['ft']): string {
  if (foam.recordedTopFt !== null)
    return `The placed volume ends ${ft(foam.topFt)} below grade, lower than the recorded top.`;
  if (foam.crownFt > 0) return 'The foam ends in a crown above grade.';
  return foam.topFt > 0.01 ? `The foam ends ${ft(foam.topFt)} below grade.` : 'The foam ends at grade.';
}

function groundWord(ground: string | null): string {
  if (ground === 'rock') return 'rock';
  if (ground === 'soil-over-rock') return 'soil over rock';
  return ground === 'soil' ? 'soil' : 'ground that is not named';
}
