import { productInForce } from '#shared/check/in-force.ts';
import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import { atMost } from '../slack.ts';
import type { CheckContext, FindingDraft, LineRule, Pour } from '../types.ts';

const partOf = (pour: Pour): string =>
  `event ${pour.event} pour ${pour.pourNumber ?? '?'} ${pour.product} ${pour.kitFt3 ?? ''}`;

const checkPour = (pour: Pour, context: CheckContext, day: string | null): FindingDraft[] => {
  if (pour.product === null) return [];
  const product = productInForce(context.products, pour.product, day);
  const common = { source: pour.source, part: partOf(pour), margin: null };
  if (!product) {
    const limit = [...new Set(context.products.map((one) => one.code))].join(', ');
    return [
      { ...common, field: 'product', measured: pour.product, limit, unit: null, params: { what: 'product' } },
    ];
  }
  const { kitFt3 } = pour;
  if (kitFt3 === null) return [];
  const sizes = product.body.kitsFt3;
  if (sizes.some((size) => atMost(Math.abs(size - kitFt3), 0))) return [];
  const limit = sizes.join(', ');
  return [
    { ...common, measured: kitFt3, limit, unit: 'ft3', params: { what: 'kit', product: pour.product } },
  ];
};

export const kitUnknown: LineRule = {
  code: 'kit-unknown',
  title: 'Kit unknown',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'kitFt3',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: (line, _params, context) => line.pours.flatMap((pour) => checkPour(pour, context, line.workDay)),
  message: ({ measured, limit, params }) =>
    params['what'] === 'product'
      ? `The product ${say(measured, null)} is not one of the owner's products.`
      : `${say(params['product'], null)} has no kit of ${say(measured, 'ft3')}; its kits are ${say(limit, null)} ft³.`,
  remedy: ({ limit, params }) =>
    params['what'] === 'product'
      ? `Write the product as the list has it: ${say(limit, null)}.`
      : 'Write the kit size that stands on the label.',
};
