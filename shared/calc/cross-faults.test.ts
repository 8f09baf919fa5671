import { describe, expect, it } from 'vitest';
import { crossFaults } from './cross-faults.ts';

const fieldsOf = (kind: string, value: unknown) => crossFaults(kind, value).map(({ field }) => field);
// The class table has southern pine of 40 ft in class 4, and no western red cedar of 33 ft in class 4.
const TABLED = { poleMaterial: 'southern-pine', poleLengthFt: 40, poleClass: '4' };
const UNKNOWN = { ...TABLED, poleMaterial: 'other-wood' };

describe('what a wood pole needs taped', () => {
  it.each([
    ['of the table', TABLED, []],
    ['that the table lacks', UNKNOWN, ['girthGroundLineIn', 'girthButtIn']],
    ['taped by diameter', { ...UNKNOWN, diameterGroundLineIn: 11, diameterButtIn: 12 }, []],
    ['its butt null', { ...UNKNOWN, girthGroundLineIn: 35, girthButtIn: null }, ['girthButtIn']],
    ['length left out: the schema asks for it', { poleMaterial: 'other-wood', poleClass: '4' }, []],
    ['class left out: the schema asks for it', { poleMaterial: 'other-wood', poleLengthFt: 40 }, []],
    ['of steel', { ...UNKNOWN, poleMaterial: 'steel' }, []],
    ['of no material', { poleLengthFt: 40, poleClass: '4' }, []],
  ])('set, %s', (_what, values, fields) => {
    expect(fieldsOf('set', values)).toEqual(fields);
  });

  it('straightened: at the ground line alone', () => {
    expect(fieldsOf('straighten', UNKNOWN)).toEqual(['girthGroundLineIn']);
  });
});

describe('kits wasted', () => {
  it.each([
    ['all of them', { quantity: 2, wastedQuantity: 2 }, []],
    ['more than there were', { quantity: 2, wastedQuantity: 2.5 }, ['wastedQuantity']],
    ['quantity not known', { quantity: null, wastedQuantity: 2 }, []],
    ['not said', { quantity: 2, wastedQuantity: null }, []],
  ])('%s', (_what, values, fields) => {
    expect(fieldsOf('pour', values)).toEqual(fields);
  });
});

describe('the cable opening of a pad', () => {
  it.each([
    ['as large as the pad', { padLengthIn: 40, openingLengthIn: 40 }, []],
    ['longer', { padLengthIn: 40, openingLengthIn: 40.5 }, ['openingLengthIn']],
    ['wider', { padWidthIn: 36, openingWidthIn: 37 }, ['openingWidthIn']],
    ['of a pad not measured', { padLengthIn: null, openingLengthIn: 12 }, []],
  ])('%s', (_what, values, fields) => {
    expect(fieldsOf('relevel', values)).toEqual(fields);
  });
});

it('is total on what is no record', () => {
  for (const value of [null, undefined, 'text', 3, []]) expect(crossFaults('set', value)).toEqual([]);
});
