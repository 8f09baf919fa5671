import { numberOf } from '#shared/calc/values.ts';
import { formatNumber, formatQuantity } from '#shared/units/format-quantity.ts';
import { anchorOf, type AnchorName } from './anchors.ts';
import { dimensionText } from './dimension-text.ts';
import { foamTitle } from './fact-labels.ts';
import { findingLabels, missingLabels } from './finding-labels.ts';
import type { ColumnLabel } from './label-column.ts';
import type { SetSection } from './set-section.ts';
import type { SheetFinding, SheetLimits, SheetPurpose, SheetRecord } from './sheet-types.ts';

/** What a label says, before it has a place. */
export type LabelContent = ColumnLabel & { readonly anchor: AnchorName | null };

type Input = {
  readonly record: SheetRecord;
  readonly section: SetSection;
  readonly findings: readonly SheetFinding[];
  readonly limits: SheetLimits;
  readonly metric: boolean;
  readonly purpose: SheetPurpose;
};

/** What a dashed outline stands for. */
const DASHED = new Set(['boreTopIn', 'boreDepthFt', 'embedmentFt', 'girthGroundLineIn']);

/** Findings first, each at what it concerns; then the measured facts that no finding speaks of; then what is missing. */
export function setLabels(input: Input): LabelContent[] {
  const found = findingLabels(input.findings, input.metric).map((label): LabelContent => ({
    ...label,
    anchor: label.finding && anchorOf(label.finding.field, label.finding.code),
  }));
  const spoken = new Set(found.map((label) => label.anchor));
  const facts = factLabels(input).filter((fact) => !spoken.has(fact.anchor));
  const missing = missingLabels(input.section.missing, {
    findings: input.findings,
    values: input.record.values,
    dashed: (field) => DASHED.has(field),
  }).map((label): LabelContent => ({
    ...label,
    anchor: anchorOf(label.id.replace('missing ', ''), ''),
  }));
  return [...found, ...missing, ...facts];
}

function factLabels({ record, section, limits, metric, purpose }: Input): LabelContent[] {
  const { derived, values } = record;
  const facts: LabelContent[] = [];
  const add = (anchor: AnchorName, title: string, detail: string) =>
    facts.push({ id: anchor, anchor, title, detail, tone: 'ink', finding: null, optional: true });
  const text = (value: number, unit: 'ft' | 'in' | 'ft3') => dimensionText(value, unit, metric);

  if (derived.placedFt3 !== null) {
    const lifts = section.foam && section.foam.liftsFt.length > 0 ? section.foam.liftsFt.length + 1 : 1;
    add(
      'foam',
      `${foamTitle(derived.placedFt3, purpose, metric)}${lifts > 1 ? ` in ${lifts} lifts` : ''}`,
      fillDetail(record, limits, metric),
    );
  } else if (purpose === 'plan' && derived.voidFt3 !== null) {
    add('foam', `Void ${text(derived.voidFt3, 'ft3')}`, 'to be foamed');
  }
  if (derived.leastAnnulusIn !== null) {
    add(
      'annulus',
      `Annulus ${text(derived.leastAnnulusIn, 'in')} at least`,
      annulusDetail(derived.leastAnnulusIn, limits, metric),
    );
  }
  if (derived.waterWithPoleIn !== null && derived.waterWithPoleIn > 0) {
    const open = values['waterMeasured'] === 'with-pole' ? null : numberOf(values, 'waterIn');
    const parts = [
      open === null
        ? null
        : `${text(open, 'in')} in the open bore${section.openWaterFt === null ? '' : ' (dashed)'}`,
      limits.waterMostIn === undefined ? null : limitText(limits.waterMostIn, metric),
    ];
    add(
      'water',
      `Water ${text(derived.waterWithPoleIn, 'in')} with the pole in`,
      parts.filter(Boolean).join('; '),
    );
  }
  if (section.foam?.recordedTopFt !== null && section.foam) {
    add(
      'foam-top',
      'Placed volume ends here',
      `${text(section.foam.topFt, 'ft')} below grade; the top was recorded higher`,
    );
  }
  if (section.rockFromFt !== null && section.rockFromFt > 0) {
    add('rock', `Rock from ${text(section.rockFromFt, 'ft')}`, 'soil above it');
  }
  if (section.bed) {
    add(
      'bed',
      `Bed ${text(section.bed.heightFt, 'ft')}`,
      section.bed.material === 'native' ? 'native soil' : 'crushed stone',
    );
  }
  return facts;
}

function fillDetail({ derived }: SheetRecord, limits: SheetLimits, metric: boolean): string {
  if (derived.fillRatio === null || derived.voidFt3 === null) return 'the void cannot be computed';
  const ratio = formatNumber(derived.fillRatio, { digits: 2, fixed: true });
  const plusMinus =
    derived.fillRatioU === null ? '' : ` ± ${formatNumber(derived.fillRatioU, { digits: 2, fixed: true })}`;
  const limit =
    limits.fillLeast === undefined
      ? ''
      : `, limit\u00a0${formatNumber(limits.fillLeast, { digits: 2, fixed: true })}`;
  return `fill ratio ${ratio}${plusMinus} of void ${dimensionText(derived.voidFt3, 'ft3', metric)}${limit}`;
}

function annulusDetail(leastIn: number, { annulusLeastIn }: SheetLimits, metric: boolean): string {
  if (annulusLeastIn === undefined) return 'between bore and pole';
  const text = (value: number) => dimensionText(value, 'in', metric);
  return `${limitText(annulusLeastIn, metric)}, margin\u00a0${text(leastIn - annulusLeastIn)}`;
}

function limitText(inches: number, metric: boolean): string {
  return `limit ${formatQuantity(inches, 'in', { metric })}`.replaceAll(' ', '\u00a0');
}
