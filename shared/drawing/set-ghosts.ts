import type { BoreProfile } from '#shared/calc/bore-profile.ts';
import type { PoleProfile } from '#shared/calc/pole-profile.ts';
import { poleSizes } from '#shared/calc/pole-sizes.ts';
import { positiveOf } from '#shared/calc/values.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** A dashed outline in place of what was not measured, ft. It is a sign, not a size: what of it is known is said. */
export type Ghost = {
  readonly halfTopFt: number;
  readonly halfBottomFt: number;
  readonly depthFt: number;
  /** The depth is not known: it is open below. */
  readonly open: boolean;
  readonly knownWidth: boolean;
};
export type SetGhosts = { readonly bore: Ghost | null; readonly pole: Ghost | null };

const USUAL_DEPTH_FT = 5;

/** Ghosts of bore and pole where their readings do not suffice; null where they do. */
export function setGhosts(
  values: FieldValues,
  drawn: { bore: BoreProfile | null; pole: PoleProfile | null; dueFt: number | null },
): SetGhosts {
  const embedmentFt = positiveOf(values, 'embedmentFt');
  const boreDepthFt = positiveOf(values, 'boreDepthFt');
  const boreTopIn = positiveOf(values, 'boreTopIn');
  const sizes = poleSizes(values);
  return {
    bore: drawn.bore === null ? ghostBore() : null,
    pole: drawn.pole === null ? ghostPole() : null,
  };

  function ghostBore(): Ghost {
    const poleIn = sizes === null ? 12 : Math.max(sizes.groundLine.sizeIn, sizes.butt.sizeIn);
    const halfTopFt = (boreTopIn ?? poleIn + 8) / 24;
    return {
      halfTopFt,
      halfBottomFt: (positiveOf(values, 'boreBottomIn') ?? halfTopFt * 24) / 24,
      depthFt: boreDepthFt ?? embedmentFt ?? drawn.dueFt ?? USUAL_DEPTH_FT,
      open: boreDepthFt === null,
      knownWidth: boreTopIn !== null,
    };
  }

  function ghostPole(): Ghost {
    const widest = drawn.bore?.leastIn ?? boreTopIn;
    const usualIn = widest === null ? 12 : widest * 0.6;
    return {
      halfTopFt: (sizes?.groundLine.sizeIn ?? usualIn) / 24,
      halfBottomFt: (sizes?.butt.sizeIn ?? usualIn) / 24,
      depthFt: embedmentFt ?? Math.min(boreDepthFt ?? Infinity, drawn.dueFt ?? USUAL_DEPTH_FT) * 0.86,
      open: embedmentFt === null,
      knownWidth: sizes !== null,
    };
  }
}
