import { structureKey } from '#shared/records/structure-key.ts';
import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

export const productMixed: LineRule = {
  code: 'product-mixed',
  title: 'Products mixed',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'query',
  field: 'product',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: ({ pours }) => {
    const first = new Map<string, (typeof pours)[number]>();
    for (const pour of pours) {
      const key = structureKey(pour.product);
      if (key !== '' && !first.has(key)) first.set(key, pour);
    }
    const [, second] = first.values();
    if (!second) return [];
    const products = [...first.keys()];
    return [
      {
        source: second.source,
        measured: products.length,
        limit: 1,
        margin: 1 - products.length,
        unit: 'count',
        params: { products },
      },
    ];
  },
  message: ({ params }) =>
    `Foam of more than one product was poured in one structure: ${say(params['products'], null)}.`,
  remedy: () =>
    'Correct the product of the pour; if two were used, say why and how the maker answers for the joint.',
};
