import { deriveSet } from '#shared/calc/derive-set.ts';
import { dueDepthFt } from '#shared/calc/due-depth.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { after } from './clock.ts';
import { type PourValues, type Values, tenth } from './line-values.ts';
import type { View } from '../photograph/scene.ts';

/** One line of a batch while it is being made up. */
export type DraftLine = { values: Values; pours: PourValues[]; views: View[] };

/** What goes wrong on a line of the story, each named for the rule that it fails. */
export const DEVIATIONS = {
  'embedment-short': ({ values }) => {
    values['embedmentFt'] = tenth(dueFt(values) - 0.2);
    values['boreDepthFt'] = values['embedmentFt'];
  },
  'embedment-deep': ({ values }) => {
    values['embedmentFt'] = tenth(dueFt(values) + 1.8);
    values['boreDepthFt'] = values['embedmentFt'];
  },
  'bore-shallow': ({ values }) => {
    values['boreDepthFt'] = tenth(Number(values['embedmentFt']) - 0.3);
  },
  'annulus-narrow': ({ values }) => {
    values['leastGapIn'] = 1.5;
  },
  'fill-short': ({ values, pours }) => {
    // The crew had too few kits on the truck: fewer, then smaller ones, until clearly short.
    while (fillRatio({ values, pours }) > 0.95) {
      const last = pours.at(-1)!;
      const smaller = DEMO_PRODUCT.kitsFt3.filter((size) => size < last.kitFt3).at(-1);
      if (smaller !== undefined) last.kitFt3 = smaller;
      else if (last.quantity > 1) last.quantity -= 1;
      else pours.pop();
    }
  },
  'fill-excess': ({ pours }) => {
    pours[0]!.quantity += 2;
  },
  'crown-low': ({ values }) => {
    values['foamTopBelowGradeIn'] = 1.5;
  },
  'water-deep': ({ values }) => {
    values['boreDepthFt'] = values['embedmentFt']!;
    values['waterIn'] = 1.8;
  },
  'hardware-early': ({ values, pours }) => {
    values['hardwareAt'] = after(String(pours[0]!['pouredAt']), 11);
    values['loadAt'] = 'not-yet';
  },
  'lift-early': ({ pours }) => {
    const first = pours[0]!;
    pours.push({
      ...first,
      pourNumber: 2,
      pouredAt: after(String(first['pouredAt']), 2),
      kitFt3: 1.5,
      quantity: 1,
    });
  },
  'clock-order': ({ values }) => {
    values['setAt'] = after(String(values['boredAt']), -25);
  },
  'lot-unknown': ({ pours }) => {
    pours[0]!['lot'] = 'LK-2219';
  },
  'kit-unknown': ({ pours }) => {
    pours[0]!.kitFt3 = 5;
  },
  'photo-missing': (line) => {
    line.views = line.views.filter((view) => view !== 'finish');
  },
  unproved: ({ values }) => {
    delete values['hardwareAt'];
  },
  'record-unreadable': ({ values }) => {
    values['embedmentFt'] = '5.5.8';
  },
  'record-missing': ({ values }) => {
    delete values['leanInPer10Ft'];
    delete values['leanAzimuthDeg'];
  },
} satisfies Record<string, (line: DraftLine) => void>;

export type Deviation = keyof typeof DEVIATIONS;

function dueFt(values: Values): number {
  const due = dueDepthFt({ values, standard: DEMO_STANDARD, designEmbedmentFt: null });
  if (due === null)
    throw new Error(`No setting depth is due for structure ${String(values['structureNumber'])}.`);
  return due;
}

function fillRatio({ values, pours }: Pick<DraftLine, 'values' | 'pours'>): number {
  const amounts = pours.map((pour) => ({
    kitFt3: pour.kitFt3,
    quantity: pour.quantity,
    wastedQuantity: 0,
    componentATempF: Number(pour['componentATempF']),
    componentBTempF: Number(pour['componentBTempF']),
  }));
  const figures = deriveSet({ values, pours: amounts, standard: DEMO_STANDARD, product: DEMO_PRODUCT });
  if (figures.fillRatio === null)
    throw new Error(`No fill ratio for structure ${String(values['structureNumber'])}.`);
  return figures.fillRatio;
}
