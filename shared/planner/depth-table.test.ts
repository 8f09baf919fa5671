import { expect, it } from 'vitest';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { depthTable, depthTableCsv } from './depth-table.ts';
import { PLAN_DEFAULTS } from './plan-fields.ts';
import { readPlan } from './read-plan.ts';

const CONTEXT = { standard: DEMO_STANDARD, product: DEMO_PRODUCT };
const TWELVE = {
  ...PLAN_DEFAULTS,
  augersIn: '12, 15, 18',
  diameterGroundLineIn: '12',
  diameterButtIn: '12',
  fromFt: '5',
  toFt: '6',
  stepFt: '1',
};

it('has a void and kits for each bore and depth', () => {
  const table = depthTable(readPlan(TWELVE), CONTEXT);
  expect(table.boresIn).toEqual([12, 15, 18]);
  expect(table.rows.map(({ depthFt }) => depthFt)).toEqual([5, 6]);
  const [none, narrow, fits] = table.rows[1]?.cells ?? [];
  expect(none).toEqual({ voidFt3: null, kits: null, fit: 'none' });
  // π/4·(15² − 12²)/144·6 = 2.6507; the gap is 1.5 in, under 2 in.
  expect(narrow?.voidFt3).toBeCloseTo(2.6507, 4);
  expect(narrow?.fit).toBe('narrow');
  // 5.8905 (charts print 6, common practice); WK1: 4 + 2.5.
  expect(fits?.voidFt3).toBeCloseTo(5.8905, 4);
  expect(fits?.kits?.kits).toEqual([4, 2.5]);
});

it('takes the pole from the class table at each depth', () => {
  // 40 ft class 4, 20 in bore, 6 ft: 9.1185 (WR-02).
  const table = depthTable(readPlan({ ...PLAN_DEFAULTS, augersIn: '20', fromFt: '6', toFt: '6' }), CONTEXT);
  expect(table.rows[0]?.cells[0]?.voidFt3).toBeCloseTo(9.1185, 4);
});

it('holds no more than a page, and says so', () => {
  const table = depthTable(readPlan({ ...PLAN_DEFAULTS, fromFt: '1', toFt: '60', stepFt: '0.25' }), CONTEXT);
  expect(table.rows.length).toBe(16);
  expect(table.faults[0]?.field).toBe('stepFt');
  expect(depthTable(readPlan({ ...PLAN_DEFAULTS, fromFt: '8', toFt: '5' }), CONTEXT).faults[0]?.field).toBe(
    'toFt',
  );
});

it('goes out as CSV', () => {
  const csv = depthTableCsv(depthTable(readPlan(TWELVE), CONTEXT), [['Pole', '40 ft class 4']]);
  expect(csv.split('\r\n').slice(0, 4)).toEqual([
    'Pole,40 ft class 4',
    '',
    'Bore (in),Depth (ft),Void (ft³),Need (ft³),Kits (ft³),Note',
    '12,5,,,,pole does not fit',
  ]);
  expect(csv).toContain('18,6,5.8905,6.4795,4 + 2.5,\r\n');
});
