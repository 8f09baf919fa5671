import { poleSizes } from '#shared/calc/pole-sizes.ts';
import { setSpace, setVoid } from '#shared/calc/set-space.ts';
import type { FieldValues, Scalar } from '#shared/records/types.ts';
import type { Standard } from '#shared/standard/types.ts';
import type { Assumptions } from './assumptions.ts';
import type { VoidRange } from './plan-types.ts';

/** Least and greatest of a volume over every corner of its tolerances, with the likely one between; null where it cannot be computed. */
export function rangeOf(likely: number | null, corners: readonly (number | null)[]): VoidRange | null {
  if (likely === null || !Number.isFinite(likely)) return null;
  const known = corners.filter((corner): corner is number => corner !== null && Number.isFinite(corner));
  return { low: Math.min(likely, ...known), likely, high: Math.max(likely, ...known) };
}

type Shift = { readonly boreIn: number; readonly poleIn: number; readonly depthIn: number };

/** Void of a planned *set* record moved by so much: bore top and bottom together, both ends of the pole together, bore depth and embedment together. */
function shiftedVoid(
  values: FieldValues,
  sizes: { readonly groundLineIn: number; readonly buttIn: number },
  { shift, foamFollowsGrade }: { readonly shift: Shift; readonly foamFollowsGrade: boolean },
): number | null {
  const moved: Record<string, Scalar> = { ...values };
  for (const key of ['boreTopIn', 'boreBottomIn'])
    if (typeof moved[key] === 'number') moved[key] = Math.max(0, moved[key] + shift.boreIn);
  for (const key of ['boreDepthFt', 'embedmentFt'])
    if (typeof moved[key] === 'number') moved[key] = Math.max(0, moved[key] + shift.depthIn / 12);
  delete moved['girthGroundLineIn'];
  delete moved['girthButtIn'];
  moved['diameterGroundLineIn'] = sizes.groundLineIn + shift.poleIn;
  moved['diameterButtIn'] = sizes.buttIn + shift.poleIn;
  const space = setSpace(moved, { foamFollowsGrade });
  return space === null ? null : setVoid(space);
}

/** The void of a planned *set* record, ft³, low to high over its tolerances. A pole by the class table is at least as thick as it says. */
export function setVoidRange(
  values: FieldValues,
  assumptions: Assumptions,
  { foamFollowsGrade }: Standard,
): VoidRange | null {
  const sizes = poleSizes(values);
  const space = setSpace(values, { foamFollowsGrade });
  if (sizes === null || space === null) return null;
  const { tolBoreIn, tolDepthIn } = assumptions;
  const { taped } = sizes;
  const poles = taped
    ? [-assumptions.tolPoleTapedIn, assumptions.tolPoleTapedIn]
    : [0, assumptions.tolPoleTableIn];
  const ends = { groundLineIn: sizes.groundLine.sizeIn, buttIn: sizes.butt.sizeIn };
  const corners = [-tolBoreIn, tolBoreIn].flatMap((boreIn) =>
    poles.flatMap((poleIn) =>
      [-tolDepthIn, tolDepthIn].map((depthIn) =>
        shiftedVoid(values, ends, { shift: { boreIn, poleIn, depthIn }, foamFollowsGrade }),
      ),
    ),
  );
  return rangeOf(setVoid(space), corners);
}
