import type { Plan } from '#shared/planner/plan-types.ts';
import { formatNumber } from '#shared/units/format-quantity.ts';

/** What blank fields are taken as, to stand in them: every assumption is in sight. */
export function assumedTexts({
  assumptions,
  boreIn,
  depthFt,
  dueFt,
  poleTaped,
  values,
  kind,
}: Plan): Readonly<Record<string, string>> {
  const say = (value: number) => formatNumber(value, { digits: 3 });
  const texts: Record<string, string> = {
    tempF: say(assumptions.tempF),
    allowancePct: say(assumptions.allowanceShare * 100),
    sparePct: say(assumptions.spareShare * 100),
    kitsFt3: assumptions.kitsFt3.map(say).join(', '),
    taperIn: say(assumptions.taperIn),
    overDigFt: say(assumptions.overDigFt),
    tolBoreIn: say(assumptions.tolBoreIn),
    tolPoleIn: say(poleTaped === true ? assumptions.tolPoleTapedIn : assumptions.tolPoleTableIn),
    tolDepthIn: say(assumptions.tolDepthIn),
    tolGapIn: say(assumptions.tolGapIn),
    leanAfterInPer10Ft: '0',
    gapAtDepthIn: '0',
    liftIn: '0',
    waterIn: '0',
    openingLengthIn: '0',
    openingWidthIn: '0',
    fromFt: '4',
    toFt: '10',
    stepFt: '0.5',
  };
  const add = (key: string, value: unknown) => {
    if (typeof value === 'number') texts[key] = say(value);
  };
  if (kind === 'set') {
    add('boreIn', boreIn);
    add('embedmentFt', dueFt ?? depthFt);
  } else
    for (const key of ['embedmentFt', 'gapDepthFt', 'gapAtGradeIn', 'gap1In', 'gap2In', 'gap3In', 'gap4In'])
      add(key, values[key]);
  return texts;
}
