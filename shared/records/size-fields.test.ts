import { describe, expect, it } from 'vitest';
import { CLASS_FIELDS, isTaped, SIZE_FIELDS, withoutClass } from './size-fields.ts';
import type { Kind } from './types.ts';

describe('what a pole’s sizes hang on', () => {
  it.each<[string, Kind, Record<string, number>, boolean]>([
    ['taped at both ends', 'set', { girthGroundLineIn: 35, diameterButtIn: 12 }, true],
    ['taped at the butt alone', 'set', { girthButtIn: 38 }, false],
    ['taped at the ground line alone', 'set', { diameterGroundLineIn: 11 }, false],
    ['straightened, taped at the ground line', 'straighten', { girthGroundLineIn: 35 }, true],
    ['straightened, its gap’s width measured', 'straighten', { gapWidthIn: 11 }, true],
    ['straightened, nothing taped', 'straighten', {}, false],
  ])('%s', (_what, kind, values, taped) => {
    expect(isTaped(kind, values)).toBe(taped);
  });

  it('its class counts only where it was not taped', () => {
    const girths = { girthGroundLineIn: 35, girthButtIn: 38 };
    expect(withoutClass(SIZE_FIELDS, { kind: 'set', values: {} })).toEqual([...SIZE_FIELDS]);
    const left = withoutClass(SIZE_FIELDS, { kind: 'set', values: girths });
    expect(SIZE_FIELDS.filter((field) => !left.includes(field))).toEqual([...CLASS_FIELDS]);
  });
});
