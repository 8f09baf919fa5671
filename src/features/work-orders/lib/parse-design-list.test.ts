import { describe, expect, it } from 'vitest';
import { parseDesignList } from './parse-design-list.ts';

describe('a pasted design list', () => {
  it('reads rows of a sheet, skipping head and blank rows', () => {
    const { structures, faults } = parseDesignList(
      'Structure\tKind\tLength\n17-0401\tset\t40\t4\tsouthern-pine\tsoil\t6.0\t39.5\t-98.25\n\n17-0402\tre-level\n',
    );
    expect(faults).toEqual([]);
    expect(structures).toEqual([
      {
        structureNumber: '17-0401',
        kind: 'set',
        design: {
          poleLengthFt: 40,
          poleClass: '4',
          poleMaterial: 'southern-pine',
          ground: 'soil',
          embedmentFt: 6,
          latitude: 39.5,
          longitude: -98.25,
        },
      },
      { structureNumber: '17-0402', kind: 'relevel', design: {} },
    ]);
  });

  it('reads commas; a structure without a kind is to be set', () => {
    expect(parseDesignList('17-0403, , 45').structures).toEqual([
      { structureNumber: '17-0403', kind: 'set', design: { poleLengthFt: 45 } },
    ]);
  });

  it.each([
    ['17-1\tset\t4O', 'Row 1: “4O” for pole length, ft is no number from 1 to 200.'],
    ['17-1\tset\t0x28', 'Row 1: “0x28” for pole length, ft is no number from 1 to 200.'],
    ['17-1\tset\t\t\t\t\t\t91', 'Row 1: “91” for latitude is no number from -90 to 90.'],
    ['17-1\tlift', 'Row 1: “lift” is no kind of work; write set, straighten or relevel.'],
    ['\tset\t40', 'Row 1: the structure number is missing.'],
    ['17-1\tset\n17-1\tset', 'Row 2: 17-1 stands in row 1 already.'],
  ])('%j is a fault', (text, fault) => {
    expect(parseDesignList(text).faults[0]?.text).toBe(fault);
  });

  it('a value that cannot be read never becomes a number', () => {
    expect(parseDesignList('17-1\tset\t4O').structures[0]?.design).toEqual({});
  });
});
