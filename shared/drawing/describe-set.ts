import { SECTION_SIDES, type Section } from '#shared/calc/section.ts';
import { numberOf, textOf } from '#shared/calc/values.ts';
import { crossText, dimensionText } from './dimension-text.ts';
import { foamPlacedSentence } from './fact-labels.ts';
import { findingSentence } from './finding-text.ts';
import { missingName } from './missing-name.ts';
import type { SetSection } from './set-section.ts';
import type { SheetFinding, SheetPurpose, SheetRecord } from './sheet-types.ts';

/** The same as the drawing says, in sentences. */
export function describeSet(
  record: SheetRecord,
  {
    section,
    findings,
    purpose,
    metric,
  }: { section: SetSection; findings: readonly SheetFinding[]; purpose: SheetPurpose; metric: boolean },
): string[] {
  const ft = (value: number) => dimensionText(value, 'ft', metric);
  const inches = (value: number) => dimensionText(value, 'in', metric);
  const { derived, values } = record;
  const said: (string | false | null)[] = [
    `Section through structure ${record.structureNumber}, a pole set in ${groundWord(textOf(values, 'ground'))}.`,
    section.rockFromFt !== null && section.rockFromFt > 0 && `Rock begins ${ft(section.rockFromFt)} down.`,
    section.slope > 0 &&
      `Grade rises ${inches(numberOf(values, 'slopeRiseIn') ?? 0)} across the bore; depths are from the low side.`,
    section.bore && boreSentence(section, { ft, inches, metric }),
    section.pole && poleSentence(section.pole, inches),
    section.poleOffsetFt > 0.005 && 'The pole stands off the middle of the bore.',
    section.embedmentFt !== null &&
      `It stands ${ft(section.embedmentFt)} deep${section.dueFt === null ? '' : `; ${ft(section.dueFt)} is due`}.`,
    derived.leastAnnulusIn !== null &&
      `The space between bore and pole is at least ${inches(derived.leastAnnulusIn)}.`,
    foamPlacedSentence(derived, { purpose, metric }),
    section.foam !== null && liftSentence(section.foam, ft),
    section.foam !== null && foamSentence(section.foam, ft),
    waterSentence(section, { derivedIn: derived.waterWithPoleIn, inches }),
    section.bed !== null &&
      `Below the butt lies a bed of ${ft(section.bed.heightFt)} of ${section.bed.material === 'native' ? 'native soil' : 'crushed stone'}.`,
    section.missing.length > 0 && `Not given: ${section.missing.map(missingName).join(', ').toLowerCase()}.`,
    (section.ghosts.bore !== null || section.ghosts.pole !== null) &&
      `${[section.ghosts.bore && 'bore', section.ghosts.pole && 'pole'].filter(Boolean).join(' and ')} drawn dashed, as a sign and not to size.`.replace(
        /^./,
        (letter) => letter.toUpperCase(),
      ),
    ...findings.map((finding) => findingSentence(finding, metric)),
  ];
  return said.filter((sentence): sentence is string => typeof sentence === 'string' && sentence !== '');
}

type Words = { ft: (value: number) => string; inches: (value: number) => string; metric: boolean };

function boreSentence({ bore }: SetSection, { ft, inches, metric }: Words): string {
  const shaft = bore?.parts[0];
  const bell = bore?.parts[1];
  if (!bore || !shaft) return '';
  const across = (axes: { a: number; b: number }) => crossText([axes.a, axes.b], metric);
  return `The bore is ${ft(bore.depthFt)} deep, ${across(shaft.top)} wide at the top and ${across(shaft.bottom)} at the bottom${bell ? `, belled to ${inches(bell.bottom.a)}` : ''}.`;
}

function poleSentence(pole: NonNullable<SetSection['pole']>, inches: Words['inches']): string {
  const size = `${inches(pole.groundLineIn)} thick at the ground line and ${inches(pole.buttIn)} at the butt`;
  return `The ${shape(pole.section)}pole is ${size}${pole.openWallIn === null ? '' : ', its butt open'}.`;
}

function shape(section: Section): string {
  return SECTION_SIDES[section] === null ? '' : `${section} `;
}

function liftSentence(foam: NonNullable<SetSection['foam']>, ft: Words['ft']): string | false {
  if (foam.liftsFt.length === 0) return false;
  return `It came in ${foam.liftsFt.length + 1} lifts, which meet ${foam.liftsFt.map(ft).join(' and ')} below grade.`;
}

function foamSentence(foam: NonNullable<SetSection['foam']>, ft: Words['ft']): string {
  if (foam.recordedTopFt !== null)
    return `The placed volume ends ${ft(foam.topFt)} below grade, lower than the recorded top.`;
  if (foam.crownFt > 0) return 'The foam ends in a crown above grade.';
  return foam.topFt > 0.01 ? `The foam ends ${ft(foam.topFt)} below grade.` : 'The foam ends at grade.';
}

function waterSentence(
  { openWaterFt }: SetSection,
  { derivedIn, inches }: { derivedIn: number | null; inches: Words['inches'] },
): string | false {
  if (derivedIn === null) return false;
  if (derivedIn <= 0) return 'No water stood in the bore.';
  const open = openWaterFt === null ? '' : `, ${inches(openWaterFt * 12)} in the open bore`;
  return `Water stands ${inches(derivedIn)} deep with the pole in${open}.`;
}

function groundWord(ground: string | null): string {
  if (ground === 'rock') return 'rock';
  if (ground === 'soil-over-rock') return 'soil over rock';
  return ground === 'soil' ? 'soil' : 'ground that is not named';
}
