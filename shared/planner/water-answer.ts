import { bisect } from '#shared/calc/bisect.ts';
import { boreVolume } from '#shared/calc/bore-profile.ts';
import { poleVolume } from '#shared/calc/pole-profile.ts';
import { setSpace } from '#shared/calc/set-space.ts';
import { waterWithPoleOf } from '#shared/calc/water-with-pole.ts';
import type { FieldValues } from '#shared/records/types.ts';
import type { Standard } from '#shared/standard/types.ts';

export type WaterAnswer = {
  /** As it stands in the open bore. */
  readonly openIn: number;
  readonly withPoleIn: number | null;
  /** Over the standard's limit with the pole in. Null: no limit, or not known. */
  readonly over: boolean | null;
};

/** Limit on water with the structure in, inches; null where that rule is off. */
export function waterLimitIn({ rules }: Standard): number | null {
  const rule = rules['water-deep'];
  return rule.on ? rule.params.limitIn : null;
}

/** What water standing so deep in the open bore comes to with the pole in. */
export function waterAnswer(values: FieldValues, openIn: number, standard: Standard): WaterAnswer {
  const withPoleIn = waterWithPoleOf(
    { ...values, waterIn: openIn, waterMeasured: 'open-bore' },
    standard.bedPorosity,
  );
  const limitIn = waterLimitIn(standard);
  return {
    openIn,
    withPoleIn,
    over: withPoleIn === null || limitIn === null ? null : withPoleIn > limitIn + 1e-9,
  };
}

/** The most water that may stand in the open bore, inches, so that with bed and pole in it stands at the limit; null where there is no limit or the bore or pole is not known. */
export function mostOpenWaterIn(values: FieldValues, standard: Standard): number | null {
  const limitIn = waterLimitIn(standard);
  const space = setSpace({ ...values, foamTopBelowGradeIn: 0 }, { foamFollowsGrade: false });
  if (limitIn === null || space === null) return null;
  const { bore, pole, bedFt, bedMaterial } = space;
  const depth = bore.depthFt;
  const level = Math.max(0, depth - limitIn / 12);
  const bedTop = Math.max(level, depth - Math.min(bedFt, depth));
  const porosity = bedMaterial === 'crushed-stone' ? standard.bedPorosity : 0;
  const room =
    (boreVolume(bore, bedTop, depth) - poleVolume(pole, bedTop, depth)) * porosity +
    (boreVolume(bore, level, bedTop) - poleVolume(pole, level, bedTop));
  if (room <= 0) return 0;
  return bisect((heightFt) => boreVolume(bore, depth - heightFt, depth), room, [0, depth]) * 12;
}

/** Depths of standing water that a crew meets, inches. */
const MET_IN = [1, 2, 3, 6, 12] as const;

/** The same for a row of depths: what to expect before it is measured. */
export function waterWhatIfs(values: FieldValues, standard: Standard): readonly WaterAnswer[] {
  const boreIn = typeof values['boreDepthFt'] === 'number' ? values['boreDepthFt'] * 12 : 0;
  return MET_IN.filter((openIn) => openIn <= boreIn).map((openIn) => waterAnswer(values, openIn, standard));
}
