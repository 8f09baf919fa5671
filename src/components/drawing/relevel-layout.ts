import { formatNumber, formatQuantity } from '#shared/units/format-quantity.ts';
import { dimensionText } from './dimension-text.ts';
import { findingLabels, missingLabels } from './finding-labels.ts';
import { placeColumn, type ColumnLabel, type PlacedText } from './label-column.ts';
import { relevelSection, type RelevelSection } from './relevel-section.ts';
import type { LayoutInput } from './set-layout.ts';
import type { Point } from './sheet-types.ts';

export type RelevelPlaces = {
  /** Units per inch. */
  readonly scale: number;
  readonly left: number;
  readonly right: number;
  /** Plan: back edge above, doors below. */
  readonly backY: number;
  readonly frontY: number;
  /** Section: underside of the pad. */
  readonly padY: number;
};

export type RelevelLayout = {
  readonly section: RelevelSection;
  readonly places: RelevelPlaces;
  readonly labels: readonly PlacedText[];
};

export function relevelLayout(input: LayoutInput): RelevelLayout {
  const { record, spec, metric, findings, titleTop } = input;
  const section = relevelSection(record.values);
  const places = placesOf(section, input);
  const labels = [
    ...findingLabels(findings, metric),
    ...missingLabels(section.missing, findings),
    ...facts(section, input),
  ];
  const column = placeColumn(labels, {
    spec,
    bottom: Math.min(spec.labels.bottom, titleTop - 16),
    pointOf: (label) => pointOf(label, section, places),
  });
  return { section, places, labels: column.labels };
}

function placesOf({ lengthIn, widthIn }: RelevelSection, { spec }: LayoutInput): RelevelPlaces {
  const room = spec.compact ? 116 : 236;
  const scale = room / Math.max(lengthIn ?? 48, widthIn ?? 48);
  const half = ((widthIn ?? 48) / 2) * scale;
  const backY = 84;
  const frontY = backY + (lengthIn ?? 48) * scale;
  return {
    scale,
    left: spec.axisX - half,
    right: spec.axisX + half,
    backY,
    frontY,
    padY: frontY + (spec.compact ? 130 : 160),
  };
}

function facts(section: RelevelSection, { record, limits, metric, findings }: LayoutInput): ColumnLabel[] {
  const { derived } = record;
  const spoken = new Set(findings.map((finding) => finding.code));
  const out: ColumnLabel[] = [];
  const add = (id: string, title: string, detail: string) =>
    out.push({ id, title, detail, tone: 'ink', finding: null, optional: true });
  if (
    derived.placedFt3 !== null &&
    derived.voidFt3 !== null &&
    derived.fillRatio !== null &&
    !spoken.has('fill-short')
  ) {
    add(
      'foam',
      `Foam ${dimensionText(derived.placedFt3, 'ft3', metric)} placed`,
      `fill ratio ${formatNumber(derived.fillRatio, { fixed: true })} of void ${formatQuantity(derived.voidFt3, 'ft3', { metric })}`,
    );
  }
  if (section.planeIn !== null && !spoken.has('gap-plane')) {
    add(
      'plane',
      `Plane test ${dimensionText(section.planeIn, 'in', metric)}`,
      'how far the four gaps are from a flat pad',
    );
  }
  if (section.slopeAfterAcross !== null && !spoken.has('pad-slope')) {
    const limit = limits.slopeMostInPerFt;
    add(
      'after',
      `After ${dimensionText(section.slopeAfterAcross, 'in-per-ft', metric)}`,
      limit === undefined
        ? 'across, left to right'
        : `across; limit ${formatQuantity(limit, 'in-per-ft', { metric })}`,
    );
  }
  return out;
}

function pointOf(label: ColumnLabel, { gapsIn }: RelevelSection, places: RelevelPlaces): Point | null {
  const field = label.finding ? label.finding.field : label.id;
  if (field === null || label.id.startsWith('missing')) return null;
  const { right, left, backY, frontY, padY, scale } = places;
  if (field === 'foam' || /^(lot|kit|quantity|product|pour|component)/.test(field)) {
    return { x: right - (right - left) * 0.14, y: backY + (frontY - backY) * 0.3 };
  }
  if (/^(gap|plane)/.test(field)) return { x: right, y: padY + ((gapsIn?.[2] ?? 0) / 2) * scale };
  if (field === 'after' || /^(slope|raised|lowered|released)/.test(field)) return { x: right, y: padY - 12 };
  return /^(pad|opening)/.test(field) ? { x: right, y: frontY - 20 } : null;
}
