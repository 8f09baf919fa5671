import { RECORD_FIELDS } from '#shared/records/field-meta.ts';
import type { Kind } from '#shared/records/types.ts';

/** How a field of the planner is read. `sizes`: a list of sizes, `18, 20, 24`. */
export type PlanRead = 'length-ft' | 'length-in' | 'number' | 'code' | 'text' | 'sizes';

export type PlanField = {
  readonly key: string;
  readonly title: string;
  readonly read: PlanRead;
  /** Stands inside the control; empty for a bare number or word. */
  readonly unit: string;
  readonly least: number;
  readonly most: number;
  readonly codes: readonly string[];
  readonly kinds: readonly Kind[];
  /** Part of one structure's design, and so not of what is assumed alike for a whole work order. */
  readonly ofDesign: boolean;
};

const ALL: readonly Kind[] = ['set', 'straighten', 'relevel'];
const SET: readonly Kind[] = ['set'];
const POLES: readonly Kind[] = ['set', 'straighten'];
const STRAIGHTEN: readonly Kind[] = ['straighten'];
const RELEVEL: readonly Kind[] = ['relevel'];

type Rest = Partial<Omit<PlanField, 'key' | 'title' | 'kinds'>>;

const field = (key: string, title: string, kinds: readonly Kind[], rest: Rest = {}): PlanField => ({
  key,
  title,
  kinds,
  read: 'number',
  unit: '',
  least: 0,
  most: 1e6,
  codes: [],
  ofDesign: false,
  ...rest,
});

const UNIT_WORDS: Readonly<Record<string, string>> = {
  ft: 'ft',
  in: 'in',
  'in-per-10ft': 'in/10 ft',
  'in-per-ft': 'in/ft',
};

/** A field that a record has too: title, bounds and codes are those of its schema. */
function ofRecord(record: Kind, key: string, kinds: readonly Kind[], rest: Rest = {}): PlanField {
  const meta = RECORD_FIELDS[record].get(key);
  const read = meta?.read === 'code' ? 'code' : meta?.read === 'length-ft' ? 'length-ft' : 'length-in';
  return field(key, meta?.title ?? key, kinds, {
    read,
    unit: UNIT_WORDS[meta?.unit ?? ''] ?? '',
    least: meta?.minimum ?? 0,
    most: meta?.maximum ?? 1e6,
    codes: meta?.allowed ?? [],
    ...rest,
  });
}

const DESIGN = { ofDesign: true } as const;
const inches = (least: number, most: number): Rest => ({ read: 'length-in', unit: 'in', least, most });

