import { formatNumber } from '#shared/units/format-quantity.ts';
import type { Assumptions } from './assumptions.ts';
import type { PlanContext } from './plan-types.ts';
import type { PlanReading } from './read-plan.ts';

/** What a table was made from, so that the page says it when it is far from any screen: name and words. */
export function tableHead(
  { numbers, words }: PlanReading,
  { assumptions, context }: { readonly assumptions: Assumptions; readonly context: PlanContext },
): readonly (readonly [name: string, text: string])[] {
  const say = (value: number) => formatNumber(value, { digits: 2 });
  const length = numbers.get('poleLengthFt');
  const taped = ['girthGroundLineIn', 'diameterGroundLineIn', 'girthButtIn', 'diameterButtIn'].some((key) =>
    numbers.has(key),
  );
  const pole = [
    length === undefined ? 'length not given' : `${say(length)} ft`,
    words.has('poleClass') ? `class ${words.get('poleClass')}` : null,
    words.get('poleMaterial')?.replaceAll('-', ' ') ?? 'material not given',
    taped ? 'as taped' : 'by the class table, least sizes',
  ];
  const bed = words.get('bedMaterial')?.replaceAll('-', ' ') ?? 'none';
  return [
    ['Pole', pole.filter((part) => part !== null).join(', ')],
    [
      'Bore',
      `straight${assumptions.taperIn > 0 ? ` but ${say(assumptions.taperIn)} in narrower at the bottom` : ''}, over-dig ${say(assumptions.overDigFt)} ft, bed ${bed}, foam to grade`,
    ],
    [
      'Foam',
      `${context.product?.code ?? 'none'}, kits ${assumptions.kitsFt3.map((kit) => formatNumber(kit, { digits: 4 })).join(', ')} ft³, components at ${say(assumptions.tempF)} °F, ${say(assumptions.allowanceShare * 100)} % over the void`,
    ],
    ['Standard', context.standard.name],
  ];
}
