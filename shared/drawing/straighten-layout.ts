import { formatQuantity } from '#shared/units/format-quantity.ts';
import { aboutReading } from './anchors.ts';
import { dimensionText } from './dimension-text.ts';
import { factLabel, foamFact } from './fact-labels.ts';
import { downDimension, type DownDimension } from './down-dimension.ts';
import { findingLabels, missingLabels } from './finding-labels.ts';
import { placeColumn, type ColumnLabel, type PlacedText } from './label-column.ts';
import type { LayoutInput } from './layout-input.ts';
import type { AcrossDimension } from './set-dimensions.ts';
import type { Point } from './sheet-types.ts';
import { straightenPlaces, straightenSpec, type StraightenPlaces } from './straighten-places.ts';
import { straightenSection, type Lean, type StraightenSection } from './straighten-section.ts';

export type StraightenLayout = {
  readonly section: StraightenSection;
  readonly places: StraightenPlaces;
  readonly across: readonly AcrossDimension[];
  readonly down: readonly DownDimension[];
  readonly labels: readonly PlacedText[];
  readonly leftOut: readonly ColumnLabel[];
};

const DASHED = new Set(['gapAtGradeIn', 'gapDepthFt', 'girthGroundLineIn', 'leanAfterInPer10Ft']);

/** Everything on the sheet of a *straighten* record, placed. */
export function straightenLayout(given: LayoutInput): StraightenLayout {
  const input = { ...given, spec: straightenSpec(given.spec) };
  const { record, spec, metric, findings, foot } = input;
  const section = straightenSection(record.values, record.events);
  const places = straightenPlaces(section, spec);
  const down = depths(section, places, input);
  const onLine = new Set(down.map((dimension) => dimension.balloon?.finding.id));
  const labels = [
    ...findingLabels(
      findings.filter((finding) => !onLine.has(finding.id)),
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
    pointOf: (label) => pointOf(label, section, places),
  });
  return { section, places, ...column, across: gapDimension(section, places, input), down };
}

function gapDimension(
  { wedge }: StraightenSection,
  places: StraightenPlaces,
  { spec, metric }: LayoutInput,
): AcrossDimension[] {
  if (!wedge || !places.wedge || wedge.gapAtGradeIn <= 0) return [];
  const left = places.face(-1, 0).x;
  return [
    {
      id: 'gap',
      y: spec.groundY - 40,
      x1: places.wedge[0].x,
      x2: places.wedge[1].x,
      fromY: spec.groundY - 7,
      textAt: 'left',
      textX: left - 22,
      runs: [
        { text: spec.compact ? 'gap ' : 'gap at grade ', tone: 'muted' },
        { text: dimensionText(wedge.gapAtGradeIn, 'in', metric), bold: true },
      ],
      gap: [left - 4, places.wedge[0].x],
    },
  ];
}

function depths(
  section: StraightenSection,
  places: StraightenPlaces,
  { spec, metric, findings }: LayoutInput,
): DownDimension[] {
  const { wedge, embedmentFt } = section;
  const step = wedge !== null && embedmentFt !== null ? spec.dimensionStep : 0;
  const dimension = (
    id: string,
    { field, depthFt, word, x }: { field: string; depthFt: number; word: string; x: number },
  ) =>
    downDimension({
      id,
      x,
      y1: spec.groundY,
      y2: places.y(depthFt),
      toX1: spec.hatch.left - 26,
      toX2: places.face(-1, depthFt).x - 8,
      value: dimensionText(depthFt, 'ft', metric),
      word,
      finding: findings.find((one) => one.field === field && aboutReading(one.code)) ?? null,
    });
  return [
    ...(wedge
      ? [
          dimension('depth', {
            field: 'gapDepthFt',
            depthFt: wedge.depthFt,
            word: 'foamed depth',
            x: spec.dimensionX + step,
          }),
        ]
      : []),
    ...(embedmentFt === null
      ? []
      : [
          dimension('embedment', {
            field: 'embedmentFt',
            depthFt: embedmentFt,
            word: 'embedment',
            x: spec.dimensionX - step,
          }),
        ]),
  ];
}

