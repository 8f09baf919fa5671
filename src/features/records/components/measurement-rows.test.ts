import { describe, expect, it } from 'vitest';
import { measurementGroups } from '#src/features/records/components/measurement-rows.ts';

const record = {
  kind: 'set',
  sheet: 'Set',
  values: {
    poleLengthFt: 40,
    boreTopIn: 18,
    hardwareAt: 'not-yet',
    setAt: '2026-04-14T10:42',
    poleMaterial: 'southern-pine',
  },
} as const;
const cells = {
  poleLengthFt: { address: 'C9', raw: '40' },
  boreTopIn: { address: 'O9', raw: '1 ft 6 in' },
  setAt: { address: 'AM9', raw: '2026-04-14 10:42' },
  boreDepthFt: { address: 'U9', raw: 'deep' },
  crewSize: { address: 'BA9', raw: '4' },
};

describe('measurements of a record', () => {
  const events = [
    {
      event: 2,
      values: { structureNumber: 'L-1', event: 2, foamTopBelowGradeIn: 0.5, letGoAt: 'not-by-us' },
    },
  ];
  const groups = measurementGroups({ record, cells, events }, false);
  const row = (field: string) => groups.flatMap((group) => group.rows).find((one) => one.field === field);

  it('names value, unit and cell, and what was written where it reads differently', () => {
    expect(row('poleLengthFt')).toMatchObject({ value: '40 ft', cell: 'Set!C9', written: null });
    expect(row('boreTopIn')).toMatchObject({ value: '18 in', written: '1 ft 6 in' });
    expect(row('setAt')).toMatchObject({ value: '14 Apr 2026, 10:42', written: null });
    expect(row('hardwareAt')).toMatchObject({ value: 'not yet', cell: null });
    expect(row('poleMaterial')?.value).toBe('southern pine');
  });

  it('never turns what cannot be read into a value', () => {
    expect(row('boreDepthFt')).toMatchObject({ value: 'cannot be read', written: 'deep', cell: 'Set!U9' });
  });

  it('tells each rework in a group of its own', () => {
    expect(groups.at(-1)?.rows.map((one) => [one.field, one.value])).toEqual([
      ['letGoAt', 'not by us'],
      ['foamTopBelowGradeIn', '0.5 in'],
    ]);
  });

  it('leaves out blank groups and keeps what no group knows', () => {
    expect(groups.map((group) => group.title)).toEqual([
      'Pole',
      'Bore',
      'Clock',
      'Other',
      'Rework or repair, event 2',
    ]);
    expect(row('crewSize')?.cell).toBe('Set!BA9');
  });
});
