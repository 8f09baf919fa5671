import type { StoryLine } from './build-batch-rows.ts';
import type { Deviation } from './deviations.ts';
import { REPAIR_BATCHES } from './repair-batches.ts';

/** How far the story takes a batch. */
export type StoryState = 'draft' | 'checked' | 'submitted' | 'in-review' | 'decided' | 'on-record';

/** What the inspector does about one finding: by structure and rule. */
export type StoryDecision =
  | { readonly decision: 'approve'; readonly grounds: 'evidence' | 'answer'; readonly reason: string }
  | { readonly decision: 'reject'; readonly action: 'correct' | 'rework' | 'repair'; readonly reason: string }
  | {
      readonly decision: 'concession';
      readonly asked: string;
      readonly granted: { readonly reason: string; readonly condition: string | null } | null;
    };

export type StoryBatch = {
  readonly key: string;
  readonly workOrder: '17' | '18';
  readonly state: StoryState;
  readonly lines: readonly StoryLine[];
  /** The contractor's answers before submitting, by `structure rule`. */
  readonly answers?: Readonly<Record<string, string>>;
  /** By `structure rule`; a line without an entry has no finding that needs one. Left open where the review goes on. */
  readonly decisions?: Readonly<Record<string, StoryDecision>>;
  /** Lines still undecided when the story stops (an open review). */
  readonly undecided?: readonly string[];
  /** What the contractor hands in after the return; submitted or left as a checked draft. */
  readonly next?: { readonly lines: readonly StoryLine[]; readonly state: 'checked' | 'submitted' };
  /** The clerk enters what was approved, and issues it under this title. */
  readonly transmittal?: string;
};

/** A crew's day: one pole after the other, fifty minutes apart. */
function day(
  { on, lot, first = '07:40', every = 50 }: { on: string; lot: string; first?: string; every?: number },
  lines: readonly (readonly [string, ...Deviation[]])[],
): StoryLine[] {
  const [hour = 0, minute = 0] = first.split(':').map(Number);
  return lines.map(([structureNumber, ...deviations], n) => {
    const at = hour * 60 + minute + n * every;
    const time = `${String(Math.floor(at / 60)).padStart(2, '0')}:${String(at % 60).padStart(2, '0')}`;
    return { structureNumber, boredAt: `${on}T${time}`, lot, deviations };
  });
}

export const BATCHES: readonly StoryBatch[] = [
  {
    key: 'first on record',
    workOrder: '17',
    state: 'on-record',
    lines: day({ on: '2026-04-07', lot: 'LK-2204' }, [
      ['17-0401'],
      ['17-0402'],
      ['17-0403', 'embedment-short'],
      ['17-0404'],
      ['17-0405', 'crown-low'],
    ]),
    answers: {
      '17-0405 crown-low': 'Trimmed flush by mistake; native soil was tamped over it the same day.',
    },
    decisions: {
      '17-0403 embedment-short': {
        decision: 'concession',
        asked: 'Auger stopped on a boulder at 5.8 ft; moving the pole would foul the driveway.',
        granted: {
          reason: 'Tangent pole, short spans both sides; 0.2 ft is carried by the class chosen.',
          condition: 'Look at its lean at the next line patrol.',
        },
      },
      '17-0405 crown-low': {
        decision: 'approve',
        grounds: 'answer',
        reason: 'The photograph shows soil tamped to grade.',
      },
    },
    transmittal: 'Fallow Road tie line, first five structures',
  },
  {
    key: 'returned in part',
    workOrder: '17',
    state: 'decided',
    lines: day({ on: '2026-04-10', lot: 'LK-2204' }, [
      ['17-0406'],
      ['17-0407', 'fill-short'],
      ['17-0408'],
      ['17-0409', 'lot-unknown'],
      ['17-0411'],
    ]),
    decisions: {
      '17-0407 fill-short': {
        decision: 'reject',
        action: 'rework',
        reason: 'One kit less than the void needs. Top up and record it as event 2.',
      },
      '17-0409 lot-unknown': {
        decision: 'reject',
        action: 'correct',
        reason: 'The label in the photograph reads another lot. Correct the Pours sheet.',
      },
    },
    next: {
      state: 'checked',
      lines: [
        {
          structureNumber: '17-0407',
          boredAt: '2026-04-10T08:30',
          lot: 'LK-2204',
          deviations: ['fill-short'],
          rework: { pouredAt: '2026-04-17T09:15', kitFt3: 1.5, quantity: 1, lot: 'LK-2291' },
        },
        { structureNumber: '17-0409', boredAt: '2026-04-10T10:10', lot: 'LK-2204' },
      ],
    },
  },
  {
    key: 'under review',
    workOrder: '17',
    state: 'in-review',
    lines: day({ on: '2026-04-14', lot: 'LK-2291' }, [
      ['17-0412'],
      ['17-0413'],
      ['17-0415', 'photo-missing'],
      ['17-0416'],
      ['17-0417', 'embedment-short', 'water-deep', 'hardware-early'],
      ['17-0418', 'fill-excess'],
    ]),
    answers: {
      '17-0418 fill-excess': 'Foam ran into an old drain tile beside the bore; see the finish photograph.',
    },
    undecided: ['17-0417', '17-0418'],
    decisions: {
      '17-0415 photo-missing': {
        decision: 'reject',
        action: 'correct',
        reason: 'Send the photograph of the finish at ground line.',
      },
    },
  },
  {
    key: 'waiting in the queue',
    workOrder: '17',
    state: 'submitted',
    lines: day({ on: '2026-05-19', lot: 'LK-2291' }, [
      ['17-0419'],
      ['17-0420', 'annulus-narrow'],
      ['17-0421'],
      ['17-0422', 'unproved'],
    ]),
    answers: {
      '17-0422 unproved':
        'The foreman did not note when framing began; the crew says after lunch, some two hours later.',
    },
  },
  {
    key: 'being put together',
    workOrder: '17',
    state: 'checked',
    lines: day({ on: '2026-06-02', lot: 'LK-2337' }, [
      ['17-0424', 'fill-short'],
      ['17-0425', 'record-unreadable'],
      ['17-0426', 'clock-order'],
      ['17-0427', 'photo-missing'],
    ]),
  },
  {
    key: 'decided, not yet entered',
    workOrder: '18',
    state: 'decided',
    lines: day({ on: '2026-05-06', lot: 'LK-2291' }, [
      ['18-0101'],
      ['18-0102', 'hardware-early'],
      ['18-0103'],
      ['18-0104'],
    ]),
    decisions: {
      '18-0102 hardware-early': {
        decision: 'approve',
        grounds: 'evidence',
        reason:
          'The plumb photograph of 21 minutes after the pour shows the pole still bare: a slip of the pen.',
      },
    },
  },
  {
    key: 'concession asked',
    workOrder: '18',
    state: 'decided',
    lines: day({ on: '2026-05-12', lot: 'LK-2291' }, [
      ['18-0105'],
      ['18-0106', 'water-deep'],
      ['18-0107'],
      ['18-0108'],
    ]),
    decisions: {
      '18-0106 water-deep': {
        decision: 'concession',
        asked: 'Spring water, pumped twice; it came back within minutes. Foam rose clean and full.',
        granted: null,
      },
    },
  },
  { key: 'just begun', workOrder: '18', state: 'draft', lines: [] },
  ...REPAIR_BATCHES,
];
