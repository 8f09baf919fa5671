import { leastAnnulusIn } from './annulus.ts';
import { dueDepthFt } from './due-depth.ts';
import { fillOf } from './fill.ts';
import { lastFoamTop } from './last-foam-top.ts';
import type { SourcedGroup } from './fill-uncertainty.ts';
import type { PourAmount } from './placed-volume.ts';
import { poleSizes } from './pole-sizes.ts';
import { setReadings } from './set-readings.ts';
import { setSpace, setVoid } from './set-space.ts';
import { waterWithPoleOf } from './water-with-pole.ts';
import type { Derived, FieldValues } from '#shared/records/types.ts';
import type { Product, Standard } from '#shared/standard/types.ts';

/** What a void is computed from. */
export type ReadInput = {
  readonly values: FieldValues;
  readonly standard: Standard;
  readonly events?: readonly FieldValues[] | undefined;
};
export type SpaceRead = { readonly voidFt3: number | null; readonly groups: readonly SourcedGroup[] };

export type DeriveInput = {
  readonly values: FieldValues;
  /** Pours of all events of the line. */
  readonly pours: readonly PourAmount[];
  readonly standard: Standard;
  readonly product: Product | null;
  /** The work order's depth, where it states one. */
  readonly designEmbedmentFt?: number | null;
  /** Rows of the Events sheet, in order: fill is all events' foam over the void to the last level. */
  readonly events?: readonly FieldValues[];
};

/** The void of a *set* record with the readings that it hangs on; null where a value that it needs is missing. */
export function setSpaceRead({ values, standard, events }: ReadInput): SpaceRead {
  const last = lastFoamTop(values, events ?? []);
  const space = setSpace(last, { foamFollowsGrade: standard.foamFollowsGrade });
  if (space === null) return { voidFt3: null, groups: [] };
  return { voidFt3: setVoid(space), groups: setReadings(last, space, standard) };
}

/** Derived figures of a *set* record. Total: a figure whose values are missing is null. */
export function deriveSet(input: DeriveInput): Derived {
  const { standard, product, pours } = input;
  const values = lastFoamTop(input.values, input.events ?? []);
  return {
    ...fillOf({ ...setSpaceRead(input), pours, product, standard }),
    dueFt: dueDepthFt({ values, standard, designEmbedmentFt: input.designEmbedmentFt ?? null }),
    waterWithPoleIn: waterWithPoleOf(values, standard.bedPorosity),
    leastAnnulusIn: leastAnnulusIn(values),
    poleTaped: poleSizes(values)?.taped ?? null,
  };
}
