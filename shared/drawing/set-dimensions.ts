import { positiveOf } from '#shared/calc/values.ts';
import type { FieldValues } from '#shared/records/types.ts';
import { anchorOf } from './anchors.ts';
import { downDimension, type DownDimension } from './down-dimension.ts';
import { dueTick, type DueTick } from './due-tick.ts';
import { crossText, dimensionText } from './dimension-text.ts';
import { round } from './marks.ts';
import type { SetGeometry } from './set-geometry.ts';
import type { SetSection } from './set-section.ts';
import { FONT, type SheetSpec } from './sheet-spec.ts';
import type { Run, SheetFinding } from './sheet-types.ts';
import { textWidth } from './text-width.ts';

/** A dimension across: extension lines from `fromY`, the line at `y`, its words at one side. */
export type AcrossDimension = {
  readonly id: string;
  readonly y: number;
  readonly x1: number;
  readonly x2: number;
  readonly fromY: number;
  readonly textAt: 'left' | 'right';
  /** The words' end next to the line. */
  readonly textX: number;
  readonly runs: readonly Run[];
  /** The pole stands in front of the line. */
  readonly gap: readonly [number, number] | null;
};

export type SetDimensions = {
  readonly across: readonly AcrossDimension[];
  readonly down: readonly DownDimension[];
  readonly due: DueTick | null;
};

type Input = {
  readonly section: SetSection;
  readonly geometry: SetGeometry;
  readonly spec: SheetSpec;
  readonly values: FieldValues;
  readonly findings: readonly SheetFinding[];
  readonly metric: boolean;
};

const ROW = 25;

export function setDimensions(input: Input): SetDimensions {
  const down = downDimensions(input);
  const due = dueTick({ ...input, down, x: embedmentX(input.section, input.spec) });
  return { across: [...topDimension(input), ...bottomDimensions(input, due)], down, due };
}

function topDimension({ geometry, values, metric, spec }: Input): AcrossDimension[] {
  const { edges, pole } = geometry;
  const topIn = positiveOf(values, 'boreTopIn');
  if (topIn === null) return [];
  const across = positiveOf(values, 'boreTopAcrossIn');
  const y = spec.groundY - 46;
  return [
    {
      id: 'bore-top',
      y,
      x1: edges.left,
      x2: edges.right,
      fromY: Math.min(geometry.groundAt(edges.left), geometry.groundAt(edges.right)) - 7,
      textAt: 'left',
      textX: edges.left - (spec.compact ? 9 : 16),
      runs: fitting(
        width('bore, top', [topIn, across ?? topIn], metric),
        edges.left - (spec.compact ? 14 : 24),
      ),
      gap: pole ? [pole.left - 4, pole.right + 4] : null,
    },
  ];
}

function width(word: string, axes: readonly [number, number], metric: boolean): Run[] {
  return [
    ...(word === '' ? [] : [{ text: `${word} `, tone: 'muted' as const }]),
    { text: crossText(axes, metric), bold: true },
  ];
}

/** The words go first where there is no room: the figure stands above the bore that it measures. */
function fitting(runs: Run[], room: number): Run[] {
  const wide = runs.reduce((sum, run) => sum + textWidth(run.text, FONT, run.bold), 0) > room;
  return wide ? runs.filter((run) => run.bold) : runs;
}

function bottomDimensions(
  { section, geometry, metric, spec }: Input,
  due: DueTick | null,
): AcrossDimension[] {
  const { bore, pole } = geometry;
  const rows: Omit<AcrossDimension, 'y' | 'textX' | 'textAt' | 'gap'>[] = [];
  if (pole && section.pole) {
    rows.push({
      id: 'butt',
      x1: pole.buttLeft,
      x2: pole.buttRight,
      fromY: pole.buttY + 8,
      runs: [
        { text: 'butt ', tone: 'muted' },
        { text: dimensionText(section.pole.buttIn, 'in', metric), bold: true },
      ],
    });
  }
  if (bore && section.bore) {
    const shaft = section.bore.parts[0];
    const bell = section.bore.parts[1];
    const belled = bell !== undefined;
    if (shaft) {
      const half = (shaft.bottom.a / 24) * geometry.scale;
      const axis = (bore.left + bore.right) / 2;
      rows.push({
        id: 'bore-bottom',
        x1: axis - half,
        x2: axis + half,
        fromY: belled ? geometry.y(shaft.toFt) : bore.bottomY + 8,
        runs: width(belled ? 'bore, above bell' : 'bore, bottom', [shaft.bottom.a, shaft.bottom.b], metric),
      });
    }
    if (bell) {
      rows.push({
        id: 'bell',
        x1: bore.bottomLeft,
        x2: bore.bottomRight,
        fromY: bore.bottomY + 8,
        runs: width('bell', [bell.bottom.a, bell.bottom.b], metric),
      });
    }
  }
  const lowest = Math.max(bore?.bottomY ?? 0, pole?.buttY ?? 0);
  // The words of the due depth keep their place; the rows begin below them.
  const first = Math.max(
    lowest + 40,
    due === null ? 0 : due.textY + 18,
    spec.compact ? spec.labels.bottom + 18 : 0,
  );
  const textAt = spec.compact ? 'right' : 'left';
  const textX =
    textAt === 'left'
      ? Math.min(...rows.map((row) => row.x1)) - 14
      : Math.max(...rows.map((row) => row.x2)) + 14;
  return rows.map((row, index) => ({
    ...row,
    runs: fitting([...row.runs], (textAt === 'left' ? textX : spec.labels.x + spec.labels.width - textX) - 8),
    y: round(first + index * ROW),
    textAt,
    textX,
    gap: null,
  }));
}

/** The deeper of two stands outside. */
function downDimensions(input: Input): DownDimension[] {
  const { section, geometry, spec, findings, metric } = input;
  const dimensions: DownDimension[] = [];
  const { bore, pole } = geometry;
  const both = hasBoreDepth(section) && section.embedmentFt !== null;
  if (section.embedmentFt !== null) {
    dimensions.push(
      downDimension({
        id: 'embedment',
        x: embedmentX(section, spec),
        y1: spec.groundY,
        y2: geometry.y(section.embedmentFt),
        toX1: spec.hatch.left - 26,
        toX2: (pole?.buttLeft ?? spec.axisX) - 8,
        value: dimensionText(section.embedmentFt, 'ft', metric),
        word: 'embedment',
        finding: findings.find((one) => anchorOf(one.field, one.code) === 'embedment') ?? null,
      }),
    );
  }
  if (hasBoreDepth(section) && section.boreDepthFt !== null) {
    dimensions.push(
      downDimension({
        id: 'bore-depth',
        x: both ? spec.dimensionX - spec.dimensionStep : spec.dimensionX,
        y1: spec.groundY,
        y2: geometry.y(section.boreDepthFt),
        toX1: spec.hatch.left - 26,
        toX2: (bore?.bottomLeft ?? geometry.edges.left) - 4,
        value: dimensionText(section.boreDepthFt, 'ft', metric),
        word: 'bore',
        finding: findings.find((one) => anchorOf(one.field, one.code) === 'bore-depth') ?? null,
      }),
    );
  }
  return dimensions;
}

/** The bore is measured apart where it is not simply as deep as the pole. */
function hasBoreDepth({ boreDepthFt, embedmentFt }: SetSection): boolean {
  return boreDepthFt !== null && (embedmentFt === null || Math.abs(boreDepthFt - embedmentFt) > 0.02);
}

function embedmentX(section: SetSection, spec: SheetSpec): number {
  return hasBoreDepth(section) ? spec.dimensionX + spec.dimensionStep : spec.dimensionX;
}