/** Every field of the planner, in the order in which it is asked. */
export const PLAN_FIELDS: readonly PlanField[] = [
  field('kind', 'Kind of work', ALL, { read: 'code', codes: ALL, ...DESIGN }),
  field('name', 'Structure', ALL, { read: 'text', ...DESIGN }),
  ofRecord('set', 'poleLengthFt', POLES, DESIGN),
  ofRecord('set', 'poleClass', POLES, DESIGN),
  ofRecord('set', 'poleMaterial', POLES, DESIGN),
  ofRecord('set', 'poleSection', POLES, DESIGN),
  ofRecord('set', 'buttEnd', SET, DESIGN),
  ofRecord('set', 'wallIn', SET, DESIGN),
  ofRecord('set', 'girthGroundLineIn', POLES, DESIGN),
  ofRecord('set', 'diameterGroundLineIn', POLES, DESIGN),
  ofRecord('set', 'girthButtIn', SET, DESIGN),
  ofRecord('set', 'diameterButtIn', SET, DESIGN),
  ofRecord('set', 'ground', SET, DESIGN),
  ofRecord('set', 'rockFromFt', SET),
  field('designFt', 'Embedment by design', SET, {
    read: 'length-ft',
    unit: 'ft',
    least: 0.5,
    most: 60,
    ...DESIGN,
  }),
  ofRecord('set', 'embedmentFt', POLES, DESIGN),
  field('augersIn', 'Augers on the truck', SET, { read: 'sizes', unit: 'in', least: 4, most: 144 }),
  field('boreIn', 'Bore', SET, { ...inches(4, 144), ...DESIGN }),
  field('taperIn', 'Bore narrower at the bottom by', SET, inches(0, 48)),
  field('overDigFt', 'Over-dig', SET, { read: 'length-ft', unit: 'ft', least: 0, most: 20 }),
  ofRecord('set', 'bedMaterial', SET),
  field('waterIn', 'Water standing in the bore', POLES, { ...inches(0, 720), ...DESIGN }),
  field('leanInPer10Ft', 'Lean now', STRAIGHTEN, { ...inches(0, 60), unit: 'in/10 ft' }),
  field('leanAfterInPer10Ft', 'Lean to be left', STRAIGHTEN, { ...inches(0, 60), unit: 'in/10 ft' }),
  ofRecord('straighten', 'gapAtGradeIn', STRAIGHTEN, DESIGN),
  ofRecord('straighten', 'gapAtDepthIn', STRAIGHTEN, DESIGN),
  ofRecord('straighten', 'gapDepthFt', STRAIGHTEN),
  ofRecord('straighten', 'gapWidthIn', STRAIGHTEN, DESIGN),
  ofRecord('relevel', 'padLengthIn', RELEVEL),
  ofRecord('relevel', 'padWidthIn', RELEVEL),
  ofRecord('relevel', 'openingLengthIn', RELEVEL),
  ofRecord('relevel', 'openingWidthIn', RELEVEL),
  field('slopeAlongInPerFt', 'Slope now, along', RELEVEL, { ...inches(-12, 12), unit: 'in/ft' }),
  field('slopeAcrossInPerFt', 'Slope now, across', RELEVEL, { ...inches(-12, 12), unit: 'in/ft' }),
  field('liftIn', 'Lift at the highest corner', RELEVEL, inches(0, 24)),
  ofRecord('relevel', 'gap1In', RELEVEL, DESIGN),
  ofRecord('relevel', 'gap2In', RELEVEL, DESIGN),
  ofRecord('relevel', 'gap3In', RELEVEL, DESIGN),
  ofRecord('relevel', 'gap4In', RELEVEL, DESIGN),
  field('product', 'Foam', ALL, { read: 'text' }),
  field('kitsFt3', 'Kit sizes to choose from', ALL, { read: 'sizes', unit: 'ft³', least: 0.01, most: 100 }),
  field('tempF', 'Temperature of the components', ALL, { unit: '°F', least: -60, most: 250 }),
  field('allowancePct', 'Allowance over the void', ALL, { unit: '%', least: 0, most: 300 }),
  field('sparePct', 'Spare kits of the order', ALL, { unit: '%', least: 0, most: 300 }),
  field('tolBoreIn', 'Bore, either way', SET, inches(0, 24)),
  field('tolPoleIn', 'Pole, in diameter', POLES, inches(0, 24)),
  field('tolDepthIn', 'Depth, either way', POLES, inches(0, 36)),
  field('tolGapIn', 'Gaps, either way', ['straighten', 'relevel'], inches(0, 12)),
  field('fromFt', 'Table from', SET, { read: 'length-ft', unit: 'ft', least: 1, most: 60 }),
  field('toFt', 'to', SET, { read: 'length-ft', unit: 'ft', least: 1, most: 60 }),
  field('stepFt', 'in steps of', SET, { read: 'length-ft', unit: 'ft', least: 0.25, most: 10 }),
];

const BY_KEY: ReadonlyMap<string, PlanField> = new Map(PLAN_FIELDS.map((one) => [one.key, one]));

export function planField(key: string): PlanField | null {
  return BY_KEY.get(key) ?? null;
}

/** What stands in a field before anybody types; a blank one is either not needed or assumed in the open (`assumptions.ts`). */
export const PLAN_DEFAULTS: Readonly<Record<string, string>> = {
  kind: 'set',
  poleLengthFt: '40',
  poleClass: '4',
  poleMaterial: 'southern-pine',
  ground: 'soil',
  augersIn: '16, 18, 20, 24, 30, 36',
};
