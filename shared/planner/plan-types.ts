import type { FieldValues, Kind } from '#shared/records/types.ts';
import type { Product, Standard } from '#shared/standard/types.ts';
import type { Assumptions } from './assumptions.ts';
import type { PlanFault } from './read-plan.ts';

/** What a plan is judged by. Product null: the void is known, the kits are not. */
export type PlanContext = { readonly standard: Standard; readonly product: Product | null };

/** A void from its tolerances, ft³. */
export type VoidRange = { readonly low: number; readonly likely: number; readonly high: number };

export type KitAnswer = {
  /** Nominal volume that the kits must have, ft³. */
  readonly needFt3: number;
  /** Kit sizes, largest first. */
  readonly kits: readonly number[];
  /** Nominal volume over the need, ft³. */
  readonly surplusFt3: number;
  /** Risen foam at the planned temperature, ft³. */
  readonly placedFt3: number;
};

export type RangeKits = {
  readonly low: KitAnswer | null;
  readonly likely: KitAnswer | null;
  readonly high: KitAnswer | null;
};

/** Something to know before the crew goes out. */
export type PlanNote = { readonly tone: 'nonconform' | 'query' | 'note'; readonly text: string };

export type Plan = {
  readonly kind: Kind;
  /** As a record would carry them: what the drawing and the computations are made from. */
  readonly values: FieldValues;
  readonly assumptions: Assumptions;
  readonly dueFt: number | null;
  /** Depth that the pole is set to, ft. */
  readonly depthFt: number | null;
  readonly boreIn: number | null;
  readonly leastAnnulusIn: number | null;
  readonly greatestAnnulusIn: number | null;
  readonly poleTaped: boolean | null;
  readonly voidFt3: VoidRange | null;
  readonly kits: RangeKits;
  readonly waterWithPoleIn: number | null;
  readonly faults: readonly PlanFault[];
  readonly notes: readonly PlanNote[];
};
