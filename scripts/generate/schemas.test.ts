import { describe, expect, test } from 'vitest';
import { UNITS } from '#shared/units/convert.ts';
import { RECORD_SCHEMAS, readSchema, type Schema } from './schema-files.ts';

const READINGS = [
  'text',
  'length-ft',
  'length-in',
  'number',
  'integer',
  'temperature-f',
  'degrees',
  'code',
  'clock',
  'day',
];

type Properties = Readonly<Record<string, Schema>>;
const propertiesOf = async (name: string) =>
  (await readSchema(`records/${name}/v1.schema.json`)).properties as Properties;

describe.each(RECORD_SCHEMAS)('fields of %s', (name) => {
  test('have a title without unit, a hint, bounds, and say how they are read', async () => {
    const faults: string[] = [];
    for (const [field, schema] of Object.entries(await propertiesOf(name))) {
      const has = (key: string) => Object.hasOwn(schema, key);
      const bounded =
        (has('minimum') && has('maximum') && UNITS.some((unit) => unit === schema['x-unit'])) ||
        (has('minLength') && has('maxLength')) ||
        has('pattern') ||
        has('enum');
      const told = typeof schema.title === 'string' && typeof schema.description === 'string';
      if (
        !bounded ||
        !told ||
        !READINGS.includes(String(schema['x-read'])) ||
        /\(.*\)/.test(String(schema.title))
      )
        faults.push(field);
    }
    expect(faults).toEqual([]);
  });
});

// Each version of a schema stands alone, so that an old record keeps its own; what the kinds share must not drift apart.
test('fields that two kinds share are the same in both', async () => {
  const shared = [
    'structureNumber',
    'poleMaterial',
    'poleSection',
    'girthGroundLineIn',
    'designRakeInPer10Ft',
    'latitude',
    'longitude',
    'accuracyFt',
    'locateTicket',
    'locateFrom',
    'locateTo',
    'foreman',
    'notes',
  ];
  const [set, straighten, relevel] = await Promise.all(['set', 'straighten', 'relevel'].map(propertiesOf));
  const differing = shared.filter((field) =>
    [straighten, relevel].some(
      (kind) => kind?.[field] !== undefined && JSON.stringify(kind[field]) !== JSON.stringify(set?.[field]),
    ),
  );
  expect(differing).toEqual([]);
});
