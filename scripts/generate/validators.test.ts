import { describe, expect, test } from 'vitest';
import { validateProduct, validateRecord, validateStandard } from '#shared/generated/validators.mjs';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';

const place = { latitude: 44.5, longitude: -93.2 };
const set = {
  structureNumber: '1042',
  poleLengthFt: 40,
  poleClass: '4',
  poleMaterial: 'southern-pine',
  boreTopIn: 20,
  boreDepthFt: 6,
  ground: 'soil',
  embedmentFt: 6,
  foamTopBelowGradeIn: 0,
  waterIn: 0,
  leanInPer10Ft: 0.2,
  boredAt: '2026-04-14T09:05',
  setAt: '2026-04-14T10:24',
  ...place,
};
const straighten = {
  structureNumber: '77',
  poleMaterial: 'southern-pine',
  girthGroundLineIn: 35,
  gapAtGradeIn: 4,
  gapDepthFt: 4,
  waterIn: 0,
  pulledAt: '2026-04-14T09:05',
  releasedAt: '2026-04-14T10:24',
  ...place,
};

const faults = (values: Record<string, unknown>, kind: 'set' | 'straighten' = 'set') =>
  validateRecord(kind, { ...(kind === 'set' ? set : straighten), ...values })
    .map(({ field, keyword }) => `${field} ${keyword}`)
    .sort();

describe('a set record', () => {
  test('whole', () => {
    expect(faults({})).toEqual([]);
    expect(faults({ waterIn: 'not-measured', leanInPer10Ft: 'not-measured', letGoAt: 'not-yet' })).toEqual(
      [],
    );
    expect(faults({ loadAt: 'not-by-us', hardwareAt: '2026-04-14T12:00' })).toEqual([]);
  });

  test.each([
    ['soil over rock needs the rock’s depth', { ground: 'soil-over-rock' }, ['rockFromFt required']],
    ['a bed needs its material', { bedFt: 0.5 }, ['bedMaterial required']],
    ['a bed of nothing', { bedFt: 0.5, bedMaterial: 'none' }, ['bedMaterial enum']],
    ['a bed needs its height', { bedMaterial: 'native' }, ['bedFt required']],
    ['no bed', { bedFt: 0, bedMaterial: 'none' }, []],
    ['an open butt needs its wall', { buttEnd: 'open' }, ['wallIn required']],
    ['a bell needs its height', { bellIn: 30 }, ['bellHeightFt dependentRequired']],
    ['a lean over 0.25 needs its direction', { leanInPer10Ft: 0.3 }, ['leanAzimuthDeg required']],
    ['a rake likewise', { designRakeInPer10Ft: 2 }, ['designRakeAzimuthDeg required']],
    [
      'steel is taped at both ends',
      { poleMaterial: 'steel', poleClass: 'other' },
      ['diameterButtIn required', 'diameterGroundLineIn required'],
    ],
    [
      'steel taped by girth and diameter',
      { poleMaterial: 'steel', girthButtIn: 40, diameterGroundLineIn: 11 },
      [],
    ],
    [
      'a length that the table lacks is taped',
      { poleLengthFt: 42 },
      ['girthButtIn required', 'girthGroundLineIn required'],
    ],
    [
      'a class that the table lacks, taped',
      { poleClass: 'H6', girthButtIn: 60, diameterGroundLineIn: 17 },
      [],
    ],
    ['out of range', { boreTopIn: 1000, waterIn: -1 }, ['boreTopIn maximum', 'waterIn minimum']],
    [
      'words that are not allowed',
      { waterIn: 'none', boreDepthFt: 'deep', letGoAt: 'later' },
      ['boreDepthFt type', 'letGoAt pattern', 'waterIn enum'],
    ],
    ['unknown code', { ground: 'sand' }, ['ground enum']],
    [
      'not a clock',
      { setAt: '4/14/2026', boredAt: '2026-13-14T09:05' },
      ['boredAt pattern', 'setAt pattern'],
    ],
    [
      'unknown field',
      { constructor: 1, boreTop: 20 },
      ['boreTop additionalProperties', 'constructor additionalProperties'],
    ],
    ['not a number', { boreTopIn: Number.NaN }, ['boreTopIn type']],
  ])('%s', (_what, values, expected) => {
    expect(faults(values)).toEqual(expected);
  });

  test('nothing at all names every field that is due', () => {
    expect(validateRecord('set', {}).map(({ field }) => field)).toEqual([
      'structureNumber',
      'poleLengthFt',
      'poleClass',
      'poleMaterial',
      'boreTopIn',
      'boreDepthFt',
      'ground',
      'embedmentFt',
      'foamTopBelowGradeIn',
      'waterIn',
      'leanInPer10Ft',
      'boredAt',
      'setAt',
      'latitude',
      'longitude',
    ]);
    expect(validateRecord('set', null)).toEqual([
      { field: null, keyword: 'type', params: { type: 'object' } },
    ]);
  });
});

test('a straightened pole is taped at ground line unless the table has it', () => {
  const untaped = { girthGroundLineIn: undefined };
  expect(faults({}, 'straighten')).toEqual([]);
  expect(faults(untaped, 'straighten')).toEqual(['girthGroundLineIn required']);
  expect(faults({ ...untaped, poleLengthFt: 40, poleClass: '4' }, 'straighten')).toEqual([]);
  expect(faults({ ...untaped, poleMaterial: 'steel' }, 'straighten')).toEqual([
    'diameterGroundLineIn required',
  ]);
});

test('no more kits wasted than mixed', () => {
  const pour = {
    structureNumber: '1042',
    pourNumber: 1,
    pouredAt: '2026-04-14T10:24',
    product: 'EP-15',
    lot: 'A1',
    kitFt3: 4,
    quantity: 2,
    componentATempF: 72,
    componentBTempF: 'not-measured',
  };
  expect(validateRecord('pour', { ...pour, wastedQuantity: 2 })).toEqual([]);
  expect(validateRecord('pour', { ...pour, wastedQuantity: 3 })).toMatchObject([
    { field: 'wastedQuantity', keyword: 'maximum', params: { limit: 2 } },
  ]);
  expect(validateRecord('pour', { ...pour, quantity: 1.5 })).toMatchObject([
    { field: 'quantity', keyword: 'type' },
  ]);
});

describe('the demo', () => {
  test('standard and product hold to their schemas', () => {
    expect(validateStandard(DEMO_STANDARD)).toEqual([]);
    expect(validateProduct(DEMO_PRODUCT)).toEqual([]);
  });

  test('a rule’s faults are named by their path', () => {
    const rules = {
      ...DEMO_STANDARD.rules,
      'fill-short': { on: true, severity: 'query', params: { ratio: 1 } },
    };
    expect(validateStandard({ ...DEMO_STANDARD, rules }).map(({ field }) => field)).toEqual([
      'rules.fill-short.params.leastRatio',
      'rules.fill-short.params.ratio',
    ]);
  });

  test('has every rule, and brand-differs alone is off', () => {
    const settings = Object.entries(DEMO_STANDARD.rules);
    expect(settings.length).toBe(55);
    expect(settings.filter(([, { on }]) => !on).map(([code]) => code)).toEqual(['brand-differs']);
  });
});
