import { Ajv2020 } from 'ajv/dist/2020.js';
import schema from '#schemas/api/check-context.schema.json' with { type: 'json' };
import { isZone } from '#shared/dates/wall-clock.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import { KNOWN_BESIDE } from './known-beside-schema.ts';
import { schemaFaults } from './schema-faults.ts';
import { validateProduct, validateStandard } from '#shared/generated/validators.mjs';

// Formats are the server's to check; what a day or an instant is used for finds out by itself.
const ajv = new Ajv2020({ allErrors: true, allowUnionTypes: true, validateFormats: false });
/** As the server gives it, and what may be known beside that. */
const validate = ajv.compile({ ...schema, properties: { ...schema.properties, ...KNOWN_BESIDE } });

/** The reply of `GET /api/work-orders/:id/check-context`, kept as a file? Told by what a context file never has. */
export const isOrderContext = (value: unknown): boolean =>
  typeof value === 'object' && value !== null && 'workOrder' in value;

/** What is wrong with it, each with the place; empty when it can be used. */
export const orderContextFaults = (value: unknown): readonly string[] => {
  if (!validate(value)) return schemaFaults(validate.errors);
  const { zone, asOf, standards, products } = value as unknown as CheckContextData;
  return [
    ...(isZone(zone) ? [] : [`zone: "${zone}" is no IANA time zone`]),
    ...(Number.isFinite(Date.parse(asOf)) ? [] : [`asOf: "${asOf}" is no instant`]),
    ...standards.flatMap(({ body }, index) =>
      validateStandard(body).map(({ field, keyword }) => `standards/${index}/${field ?? ''}: ${keyword}`),
    ),
    ...products.flatMap(({ body }, index) =>
      validateProduct(body).map(({ field, keyword }) => `products/${index}/${field ?? ''}: ${keyword}`),
    ),
  ];
};
