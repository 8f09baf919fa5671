import { describe, expect, it } from 'vitest';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { draftBody, draftValues, limitFault, readLimit } from './draft-values.ts';
import { ruleChanges } from './rule-changes.ts';
import { ruleRows } from './rule-table.ts';

const BODY: Record<string, unknown> = { ...DEMO_STANDARD };

describe('the rules of a version', () => {
  it('carry title, unit and bounds of each limit', () => {
    const rows = ruleRows(BODY);
    expect(rows.find((row) => row.code === 'water-deep')).toEqual({
      code: 'water-deep',
      title: 'Water deep',
      severity: 'nonconformity',
      on: true,
      limits: [
        {
          key: 'limitIn',
          title: 'Deepest water with the structure in',
          unit: 'in',
          minimum: 0,
          maximum: 120,
          value: 2,
        },
      ],
    });
    // A wait is defined once for all the rules that have one.
    expect(rows.find((row) => row.code === 'hardware-early')?.limits[0]).toMatchObject({
      unit: 'min',
      value: 15,
    });
    expect(rows.find((row) => row.code === 'clock-order')?.limits).toEqual([]);
  });

  it('are none for a body of another shape', () => expect(ruleRows({})).toEqual([]));
});

describe('a draft', () => {
  const values = draftValues(ruleRows(BODY));

  it('left alone is the version it was made from', () => {
    expect(draftBody(BODY, values)).toEqual(BODY);
  });

  it('differs by what was typed, and says so', () => {
    const water = { on: true, severity: 'query', params: { limitIn: '1.5' } };
    const plumb = { on: false, severity: 'nonconformity', params: { limitInPer10Ft: '1' } };
    const body = draftBody(BODY, {
      ...values,
      rules: { ...values.rules, 'water-deep': water, 'plumb-out': plumb },
    });
    expect(ruleChanges(BODY, body).map(({ code, before, after }) => [code, before, after])).toEqual([
      [
        'water-deep',
        'nonconformity; Deepest water with the structure in 2 in',
        'query; Deepest water with the structure in 1.5 in',
      ],
      ['plumb-out', 'nonconformity; Greatest deviation from the design rake 1 in per 10 ft', 'off'],
    ]);
  });
});

describe('limits as typed', () => {
  it.each([
    ['2', 2],
    [' 1.5 ', 1.5],
    ['.25', 0.25],
    ['−3', -3],
    ['1,5', null],
    ['2 in', null],
    ['1e3', null],
    ['', null],
    ['Infinity', null],
  ])('%j', (text, value) => expect(readLimit(text)).toBe(value));

  it('stay in their bounds', () => {
    const bounds = { minimum: 0, maximum: 24 };
    expect([limitFault('24', bounds), limitFault('-1', bounds), limitFault('25', bounds)]).toEqual([
      null,
      'Not below 0.',
      'Not above 24.',
    ]);
    expect(limitFault('two', bounds)).toBe('Write a number, with a point for decimals.');
  });
});
