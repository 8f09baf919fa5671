import { formatQuantity } from '#shared/units/format-quantity.ts';
import { aboutReading } from './anchors.ts';
import { dimensionText } from './dimension-text.ts';
import { factLabel, foamFact } from './fact-labels.ts';
import { findingLabels, missingLabels } from './finding-labels.ts';
import { placeColumn, type ColumnLabel, type PlacedText } from './label-column.ts';
import type { LayoutInput } from './layout-input.ts';
import { CORNER, cornerBaseline, cornerText } from './pad-corners.ts';
import { relevelPlaces, PAD, type RelevelPlaces } from './relevel-places.ts';
import { relevelSection, type RelevelSection } from './relevel-section.ts';
import { FONT } from './sheet-spec.ts';
import type { Point, SheetFinding } from './sheet-types.ts';
import { textWidth } from './text-width.ts';

/** A finding on the gap of a corner, in its circle beside the figure. */
export type CornerBalloon = { readonly corner: 1 | 2; readonly finding: SheetFinding };

export type RelevelLayout = {
  readonly section: RelevelSection;
  readonly places: RelevelPlaces;
  readonly labels: readonly PlacedText[];
  readonly leftOut: readonly ColumnLabel[];
  readonly balloons: readonly CornerBalloon[];
};

const DASHED = new Set(['padLengthIn', 'padWidthIn']);

/** Everything on the sheet of a *re-level* record, placed. */
export function relevelLayout(input: LayoutInput): RelevelLayout {
  const { record, spec, metric, findings, foot } = input;
  const section = relevelSection(record.values);
  const places = relevelPlaces(section, spec);
  const balloons = spec.compact ? [] : cornerBalloons(findings);
  const beside = new Set(balloons.map((one) => one.finding));
  const labels = [
    ...findingLabels(
      findings.filter((finding) => !beside.has(finding)),
      metric,
    ),
    ...missingLabels(section.missing, {
      findings,
      values: record.values,
      dashed: (field) => DASHED.has(field),
    }),
    ...facts(section, input),
  ];
  const column = placeColumn(labels, {
    spec,
    bottom: foot.labelsBottom,
    // The section stands low on the sheet: what is nowhere on it leaves the place beside it free.
    loose: 'first',
    pointOf: (label) => pointOf(label, { section, places, metric }),
  });
  return { section, places, ...column, balloons };
}

function facts(
  section: RelevelSection,
  { record, spec, limits, purpose, metric, findings }: LayoutInput,
): ColumnLabel[] {
  const { derived } = record;
  const spoken = new Set(findings.map((finding) => finding.code));
  const out: ColumnLabel[] = [];
  const add = (...label: Parameters<typeof factLabel>) => out.push(factLabel(...label));
  if (!spoken.has('fill-short')) out.push(...foamFact(derived, { purpose, metric }));
  if (spec.compact && section.lengthIn !== null && section.widthIn !== null)
    add(
      'pad',
      `Pad ${dimensionText(section.lengthIn, 'in', metric)} × ${dimensionText(section.widthIn, 'in', metric)}`,
      'front to back × left to right',
    );
  if (section.opening) {
    const { lengthIn, widthIn } = section.opening;
    add(
      'opening',
      `Opening ${dimensionText(lengthIn, 'in', metric)} × ${dimensionText(widthIn, 'in', metric)}`,
      'not filled; drawn in the middle',
    );
  }
  if (section.planeIn !== null && !spoken.has('gap-plane')) {
    add(
      'plane',
      `Plane test ${dimensionText(section.planeIn, 'in', metric)}`,
      'how far the four gaps are from a flat pad',
    );
  }
  const { beforeAcross, beforeAlong, afterAcross, afterAlong } = section.slopes;
  const slope = (value: number) => dimensionText(value, 'in-per-ft', metric);
  if (beforeAcross !== null)
    add(
      'before',
      `Before ${slope(beforeAcross)} across`,
      beforeAlong === null ? 'dashed' : `dashed; ${slope(beforeAlong)} along`,
    );
  if (afterAcross !== null && !spoken.has('pad-slope')) {
    const limit = limits.slopeMostInPerFt;
    const parts = [
      afterAlong === null ? null : `${slope(afterAlong)} along`,
      limit === undefined ? null : `limit ${formatQuantity(limit, 'in-per-ft', { metric })}`,
    ];
    add('after', `After ${slope(afterAcross)} across`, parts.filter(Boolean).join('; '));
  }
  return out;
}

/** At the left there is room beside the figure; a leader would run across the whole plan. */
function cornerBalloons(findings: readonly SheetFinding[]): CornerBalloon[] {
  return ([1, 2] as const).flatMap((corner) => {
    const finding = findings.find((one) => one.field === `gap${corner}In` && aboutReading(one.code));
    return finding ? [{ corner, finding }] : [];
  });
}

function pointOf(
  label: ColumnLabel,
  { section, places, metric }: { section: RelevelSection; places: RelevelPlaces; metric: boolean },
): Point | null {
  const code = label.finding?.code ?? '';
  const field = /^(fill|lot|pour|kit)-/.test(code)
    ? 'foam'
    : label.finding
      ? label.finding.field
      : label.id.replace('missing ', '');
  if (field === null || label.finding?.code.startsWith('photo-')) return null;
  const { right, left, backY, frontY, padRightY, deepRightY } = places;
  if (field === 'foam' || /^(lot|kit|quantity|product|pour|component|wasted)/.test(field)) {
    return { x: right - (right - left) * 0.12, y: backY + (frontY - backY) * 0.3 };
  }
  if (field === 'opening' || field.startsWith('opening'))
    return { x: (left + right) / 2, y: frontY - (frontY - backY) * 0.42 };
  const corner = /^gap([1-4])In$/.exec(field)?.[1];
  if (corner !== undefined) {
    const atLeft = corner === '1' || corner === '2';
    const y = corner === '1' || corner === '4' ? frontY : backY;
    if (atLeft || places.compact) return { x: atLeft ? left : right, y };
    // From behind the figure, so that the leader does not run through it.
    const text = cornerText(Number(corner), { gapIn: section.cornersIn[Number(corner) - 1] ?? null, metric });
    return { x: right + CORNER + textWidth(text, FONT, true) + 6, y: cornerBaseline(y, places) - 4 };
  }
  if (/^(gap|plane)/.test(field)) return { x: right - 6, y: (padRightY + deepRightY) / 2 };
  if (field === 'before' || field.startsWith('slopeBefore'))
    return { x: right - 14, y: padRightY - PAD / 2 - 5 };
  if (field === 'after' || /^(slope|raised|lowered|released)/.test(field))
    return { x: right, y: padRightY - PAD / 2 };
  return field.startsWith('pad') ? { x: right, y: frontY - 20 } : null;
}
