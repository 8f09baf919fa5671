import { KINDS } from '#shared/records/types.ts';
import { VIEWS } from '#shared/records/photo-views.ts';
import { RULES } from '#shared/rules/registry.ts';

const text = { type: 'string', minLength: 1 };
const number = { type: 'number' };
const known = (type: string) => ({ type: [type, 'null'] });
const count = { type: 'number', minimum: 0 };
const told = { type: ['number', 'string', 'null'] };
/** What a sheet's row said, by field. */
const values = { type: 'object', additionalProperties: { type: ['string', 'number', 'boolean', 'null'] } };
const HASH = '^[0-9a-f]{16}$';
const WALL = '^\\d{4}-\\d{2}-\\d{2}T\\d{2}:\\d{2}:\\d{2}$';

type Properties = Readonly<Record<string, object>>;

/** A list of objects that have all of `properties`, may have `others`, and nothing else. */
export const listOf = (properties: Properties, others: Properties = {}) => ({
  type: 'array',
  items: {
    type: 'object',
    required: Object.keys(properties),
    additionalProperties: false,
    properties: { ...properties, ...others },
  },
});

const ofLine = { kind: { enum: KINDS }, structureNumber: text };
const occurrence = { type: 'integer', minimum: 1 };
const own = { type: 'boolean' };
const view = { enum: VIEWS };
const facts = {
  type: ['object', 'null'],
  required: ['takenWall', 'takenAtMs', 'latitude', 'longitude', 'width', 'height', 'phash'],
  additionalProperties: false,
  properties: {
    takenWall: { ...known('string'), pattern: WALL },
    takenAtMs: known('number'),
    latitude: { ...known('number'), minimum: -90, maximum: 90 },
    longitude: { ...known('number'), minimum: -180, maximum: 180 },
    width: { ...known('integer'), minimum: 1 },
    height: { ...known('integer'), minimum: 1 },
    phash: { ...known('string'), pattern: HASH },
  },
};

/** The parts of shared/check/known-beside.ts `KnownBeside`, each to be left out where it is not known. */
export const KNOWN_BESIDE: Properties = {
  lotUse: listOf({
    product: text,
    number: text,
    sizes: listOf({
      kitFt3: { type: 'number', exclusiveMinimum: 0 },
      received: count,
      used: count,
      own: count,
    }),
  }),
  neighbours: listOf(
    { structureNumber: text, latitude: number, longitude: number, accuracyFt: count },
    { own },
  ),
  register: listOf({ structureKey: text, recordNumber: text }, { own }),
  photos: listOf({ ...ofLine, id: text, fileName: text, sha256: text, view }, { occurrence, facts }),
  otherPhotos: listOf({
    sha256: text,
    phash: { ...known('string'), pattern: HASH },
    view,
    structureNumber: text,
    batch: text,
    own,
  }),
  previous: listOf(
    {
      ...ofLine,
      code: { enum: RULES.map(({ code }) => code) },
      field: known('string'),
      measured: told,
      limit: told,
      unit: known('string'),
      values,
      pours: { type: 'array', items: values },
    },
    { occurrence },
  ),
  siblings: listOf(ofLine),
  ownOnly: {
    type: 'array',
    items: {
      enum: ['lots', 'lotUse', 'neighbours', 'register', 'photos', 'otherPhotos', 'siblings', 'previous'],
    },
  },
};
