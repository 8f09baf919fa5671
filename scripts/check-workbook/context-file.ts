import { Ajv2020 } from 'ajv/dist/2020.js';
import { KINDS, type Kind } from '#shared/records/types.ts';
import type { KnownBeside } from '#shared/check/known-beside.ts';
import type { Product, Standard } from '#shared/standard/types.ts';
import { KNOWN_BESIDE, listOf } from './known-beside-schema.ts';
import { schemaFaults } from './schema-faults.ts';

/** A context file as it stands; a part left out is not known, and the rules that need it are skipped. */
export type ContextFile = KnownBeside & {
  readonly zone?: string;
  readonly asOf?: string;
  /** In any order; left out, the demo's. */
  readonly standards?: readonly {
    readonly id: string;
    readonly n: number;
    readonly effectiveOn: string;
    readonly body: Standard;
  }[];
  readonly products?: readonly Product[];
  readonly lots?: readonly {
    readonly product: string;
    readonly number: string;
    readonly expiresOn?: string | null;
    readonly status?: 'in-use' | 'held' | 'recalled';
    readonly history?: readonly { readonly on: string; readonly status: 'in-use' | 'held' | 'recalled' }[];
    /** Kits received of each size; left out, it is not known. */
    readonly received?: readonly { readonly kitFt3: number; readonly quantity: number }[];
  }[];
  readonly design?: readonly {
    readonly structureNumber: string;
    readonly kind?: Kind;
    readonly poleLengthFt?: number | null;
    readonly poleClass?: string | null;
    readonly poleMaterial?: string | null;
    readonly embedmentFt?: number | null;
    readonly latitude?: number | null;
    readonly longitude?: number | null;
  }[];
  /** GeoJSON polygon of the work order; null: it has none. */
  readonly area?: object | null;
};

const text = { type: 'string', minLength: 1 };
const number = { type: ['number', 'null'] };

const DAY = '^\\d{4}-\\d{2}-\\d{2}$';
const STATUS = { enum: ['in-use', 'held', 'recalled'] };
const SCHEMA = {
  type: 'object',
  additionalProperties: false,
  properties: {
    ...KNOWN_BESIDE,
    zone: text,
    asOf: text,
    standards: listOf({
      id: text,
      n: { type: 'integer', minimum: 1 },
      effectiveOn: { type: 'string', pattern: DAY },
      body: { type: 'object' },
    }),
    products: { type: 'array', items: { type: 'object' } },
    lots: {
      type: 'array',
      items: {
        type: 'object',
        required: ['product', 'number'],
        additionalProperties: false,
        properties: {
          product: text,
          number: text,
          expiresOn: { type: ['string', 'null'], pattern: DAY },
          status: STATUS,
          history: listOf({ on: { type: 'string', pattern: DAY }, status: STATUS }),
          received: listOf({
            kitFt3: { type: 'number', exclusiveMinimum: 0 },
            quantity: { type: 'integer', minimum: 0 },
          }),
        },
      },
    },
    design: {
      type: 'array',
      items: {
        type: 'object',
        required: ['structureNumber'],
        additionalProperties: false,
        properties: {
          structureNumber: text,
          kind: { enum: KINDS },
          poleLengthFt: number,
          poleClass: { type: ['string', 'null'] },
          poleMaterial: { type: ['string', 'null'] },
          embedmentFt: number,
          latitude: number,
          longitude: number,
        },
      },
    },
    area: { type: ['object', 'null'] },
  },
};

const validate = new Ajv2020({ allErrors: true, allowUnionTypes: true }).compile(SCHEMA);

/** What is wrong with a context file, each with the place in it; empty when it can be used. */
export const contextFaults = (value: unknown): readonly string[] =>
  validate(value) ? [] : schemaFaults(validate.errors);
