import { createRandom, seedOf } from '../photograph/random.ts';
import type { Subject, View } from '../photograph/scene.ts';
import { after } from './clock.ts';
import { DEVIATIONS, type Deviation, type DraftLine } from './deviations.ts';
import { type PourValues, type Values, soundPours, soundSetValues } from './line-values.ts';
import { soundRepairValues, takenAt } from './repair-values.ts';
import { type PlannedStructure, WORK_ORDERS, plannedStructure } from './work-orders.ts';

export type StoryLine = {
  readonly structureNumber: string;
  /** wall clock when the bore was dug, the pole pulled or the pad raised */
  readonly boredAt: string;
  readonly lot: string;
  readonly deviations?: readonly Deviation[];
  /** What the crew poured instead of what the void wants: one kit of each size. */
  readonly kitsFt3?: readonly number[];
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
  readonly straighten: readonly Values[];
  readonly relevel: readonly Values[];
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
  const sheet = (kind: PlannedStructure['kind']) =>
    built.filter((line) => line.kind === kind).map((line) => line.values);
  return {
    workOrder,
    contractor,
    foreman: order.foreman,
    notes: notes ?? null,
    set: sheet('set'),
    straighten: sheet('straighten'),
    relevel: sheet('relevel'),
    pours: built.flatMap((line) => line.pours),
    events: built.flatMap((line) => line.events),
    photos: photographs.map(photoRow),
    photographs,
  };
}

function buildLine(line: StoryLine, foreman: string) {
  const random = createRandom(seedOf(`${line.structureNumber} ${line.boredAt}`));
  const planned = plannedStructure(line.structureNumber);
  const { kind } = planned;
  const { boredAt } = line;
  const values =
    kind === 'set'
      ? soundSetValues(planned, { random, boredAt, foreman })
      : soundRepairValues(planned, { random, beganAt: boredAt, foreman });
  // What is changed on a repair is the size of its gap: the pour follows it.
  if (kind !== 'set') Object.assign(values, line.values);
  const pouredAt = after(String(values['setAt'] ?? boredAt), random.whole(3, 6));
  const sound = soundPours(values, { kind, random, lot: line.lot, pouredAt });
  const draft: DraftLine = {
    values,
    pours: line.kitsFt3?.map((kitFt3) => ({ ...sound[0]!, kitFt3, quantity: 1 })) ?? sound,
    views: [],
  };
  const before = line.deviations ?? [];
  // Views follow the water that was met; the photographs then show what the record says.
  for (const name of before) DEVIATIONS[name](draft);
  Object.assign(draft.values, line.values);
  draft.views = viewsOf(kind, draft.values);
  if (before.includes('photo-missing')) DEVIATIONS['photo-missing'](draft);
  const photographs = draft.views.map((view) =>
    photograph(kind, draft, { view, seconds: random.whole(0, 40) }),
  );
  const { rework } = line;
  const built = { kind, values: draft.values };
  if (!rework) return { ...built, pours: draft.pours, events: [] as Values[], photographs };
  const pour = { ...draft.pours[0]!, ...rework, event: 2, pourNumber: 1 };
  const shot = photograph(kind, { ...draft, pours: [pour] }, { view: 'rework', seconds: 12 });
  return {
    ...built,
    pours: [...draft.pours, pour],
    events: [{ structureNumber: line.structureNumber, event: 2, ...eventTimes(kind, rework.pouredAt) }],
    photographs: [...photographs, shot],
  };
}

/** A visit that topped up the foam and went: what follows on a *set* pole was not done by this crew. */
function eventTimes(kind: PlannedStructure['kind'], pouredAt: string): Values {
  const beganAt = after(pouredAt, -20);
  if (kind === 'set')
    return {
      beganAt,
      letGoAt: 'not-by-us',
      hardwareAt: 'not-by-us',
      loadAt: 'not-by-us',
      foamTopBelowGradeIn: 0,
    };
  if (kind === 'straighten') return { beganAt, releasedAt: after(pouredAt, 22), hardwareAt: 'not-by-us' };
  return { beganAt, loweredAt: after(pouredAt, 9), releasedAt: after(pouredAt, 24) };
}

/** A row of the Photos sheet. */
function photoRow({ fileName, subject }: StoryPhotograph): Values {
  const row = { fileName, structureNumber: subject.structureNumber, view: subject.view };
  return subject.view === 'rework' ? { ...row, event: 2 } : row;
}

function viewsOf(kind: PlannedStructure['kind'], values: Values): View[] {
  if (kind === 'straighten') return ['before', 'gap', 'kits', 'after'];
  if (kind === 'relevel') return ['before', 'gap', 'kits', 'level-after'];
  const wet = typeof values['waterIn'] === 'number' && values['waterIn'] > 0;
  return ['bore-depth', ...(wet ? (['water'] as const) : []), 'kits', 'finish', 'plumb'];
}

function photograph(
  kind: PlannedStructure['kind'],
  { values, pours }: DraftLine,
  { view, seconds }: { view: View; seconds: number },
): StoryPhotograph {
  const structureNumber = String(values['structureNumber']);
  const at = takenAt(view, { values, pouredAt: String(pours[0]!['pouredAt']) });
  const stray = createRandom(seedOf(`${structureNumber} ${view}`));
  return {
    fileName: `${structureNumber} ${view}.jpg`,
    subject: {
      view,
      kind,
      structureNumber,
      boreDepthFt: number(values['boreDepthFt'], 6),
      waterIn: number(values['waterIn'], 0),
      foamTopBelowGradeIn: number(values['foamTopBelowGradeIn'], 0),
      kits: pours.map((pour) => ({ kitFt3: pour.kitFt3, quantity: pour.quantity, lot: String(pour['lot']) })),
      leanDeg: number(values['leanInPer10Ft'] ?? values['leanBeforeInPer10Ft'], 0) * 0.6,
      gapIn: number(values['gapAtGradeIn'] ?? values['gap1In'], 0),
      pole: { lengthFt: number(values['poleLengthFt'], 40), poleClass: String(values['poleClass']) },
    },
    capture: {
      takenAt: `${at}:${String(seconds).padStart(2, '0')}`,
      offset: OFFSET,
      latitude: number(values['latitude'], 0) + stray.between(-1, 1) * 0.00003,
      longitude: number(values['longitude'], 0) + stray.between(-1, 1) * 0.00003,
    },
  };
}

function number(value: Values[string] | undefined, otherwise: number): number {
  return typeof value === 'number' ? value : otherwise;
}
