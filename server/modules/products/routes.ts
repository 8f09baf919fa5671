import { defineRoute, type Route } from '#server/http/define-route.ts';
import productSchema from '#schemas/api/product.schema.json' with { type: 'json' };
import type { Product } from '#shared/generated/api-types.ts';
import { listProducts } from './list-products.ts';

export const productRoutes: readonly Route[] = [
  defineRoute<{ reply: { items: Product[] } }>({
    method: 'get',
    path: '/api/products',
    summary: 'Foam products with their newest version',
    permission: { action: 'read', subject: 'Product' },
    reply: {
      type: 'object',
      properties: { items: { type: 'array', items: productSchema } },
      required: ['items'],
    },
    handler: async ({ em }) => listProducts(em),
  }),
];
