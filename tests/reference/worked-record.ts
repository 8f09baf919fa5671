type Figure =
  | 'voidFt3'
  | 'placedFt3'
  | 'fillRatio'
  | 'fillRatioU'
  | 'dueFt'
  | 'waterWithPoleIn'
  | 'leastAnnulusIn'
  | 'planeTestIn';

type Values = Readonly<Record<string, string | number>>;

/** Kit size in ft³, quantity, temperature of both components (72 °F), kits wasted (none). */
export type PourRow = readonly [kitFt3: number, quantity: number, tempF?: number, wasted?: number];

/** What the computation needs of a record, not a whole one. */
export type WorkedRecord = {
  readonly id: string;
  readonly what: string;
  readonly kind: 'set' | 'straighten' | 'relevel';
  readonly values: Values;
  readonly pours: readonly PourRow[];
  readonly expected: Readonly<Partial<Record<Figure, number>>> & { readonly poleTaped: boolean | null };
};

export const set = (values: Values): Values => ({
  poleMaterial: 'southern-pine',
  ground: 'soil',
  foamTopBelowGradeIn: 0,
  waterIn: 0,
  ...values,
});
