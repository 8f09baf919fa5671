import { formatNumber, formatQuantity } from '#shared/units/format-quantity.ts';
import { dimensionText } from './dimension-text.ts';
import { downDimension, type DownDimension } from './down-dimension.ts';
import { findingLabels, missingLabels } from './finding-labels.ts';
import { placeColumn, type ColumnLabel, type PlacedText } from './label-column.ts';
import type { AcrossDimension } from './set-dimensions.ts';
import type { LayoutInput } from './set-layout.ts';
import type { Point } from './sheet-types.ts';
import { straightenSection, type Lean, type StraightenSection } from './straighten-section.ts';

export type StraightenPlaces = {
  readonly scale: number;
  readonly left: number;
  readonly right: number;
  readonly buttY: number;
  /** Broken off below where the embedment is not known. */
  readonly brokenBelow: boolean;
  /** Wedge of foam at the right of the pole, as corners; null where its gaps are missing. */
  readonly wedge: { readonly topX: number; readonly bottomX: number; readonly bottomY: number } | null;
  readonly hatchBottomY: number;
};

export type StraightenLayout = {
  readonly section: StraightenSection;
  readonly places: StraightenPlaces;
  readonly across: readonly AcrossDimension[];
  readonly down: readonly DownDimension[];
  readonly labels: readonly PlacedText[];
};

export function straightenLayout(input: LayoutInput): StraightenLayout {
  const { record, spec, metric, findings, titleTop } = input;
  const section = straightenSection(record.values);
  const places = placesOf(section, input);
  const labels = [
    ...findingLabels(findings, metric),
    ...missingLabels(section.missing, findings),
    ...facts(section, input),
  ];
  const column = placeColumn(labels, {
    spec,
    bottom: Math.min(spec.labels.bottom, titleTop - 16),
    pointOf: (label) => pointOf(label, places, input),
  });
  return {
    section,
    places,
    labels: column.labels,
    across: gapDimension(section, places, input),
    down: depths(section, places, input),
  };
}

function placesOf(section: StraightenSection, { spec }: LayoutInput): StraightenPlaces {
  const half = (section.poleIn ?? 12) / 24;
  const widest = half + (section.wedge?.gapAtGradeIn ?? 0) / 12;
  const scale = Math.min(
    (spec.bottomY - spec.groundY) / section.deepestFt,
    spec.halfRoom / widest,
    spec.maxScale,
  );
  const right = spec.axisX + half * scale;
  const { wedge } = section;
  return {
    scale,
    left: spec.axisX - half * scale,
    right,
    buttY: spec.groundY + (section.embedmentFt ?? section.deepestFt) * scale,
    brokenBelow: section.embedmentFt === null,
    wedge: wedge && {
      topX: right + (wedge.gapAtGradeIn / 12) * scale,
      bottomX: right + (wedge.gapAtDepthIn / 12) * scale,
      bottomY: spec.groundY + wedge.depthFt * scale,
    },
    hatchBottomY: spec.groundY + section.deepestFt * scale + 40,
  };
}

function gapDimension(
  { wedge }: StraightenSection,
  places: StraightenPlaces,
  { spec, metric }: LayoutInput,
): AcrossDimension[] {
  if (!wedge || !places.wedge) return [];
  return [
    {
      id: 'gap',
      y: spec.groundY - 40,
      x1: places.right,
      x2: places.wedge.topX,
      fromY: spec.groundY - 7,
      textAt: 'left',
      textX: places.left - 22,
      runs: [
        { text: spec.compact ? 'gap ' : 'gap at grade ', tone: 'muted' },
        { text: dimensionText(wedge.gapAtGradeIn, 'in', metric), bold: true },
      ],
      gap: [places.left - 4, places.right],
    },
  ];
}

function depths(
  section: StraightenSection,
  places: StraightenPlaces,
  { spec, metric, findings }: LayoutInput,
): DownDimension[] {
  const base = { y1: spec.groundY, toX1: spec.hatch.left - 26, toX2: places.left - 8 };
  const { wedge, embedmentFt } = section;
  const both = wedge !== null && embedmentFt !== null;
  const step = both ? spec.dimensionStep : 0;
  const at = (field: string) => findings.find((one) => one.field === field) ?? null;
  return [
    ...(wedge && places.wedge
      ? [
          downDimension({
            ...base,
            id: 'depth',
            x: spec.dimensionX + step,
            y2: places.wedge.bottomY,
            value: dimensionText(wedge.depthFt, 'ft', metric),
            word: 'foamed depth',
            finding: at('gapDepthFt'),
          }),
        ]
      : []),
    ...(embedmentFt === null
      ? []
      : [
          downDimension({
            ...base,
            id: 'embedment',
            x: spec.dimensionX - step,
            y2: places.buttY,
            value: dimensionText(embedmentFt, 'ft', metric),
            word: 'embedment',
            finding: null,
          }),
        ]),
  ];
}

function facts(section: StraightenSection, { record, limits, metric, findings }: LayoutInput): ColumnLabel[] {
  const { derived } = record;
  const spoken = new Set(findings.map((finding) => finding.field));
  const out: ColumnLabel[] = [];
  const add = (id: string, title: string, detail: string) =>
    out.push({ id, title, detail, tone: 'ink', finding: null, optional: true });
  const lean = (word: string, value: Lean) => `${word} ${dimensionText(value.amount, 'in-per-10ft', metric)}`;
  if (section.before) add('before', lean('Before', section.before), towards(section.before));
  if (section.after && !spoken.has('leanAfterInPer10Ft')) {
    const limit = limits.leanMostInPer10Ft;
    add(
      'after',
      lean('After', section.after),
      limit === undefined
        ? towards(section.after)
        : `limit ${formatQuantity(limit, 'in-per-10ft', { metric })}`,
    );
  }
  if (derived.placedFt3 !== null && derived.voidFt3 !== null && derived.fillRatio !== null) {
    const u = derived.fillRatioU === null ? '' : ` ± ${formatNumber(derived.fillRatioU, { fixed: true })}`;
    add(
      'foam',
      `Foam ${dimensionText(derived.placedFt3, 'ft3', metric)} placed`,
      `fill ratio ${formatNumber(derived.fillRatio, { fixed: true })}${u} of void ${formatQuantity(derived.voidFt3, 'ft3', { metric })}`,
    );
  }
  add('opposite', 'Opposite gap below the pivot', 'is not counted');
  return out;
}

function towards({ azimuthDeg }: Lean): string {
  return azimuthDeg === null ? 'direction not given' : `towards ${formatQuantity(azimuthDeg, 'deg')}`;
}

/** Findings of lean point to the pole's face, those of gaps and foam to the wedge. */
function pointOf(label: ColumnLabel, places: StraightenPlaces, { spec }: LayoutInput): Point | null {
  const field = label.finding?.field ?? (label.finding ? null : label.id);
  const { wedge } = places;
  if (field === null || label.id.startsWith('missing')) return null;
  if (field === 'before')
    return wedge && { x: wedge.topX + (wedge.topX - wedge.bottomX) * 0.12, y: spec.groundY - 62 };
  if (field === 'opposite') return { x: places.left, y: places.buttY - 24 };
  if (field === 'after' || /^(lean|pole|pulled|released|reattached)/.test(field))
    return { x: places.right, y: spec.groundY - 24 };
  if (/^(foam|gap|lot|kit|quantity|product|pour|component|water)/.test(field)) {
    return (
      wedge && {
        x: places.right + (wedge.topX - places.right) * 0.4,
        y: spec.groundY + (wedge.bottomY - spec.groundY) * 0.3,
      }
    );
  }
  return null;
}