function facts(
  section: StraightenSection,
  { record, limits, purpose, metric, findings }: LayoutInput,
): ColumnLabel[] {
  const { derived } = record;
  const { before, after, rake, springback, wedge } = section;
  const spoken = new Set(findings.map((finding) => finding.field));
  const told = new Set(findings.map((finding) => finding.code));
  const out: ColumnLabel[] = [];
  const add = (...label: Parameters<typeof factLabel>) => out.push(factLabel(...label));
  const amount = (value: number) => dimensionText(value, 'in-per-10ft', metric);
  if (before && !spoken.has('leanBeforeInPer10Ft'))
    add('before', `Before ${amount(before.amount)}`, towards(before));
  if (after && !spoken.has('leanAfterInPer10Ft')) {
    const limit = limits.leanMostInPer10Ft;
    const parts = [
      towards(after),
      limit === undefined ? null : `limit ${formatQuantity(limit, 'in-per-10ft', { metric })}`,
    ];
    add('after', `After ${amount(after.amount)}`, parts.filter(Boolean).join('; '));
  }
  if (rake) add('rake', `Design rake ${amount(rake.amount)}`, towards(rake));
  if (springback !== null)
    add('springback', `Springback ${amount(springback)}`, 'held that much further (dotted)');
  if (wedge) {
    const foot =
      wedge.gapAtDepthIn > 0 ? `, ${dimensionText(wedge.gapAtDepthIn, 'in', metric)} at its foot` : '';
    add(
      'gap',
      `Gap ${dimensionText(wedge.widthIn, 'in', metric)} wide${foot}`,
      wedge.widthFrom === 'gapWidthIn' ? 'width as measured' : 'width of the pole at grade',
    );
  }
  if (!told.has('fill-short')) out.push(...foamFact(derived, { purpose, metric }));
  if (section.waterIn !== null && !spoken.has('waterIn')) {
    const limit = limits.waterMostIn;
    add(
      'water',
      `Water ${dimensionText(section.waterIn, 'in', metric)} with the pole in`,
      limit === undefined ? '' : `limit ${formatQuantity(limit, 'in', { metric })}`,
    );
  }
  return out;
}

function towards({ azimuthDeg }: Lean): string {
  return azimuthDeg === null
    ? 'direction not given'
    : `towards ${formatQuantity(azimuthDeg, 'deg', { digits: 0 })}`;
}

/** Findings of lean point to the pole's face, those of gaps and foam to the wedge. */
function pointOf(label: ColumnLabel, section: StraightenSection, places: StraightenPlaces): Point | null {
  const code = label.finding?.code ?? '';
  const field = /^(fill|lot|pour|kit)-/.test(code)
    ? 'foam'
    : label.finding
      ? label.finding.field
      : label.id.replace('missing ', '');
  if (field === null || label.finding?.code.startsWith('photo-')) return null;
  const high = places.topFt;
  if (field === 'before' || field.startsWith('leanBefore')) return places.former?.(1, high * 0.82) ?? null;
  if (field === 'springback') return places.ray(section.slopes.held ?? 0, high * 0.9);
  if (field === 'rake' || field.startsWith('designRake'))
    return places.ray(section.slopes.rake ?? 0, high * 0.72);
  if (field.startsWith('embedment')) return places.face(-1, places.buttFt - 0.25);
  if (field === 'after' || /^(lean|pole|girth|diameter|pulled|released|reattached)/.test(field))
    return places.face(1, high * 0.4);
  if (field.startsWith('water')) return places.wedge && middle(places.wedge[2], places.wedge[3]);
  if (/^(foam|gap|lot|kit|quantity|product|pour|component|wasted)/.test(field)) {
    const wedge = places.wedge ?? places.ghostWedge;
    const share = field === 'gap' ? 0.45 : 0.25;
    return (
      wedge && {
        x: wedge[0].x + (wedge[1].x - wedge[0].x) * 0.35,
        y: wedge[0].y + (wedge[2].y - wedge[0].y) * share,
      }
    );
  }
  return null;
}

function middle(a: Point, b: Point): Point {
  return { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 - 3 };
}
