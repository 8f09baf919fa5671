import { createRandom, seedOf } from '../photograph/random.ts';
import type { Subject, View } from '../photograph/scene.ts';
import { after } from './clock.ts';
import { DEVIATIONS, type Deviation, type DraftLine } from './deviations.ts';
import { type PourValues, type Values, soundPours, soundSetValues } from './line-values.ts';
import { WORK_ORDERS, plannedStructure } from './work-orders.ts';

export type StoryLine = {
  readonly structureNumber: string;
  /** wall clock when the bore was dug */
  readonly boredAt: string;
  readonly lot: string;
  readonly deviations?: readonly Deviation[];
  /** A later visit that topped up the foam: event 2, with its own pour, time and photograph. */
  readonly rework?: {
    readonly pouredAt: string;
    readonly kitFt3: number;
    readonly quantity: number;
    readonly lot: string;
  };
  /** Said last, over everything else. */
  readonly values?: Values;
};

export type StoryPhotograph = {
  readonly fileName: string;
  readonly subject: Subject;
  readonly capture: {
    readonly takenAt: string;
    readonly offset: string;
    readonly latitude: number;
    readonly longitude: number;
  };
};

/** Rows of a workbook by field key, times as wall clock `YYYY-MM-DDTHH:mm`, days as `YYYY-MM-DD`; blank fields absent. */
export type BatchRows = {
  readonly workOrder: string;
  readonly contractor: string;
  readonly foreman: string;
  readonly notes: string | null;
  readonly set: readonly Values[];
  readonly pours: readonly PourValues[];
  readonly events: readonly Values[];
  readonly photos: readonly Values[];
  readonly photographs: readonly StoryPhotograph[];
};

const OFFSET = '-05:00'; // daylight time in the demo's zone from 8 March to 1 November 2026

/** A batch's rows and photographs. The same lines give the same batch, whatever else the story holds. */
export function buildBatchRows({
  workOrder,
  lines,
  notes,
}: {
  workOrder: string;
  lines: readonly StoryLine[];
  notes?: string;
}): BatchRows {
  const order = WORK_ORDERS.find((candidate) => candidate.number === workOrder);
  if (!order) throw new Error(`The story has no work order ${workOrder}.`);
  const built = lines.map((line) => buildLine(line, order.foreman));
  const contractor =
    order.contractor === 'brindle' ? 'Brindle Line Constructors' : 'Tamsett Utility Services';
  const photographs = built.flatMap((line) => line.photographs);
  return {
    workOrder,
    contractor,
    foreman: order.foreman,
    notes: notes ?? null,
    set: built.map((line) => line.values),
    pours: built.flatMap((line) => line.pours),
    events: built.flatMap((line) => line.events),
    photos: photographs.map(photoRow),
    photographs,
  };
}

function buildLine(line: StoryLine, foreman: string) {
  const random = createRandom(seedOf(`${line.structureNumber} ${line.boredAt}`));
  const values = soundSetValues(plannedStructure(line.structureNumber), {
    random,
    boredAt: line.boredAt,
    foreman,
  });
  const pouredAt = after(String(values['setAt']), random.whole(3, 6));
  const draft: DraftLine = {
    values,
    pours: soundPours(values, { random, lot: line.lot, pouredAt }),
    views: [],
  };
  const before = line.deviations ?? [];
  // Views follow the water that was met; the photographs then show what the record says.
  for (const name of before) DEVIATIONS[name](draft);
  Object.assign(draft.values, line.values);
  draft.views = viewsOf(draft.values);
  if (before.includes('photo-missing')) DEVIATIONS['photo-missing'](draft);
  const photographs = draft.views.map((view) => photograph(draft, view, random.whole(0, 40)));
  const { rework } = line;
  if (!rework) return { values: draft.values, pours: draft.pours, events: [] as Values[], photographs };
  const pour = { ...draft.pours[0]!, ...rework, event: 2, pourNumber: 1 };
  return {
    values: draft.values,
    pours: [...draft.pours, pour],
    events: [
      {
        structureNumber: line.structureNumber,
        event: 2,
        beganAt: after(rework.pouredAt, -20),
        letGoAt: 'not-by-us',
        hardwareAt: 'not-by-us',
        loadAt: 'not-by-us',
        foamTopBelowGradeIn: 0,
      },
    ],
    photographs: [...photographs, photograph({ ...draft, pours: [pour] }, 'rework', 12)],
  };
}

/** A row of the Photos sheet. */
function photoRow({ fileName, subject }: StoryPhotograph): Values {
  const row = { fileName, structureNumber: subject.structureNumber, view: subject.view };
  return subject.view === 'rework' ? { ...row, event: 2 } : row;
}

function viewsOf(values: Values): View[] {
  const wet = typeof values['waterIn'] === 'number' && values['waterIn'] > 0;
  return ['bore-depth', ...(wet ? (['water'] as const) : []), 'kits', 'finish', 'plumb'];
}

function photograph({ values, pours }: DraftLine, view: View, seconds: number): StoryPhotograph {
  const structureNumber = String(values['structureNumber']);
  const pouredAt = String(pours[0]!['pouredAt']);
  const bored = String(values['boredAt']);
  const takenAt = {
    'bore-depth': after(bored, 6),
    water: after(bored, 8),
    kits: after(pouredAt, -4),
    finish: after(pouredAt, 7),
    plumb: after(pouredAt, 10),
    rework: after(pouredAt, 6),
  }[view as 'bore-depth' | 'water' | 'kits' | 'finish' | 'plumb' | 'rework'];
  const stray = createRandom(seedOf(`${structureNumber} ${view}`));
  return {
    fileName: `${structureNumber} ${view}.jpg`,
    subject: {
      view,
      kind: 'set',
      structureNumber,
      boreDepthFt: number(values['boreDepthFt'], 6),
      waterIn: number(values['waterIn'], 0),
      foamTopBelowGradeIn: number(values['foamTopBelowGradeIn'], 0),
      kits: pours.map((pour) => ({ kitFt3: pour.kitFt3, quantity: pour.quantity, lot: String(pour['lot']) })),
      leanDeg: number(values['leanInPer10Ft'], 0) * 0.6,
      gapIn: 0,
      pole: { lengthFt: number(values['poleLengthFt'], 40), poleClass: String(values['poleClass']) },
    },
    capture: {
      takenAt: `${takenAt}:${String(seconds).padStart(2, '0')}`,
      offset: OFFSET,
      latitude: number(values['latitude'], 0) + stray.between(-1, 1) * 0.00003,
      longitude: number(values['longitude'], 0) + stray.between(-1, 1) * 0.00003,
    },
  };
}

function number(value: Values[string] | undefined, otherwise: number): number {
  return typeof value === 'number' ? value : otherwise;
}
