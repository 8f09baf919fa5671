import type { DeriveInput, ReadInput, SpaceRead } from './derive-set.ts';
import { fillOf } from './fill.ts';
import type { SourcedGroup } from './fill-uncertainty.ts';
import { GAP_FIELDS, padVoid, padWedgeOf, type PadWedge } from './relevel-void.ts';
import type { Derived } from '#shared/records/types.ts';
import type { Standard } from '#shared/standard/types.ts';

/** The four gaps move together; pad and opening sizes are exact. */
function readings(pad: PadWedge, { uncertainty }: Standard): SourcedGroup[] {
  const moved = (by: number, only?: number) => {
    const [g1, g2, g3, g4] = pad.gapsIn;
    const to = (gap: number, at: number) => (only === undefined || only === at ? gap + by : gap);
    return padVoid({ ...pad, gapsIn: [to(g1, 0), to(g2, 1), to(g3, 2), to(g4, 3)] });
  };
  return [
    {
      source: 'gap',
      u: uncertainty.gapIn,
      shifted: (by) => moved(by),
      readings: GAP_FIELDS.map((field, at) => ({ field, shifted: (by) => moved(by, at) })),
    },
  ];
}

/** The void of a *re-level* record with the readings that it hangs on. */
export function relevelSpaceRead({ values, standard }: ReadInput): SpaceRead {
  const pad = padWedgeOf(values);
  return pad === null
    ? { voidFt3: null, groups: [] }
    : { voidFt3: padVoid(pad), groups: readings(pad, standard) };
}

/** Derived figures of a *re-level* record. Total: a figure whose values are missing is null. */
export function deriveRelevel(input: DeriveInput): Derived {
  const { pours, standard, product } = input;
  return {
    ...fillOf({ ...relevelSpaceRead(input), pours, product, standard }),
    dueFt: null,
    waterWithPoleIn: null,
    leastAnnulusIn: null,
    poleTaped: null,
  };
}
