import type { WorkbookInput } from '#server/workbook/write-workbook.ts';
import { relevelRow, repairPours, straightenRow } from '#tests/factories/repair-rows.ts';
import { pourRow, pourRows, SET_VIEWS, setRow } from '#tests/factories/set-row.ts';

const GAP_VIEWS = ['before', 'gap', 'kits'] as const;
export const PLANNED = [
  { structureNumber: 'S-1' },
  { structureNumber: 'S-2' },
  { structureNumber: 'T-1', kind: 'straighten' as const },
  { structureNumber: 'T-2', kind: 'straighten' as const },
  { structureNumber: 'P-1', kind: 'relevel' as const },
  { structureNumber: 'P-2', kind: 'relevel' as const },
];
export const viewsOf = ({ kind = 'set' }: { kind?: string }): readonly string[] =>
  kind === 'set' ? SET_VIEWS : [...GAP_VIEWS, kind === 'straighten' ? 'after' : 'level-after'];

/** Two lines of each kind: one that meets every rule, one that does not; T-1 with a rework. */
export function mixedWorkbook(lot: string): Partial<WorkbookInput> {
  return {
    set: [setRow('S-1'), setRow('S-2', { embedmentFt: 5.5 })],
    straighten: [
      // ½ · (7.5 + 1.5) · 11.5 · 4.8 / 144 = 1.725 ft³; one kit of 1.5 was short, and a second one came a week later.
      straightenRow('T-1', {
        leanBeforeInPer10Ft: 11,
        gapAtGradeIn: 7.5,
        gapAtDepthIn: 1.5,
        gapDepthFt: 4.8,
        gapWidthIn: 11.5,
      }),
      straightenRow('T-2', { leanAfterInPer10Ft: 1.4, leanAfterAzimuthDeg: 90 }),
    ],
    relevel: [relevelRow('P-1'), relevelRow('P-2', { slopeAfterAcrossInPerFt: 0.3 })],
    pours: [
      ...pourRows('S-1', lot, { airTempF: 55, notes: 'warmed in the cab' }),
      ...pourRows('S-2', lot),
      ...repairPours('T-1', lot, { kind: 'straighten' }),
      pourRow('T-1', lot, { event: 2, pouredAt: '2026-04-21T09:30', kitFt3: 1.5, wastedQuantity: 0 }),
      ...repairPours('T-2', lot, { kind: 'straighten' }),
      ...repairPours('P-1', lot, { kind: 'relevel' }),
      ...repairPours('P-2', lot, { kind: 'relevel' }),
    ],
    events: [
      {
        structureNumber: 'T-1',
        event: 2,
        beganAt: '2026-04-21T09:00',
        releasedAt: '2026-04-21T09:50',
        hardwareAt: 'not-by-us',
        notes: 'topped up',
      },
    ],
  };
}
