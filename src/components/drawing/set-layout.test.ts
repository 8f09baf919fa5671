import { describe, expect, it } from 'vitest';
import type { Derived, FieldValues } from '#shared/records/types.ts';
import { setLayout, type SetLayout } from './set-layout.ts';
import { BALLOON_R, FONT, NARROW, WIDE, type SheetSpec } from './sheet-spec.ts';
import type { Box, Run, SheetFinding } from './sheet-types.ts';
import { textWidth } from './text-width.ts';

const derived: Derived = {
  voidFt3: 8.7,
  placedFt3: 9.5,
  fillRatio: 1.09,
  fillRatioU: 0.08,
  dueFt: 6,
  waterWithPoleIn: 2.2,
  leastAnnulusIn: 3.1,
  poleTaped: true,
  worstReading: null,
};

const plain: FieldValues = {
  poleLengthFt: 40,
  poleClass: '4',
  poleMaterial: 'southern-pine',
  ground: 'soil',
  boreTopIn: 20,
  boreBottomIn: 18.5,
  boreDepthFt: 5.8,
  embedmentFt: 5.8,
  diameterGroundLineIn: 10.8,
  diameterButtIn: 12.4,
  foamTopBelowGradeIn: -2.5,
  waterIn: 1.2,
};

const STRUCTURES: readonly [string, FieldValues, Partial<Derived>][] = [
  ['plain', plain, {}],
  ['deep', { ...plain, boreDepthFt: 12, embedmentFt: 11 }, { dueFt: 10 }],
  ['shallow', { ...plain, boreDepthFt: 3, embedmentFt: 2.4 }, { dueFt: 6 }],
  ['wide', { ...plain, boreTopIn: 60, boreTopAcrossIn: 66, boreBottomIn: 54 }, {}],
  ['belled', { ...plain, bellIn: 40, bellHeightFt: 1.5, boreDepthFt: 8, embedmentFt: 7.4 }, { dueFt: 7.4 }],
  [
    'bed, rock, slope',
    {
      ...plain,
      boreDepthFt: 7,
      bedFt: 0.6,
      bedMaterial: 'native',
      ground: 'soil-over-rock',
      rockFromFt: 3,
      slopeRiseIn: 6,
    },
    {},
  ],
  ['just short', { ...plain, embedmentFt: 5.99 }, {}],
  ['just due', { ...plain, boreDepthFt: 6, embedmentFt: 6 }, {}],
  ['bore missing', { ground: 'rock', embedmentFt: 5 }, { leastAnnulusIn: null, fillRatio: null }],
  ['nothing known', {}, { dueFt: null, placedFt3: null, waterWithPoleIn: null, leastAnnulusIn: null }],
];

const FIELDS = [
  'embedmentFt',
  'waterIn',
  'hardwareAt',
  'quantity',
  'boreDepthFt',
  'latitude',
  'leastGapIn',
  'kitFt3',
  'leanInPer10Ft',
  null,
] as const;

function findings(count: number): SheetFinding[] {
  return FIELDS.slice(0, count).map((field, index) => ({
    id: String(index),
    number: index + 1,
    code: `code-${index}`,
    title:
      ['Embedment short', 'Water too deep with the pole in the bore', 'Hardware too early'][index % 3] ?? '',
    severity: 'nonconformity',
    field,
    measured: 5.8,
    limit: 6,
    margin: -0.2,
    unit: 'ft',
  }));
}

function runsWidth(runs: readonly Run[]): number {
  return runs.reduce((sum, run) => sum + textWidth(run.text, FONT, run.bold), 0);
}

/** Everything that is to be read, as boxes. */
function boxes(layout: SetLayout, spec: SheetSpec, titleTop: number): Box[] {
  const { across, down, due } = layout.dimensions;
  return [
    {
      id: 'title',
      x: spec.title.right - spec.title.width,
      y: titleTop,
      width: spec.title.width,
      height: spec.title.bottom - titleTop,
    },
    ...layout.labels.map((label) => ({
      id: label.id,
      x: label.x,
      y: label.y - 12,
      width: label.width,
      height: label.height,
    })),
    ...across.map((one) => {
      const width = runsWidth(one.runs);
      return {
        id: one.id,
        x: one.textAt === 'left' ? one.textX - width : one.textX,
        y: one.y - 7,
        width,
        height: 13,
      };
    }),
    ...down.flatMap((one) => {
      const length = runsWidth(one.runs);
      const words = { id: one.id, x: one.x - 19, y: one.textY - length / 2, width: 13, height: length };
      const { balloon } = one;
      return balloon
        ? [
            words,
            {
              id: `${one.id} balloon`,
              x: one.x - BALLOON_R,
              y: balloon.y - BALLOON_R,
              width: 2 * BALLOON_R,
              height: 2 * BALLOON_R,
            },
          ]
        : [words];
    }),
    ...(due
      ? [{ id: 'due', x: due.textX, y: due.textY - 11, width: textWidth(due.text, FONT), height: 13 }]
      : []),
    { id: 'scale bar', x: spec.scaleBar.x, y: spec.scaleBar.y - 5, width: layout.geometry.scale, height: 27 },
  ];
}

function overlaps(all: readonly Box[]): string[] {
  return all.flatMap((a, index) =>
    all
      .slice(index + 1)
      .filter(
        (b) => a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height,
      )
      .map((b) => `${a.id} over ${b.id}`),
  );
}

describe('setLayout', () => {
  const sheets: readonly [string, SheetSpec, number][] = [
    ['wide', WIDE, 592],
    ['wide, decided', WIDE, 553],
    ['narrow', NARROW, 632],
  ];
  for (const [sheet, spec, titleTop] of sheets) {
    for (const [name, values, change] of STRUCTURES) {
      for (const count of [0, 3, 10]) {
        it(`lets nothing overlap or leave the sheet: ${sheet}, ${name}, ${count} findings`, () => {
          const layout = setLayout({
            record: { kind: 'set', structureNumber: '17-0417', values, derived: { ...derived, ...change } },
            findings: findings(count),
            limits: { annulusLeastIn: 2, waterMostIn: 2, fillLeast: 1 },
            spec,
            metric: false,
            titleTop,
          });
          const all = boxes(layout, spec, titleTop);
          expect(overlaps(all)).toEqual([]);
          expect(all.filter((box) => box.x < 2 || box.x + box.width > spec.width - 2 || box.y < 2)).toEqual(
            [],
          );
        });
      }
    }
  }

  it('draws both ways to one scale and marks the due depth below a short embedment', () => {
    const { geometry, dimensions } = setLayout({
      record: { kind: 'set', structureNumber: '17-0417', values: plain, derived },
      findings: [],
      limits: {},
      spec: WIDE,
      metric: false,
      titleTop: 592,
    });
    // 410 units for 6 ft (the due depth is the deepest thing): 68.333 a foot.
    expect(geometry.scale).toBeCloseTo(68.3333, 3);
    expect((geometry.bore?.right ?? 0) - (geometry.bore?.left ?? 0)).toBeCloseTo((20 / 12) * 68.3333, 2);
    expect(dimensions.due?.y).toBeCloseTo(156 + 6 * 68.3333, 1);
    expect(dimensions.due?.tone).toBe('nonconform');
    expect(dimensions.down.map((one) => one.runs.map((run) => run.text).join(''))).toEqual([
      '5.80\u00a0ft embedment',
    ]);
    expect(dimensions.across.map((one) => one.runs.map((run) => run.text).join(''))).toEqual([
      'bore, top 20.0\u00a0in',
      'butt 12.4\u00a0in',
      'bore, bottom 18.5\u00a0in',
    ]);
  });
});
