import { acrossCorners } from '#shared/calc/section.ts';
import { poleSizes } from '#shared/calc/pole-sizes.ts';
import { numberOf, textOf } from '#shared/calc/values.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';
import type { FieldValues } from '#shared/records/types.ts';
import type { Assumptions } from './assumptions.ts';
import { greatestGapIn, leastGapIn, type BoreChoice } from './choose-bore.ts';
import type { PlanContext, PlanNote } from './plan-types.ts';
import type { PlanFault } from './read-plan.ts';
import { sayFt, sayIn, type SayOptions } from './say-plan.ts';

const NOT_WOOD = new Set(['steel', 'concrete', 'composite']);

/** Why the pole's sizes are not known, beside the field that mends it. Nothing where they are. */
export function poleFaults(values: FieldValues, blank: (key: string) => boolean): PlanFault[] {
  // Whether the table has the pole does not hang on its depth, which may not be known yet.
  if (poleSizes({ embedmentFt: 1, ...values }) !== null) return openButtFaults(values);
  const lengthFt = numberOf(values, 'poleLengthFt');
  const poleClass = textOf(values, 'poleClass');
  const material = textOf(values, 'poleMaterial');
  const fault = (field: string, text: string): PlanFault[] => [{ field, text }];
  if (material === null)
    return blank('poleMaterial') ? fault('poleMaterial', 'Choose the material of the pole.') : [];
  if (NOT_WOOD.has(material))
    return fault(
      'diameterGroundLineIn',
      `A ${material} pole is in no class table: give its size at ground line and at the butt.`,
    );
  if (lengthFt === null)
    return blank('poleLengthFt') ? fault('poleLengthFt', 'Give the length of the pole.') : [];
  if (poleClass === null)
    return blank('poleClass') ? fault('poleClass', 'Choose the class of the pole, or tape it.') : [];
  return fault(
    'poleClass',
    `The class table has no ${material.replaceAll('-', ' ')} of ${sayFt(lengthFt)}, class ${poleClass}: tape it at ground line and at the butt.`,
  );
}

function openButtFaults(values: FieldValues): PlanFault[] {
  const open = textOf(values, 'buttEnd') === 'open' && numberOf(values, 'wallIn') === null;
  return open
    ? [{ field: 'wallIn', text: 'Give the wall: foam rises inside a pole that is open at the butt.' }]
    : [];
}

/** What is wrong with the ground's fields. */
export function groundFaults(values: FieldValues, blank: (key: string) => boolean): PlanFault[] {
  const ground = textOf(values, 'ground');
  if (ground === null && blank('ground'))
    return [{ field: 'ground', text: 'Choose the ground: the depth due depends on it.' }];
  if (ground === 'soil-over-rock' && numberOf(values, 'rockFromFt') === null && blank('rockFromFt'))
    return [{ field: 'rockFromFt', text: 'Give the depth at which rock begins.' }];
  return [];
}

/** What is wrong with the bore: none chosen, or narrower than the pole. */
export function boreFaults(values: FieldValues, choice: BoreChoice, assumptions: Assumptions): PlanFault[] {
  if (choice.from === 'no-augers')
    return [{ field: 'augersIn', text: 'List the augers on the truck, or give the bore.' }];
  const { boreIn } = choice;
  const sizes = poleSizes(values);
  if (boreIn === null) return [];
  if (assumptions.taperIn >= boreIn)
    return [
      {
        field: 'taperIn',
        text: `A bore of ${sayIn(boreIn)} cannot narrow by ${sayIn(assumptions.taperIn)}.`,
      },
    ];
  if (sizes === null) return [];
  const pole = acrossCorners(sizes.section, Math.max(sizes.groundLine.sizeIn, sizes.butt.sizeIn));
  const least = boreIn - assumptions.taperIn;
  if (pole < least) return [];
  return [
    {
      field: choice.from === 'typed' ? 'boreIn' : 'augersIn',
      text: `The pole is wider than the bore: ${sayIn(pole)} in ${sayIn(least)}.`,
    },
  ];
}

type Figures = {
  readonly choice: BoreChoice;
  readonly leastIn: number | null;
  readonly greatestIn: number | null;
  readonly dueFt: number | null;
  readonly depthFt: number | null;
  readonly taped: boolean | null;
};

/** What to know of a planned *set*: limits of the owner's standard, and how sure the figures are. */
export function setNotes(figures: Figures, { standard }: PlanContext, options: SayOptions = {}): PlanNote[] {
  const { choice, leastIn, greatestIn, dueFt, depthFt } = figures;
  const notes: PlanNote[] = [];
  const add = (tone: PlanNote['tone'], text: string) => void notes.push({ tone, text });
  const narrow = leastGapIn(standard);
  const wide = greatestGapIn(standard);
  if (choice.from === 'none-wide-enough')
    add(
      'nonconform',
      `No auger of the list leaves ${sayIn(narrow, options)} all round this pole; the widest is drawn.`,
    );
  else if (leastIn !== null && leastIn > 0 && leastIn < narrow - 1e-9)
    add(
      'nonconform',
      `The gap round the pole is ${sayIn(leastIn, options)}; the standard asks for ${sayIn(narrow, options)}. Take a wider auger.`,
    );
  if (greatestIn !== null && wide !== null && greatestIn > wide + 1e-9)
    add(
      'query',
      `The gap is ${sayIn(greatestIn, options)} at its widest; over ${sayIn(wide, options)} the inspector will ask why. A narrower auger needs less foam.`,
    );
  if (dueFt !== null && depthFt !== null && depthFt < dueFt - 1e-9)
    add('nonconform', `The depth planned is ${sayFt(depthFt, options)}; ${sayFt(dueFt, options)} is due.`);
  if (figures.taped === false)
    add(
      'note',
      'The pole is taken from the class table, which gives least sizes: the void is an upper estimate. Tape the pole to know better.',
    );
  return notes;
}

/** What the foam's temperature means for the plan. */
export function foamNotes(
  assumptions: Assumptions,
  { product }: PlanContext,
  { metric = false }: SayOptions = {},
): PlanNote[] {
  if (product === null) return [];
  const { tempF } = assumptions;
  const { allowedF, fullYieldF } = product;
  const say = (value: number) => formatQuantity(value, 'degF', { metric, digits: 0 });
  if (tempF < allowedF.lowF || tempF > allowedF.highF)
    return [
      {
        tone: 'nonconform',
        text: `${product.code} must not be mixed at ${say(tempF)}: its components are to be from ${say(allowedF.lowF)} to ${say(allowedF.highF)}.`,
      },
    ];
  if (tempF < fullYieldF.lowF || tempF > fullYieldF.highF)
    return [
      {
        tone: 'query',
        text: `At ${say(tempF)} ${product.code} rises less than its nominal yield; the kits allow for that.`,
      },
    ];
  return [];
}
