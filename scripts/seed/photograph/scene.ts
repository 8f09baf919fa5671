import type { Light } from './light.ts';
import type { Random } from './random.ts';

export const VIEWS = [
  'bore-depth',
  'water',
  'kits',
  'finish',
  'plumb',
  'brand',
  'before',
  'gap',
  'after',
  'level-after',
  'rework',
] as const;
export type View = (typeof VIEWS)[number];

/** What a drawing shows, from the record that it belongs to. */
export type Subject = {
  readonly view: View;
  readonly kind: 'set' | 'straighten' | 'relevel';
  readonly structureNumber: string;
  readonly boreDepthFt: number;
  readonly waterIn: number;
  readonly foamTopBelowGradeIn: number;
  readonly kits: readonly { readonly kitFt3: number; readonly quantity: number; readonly lot: string }[];
  /** degrees off plumb as the picture shows it; a little more than true, to be seen */
  readonly leanDeg: number;
  readonly gapIn: number;
  readonly pole: { readonly lengthFt: number; readonly poleClass: string };
};

export type Scene = (subject: Subject, random: Random, light: Light) => string;
