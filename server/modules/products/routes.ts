import { defineRoute, type Route } from '#server/http/define-route.ts';
import productSchema from '#schemas/api/product.schema.json' with { type: 'json' };
import saveProductBodySchema from '#schemas/api/save-product-body.schema.json' with { type: 'json' };
import type { Product, SaveProductBody } from '#shared/generated/api-types.ts';
import { listProducts, readProduct } from './list-products.ts';
import { saveProduct } from './save-product.ts';

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
  defineRoute<{ reply: Product }>({
    method: 'get',
    path: '/api/products/:id',
    summary: 'One foam product with its newest version',
    permission: { action: 'read', subject: 'Product' },
    reply: productSchema,
    handler: async ({ em, params }) => readProduct(em, params.id),
  }),
  defineRoute<{ body: SaveProductBody; reply: Product }>({
    method: 'post',
    path: '/api/products',
    summary: 'Enter a foam product, or its next version',
    permission: { action: 'create', subject: 'Product' },
    creates: true,
    body: saveProductBodySchema,
    reply: productSchema,
    handler: async ({ em, body, actor }) => readProduct(em, await saveProduct(em, { body, actor })),
  }),
];
