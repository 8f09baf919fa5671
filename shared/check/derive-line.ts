import { deriveRelevel } from '#shared/calc/derive-relevel.ts';
import { deriveSet } from '#shared/calc/derive-set.ts';
import { deriveStraighten } from '#shared/calc/derive-straighten.ts';
import {
  BORE_FIELDS,
  CLASS_FIELDS,
  GROUND_LINE_SIZE_FIELDS,
  POLE_FIELDS,
  SIZE_FIELDS,
  withoutClass,
} from '#shared/records/size-fields.ts';
import type { Derived, FieldValues, Kind } from '#shared/records/types.ts';
import type { LineEvent, Pour } from '#shared/rules/types.ts';
import type { Product, Standard } from '#shared/standard/types.ts';

type Line = {
  readonly kind: Kind;
  readonly values: FieldValues;
  readonly broken: ReadonlySet<string>;
  readonly pours: readonly Pour[];
  readonly events: readonly LineEvent[];
  readonly standard: Standard;
  readonly product: Product | null;
  readonly designDepthFt: number | null;
};

const DERIVE = { set: deriveSet, straighten: deriveStraighten, relevel: deriveRelevel };

const SPACE = [
  ...SIZE_FIELDS,
  'bellIn',
  'bellHeightFt',
  'boreDepthFt',
  'buttEnd',
  'wallIn',
  'bedMaterial',
  'bedFt',
];

/** What each void is made of. */
const VOID: Readonly<Record<Kind, readonly string[]>> = {
  set: [...SPACE, 'slopeRiseIn', 'foamTopBelowGradeIn'],
  straighten: [
    'gapAtGradeIn',
    'gapAtDepthIn',
    'gapDepthFt',
    'gapWidthIn',
    ...GROUND_LINE_SIZE_FIELDS,
    ...CLASS_FIELDS,
  ],
  relevel: [
    'padLengthIn',
    'padWidthIn',
    'openingLengthIn',
    'openingWidthIn',
    'gap1In',
    'gap2In',
    'gap3In',
    'gap4In',
  ],
};

/** A figure is not known where a reading behind it could not be read: the computations would take a blank for its default. */
const withoutBroken = (
  derived: Derived,
  { kind, values, events, broken }: Pick<Line, 'kind' | 'values' | 'events' | 'broken'>,
): Derived => {
  const any = (fields: readonly string[]): boolean => fields.some((field) => broken.has(field));
  // A pole that was taped has its sizes whatever its class was written down as.
  const anySize = (fields: readonly string[]): boolean => any(withoutClass(fields, { kind, values }));
  const noVoid = anySize(VOID[kind]) || events.some((event) => event.broken.has('foamTopBelowGradeIn'));
  const due = ['ground', 'rockFromFt', 'poleLengthFt', ...(values['ground'] === 'soil' ? [] : BORE_FIELDS)];
  return {
    ...derived,
    ...(noVoid ? { voidFt3: null, fillRatio: null, fillRatioU: null, worstReading: null } : {}),
    ...(kind === 'set' && anySize([...SPACE, 'waterIn', 'waterMeasured']) ? { waterWithPoleIn: null } : {}),
    ...(anySize([...SIZE_FIELDS, 'leastGapIn']) ? { leastAnnulusIn: null } : {}),
    ...(any(due) ? { dueFt: null } : {}),
    ...(anySize(POLE_FIELDS) ? { poleTaped: null } : {}),
  };
};

/** Kits whose number or product could not be read leave the placed volume open. */
const countable = (pours: readonly Pour[]): readonly Pour[] =>
  pours.map((pour) =>
    pour.broken.has('wastedQuantity') || pour.broken.has('product') ? { ...pour, quantity: null } : pour,
  );

/** Derived figures of a line; null where a reading is missing or could not be read. */
export const deriveLine = (line: Line): Derived =>
  withoutBroken(
    DERIVE[line.kind]({
      values: line.values,
      pours: countable(line.pours),
      standard: line.standard,
      product: line.product,
      designEmbedmentFt: line.designDepthFt,
      events: line.events.map((event) => event.values),
    }),
    line,
  );
