import { describe, expect, it } from 'vitest';
import { renderFinding } from '#shared/findings/render.ts';
import { describeRule } from '../describe-rule.ts';
import { changedToPass } from './rule.ts';

// What it finds is tested with the engine that raises it: shared/check/changed-to-pass.test.ts.
describeRule(changedToPass, { valid: [{ name: 'nothing by itself', line: {} }], invalid: [] });

const finding = {
  code: 'changed-to-pass',
  severity: 'query',
  kind: 'set',
  structureNumber: 'S-1',
  occurrence: 1,
  sheet: 'Set',
  row: 4,
  cell: 'H4',
  field: 'hardwareAt',
  limit: null,
  margin: null,
  unit: null,
  uncertainty: null,
  ownerParams: {},
  fingerprint: 'x',
} as const;
const params = {
  ruleTitle: 'Hardware early',
  title: 'First work',
  before: '2026-04-14T10:09',
  changed: 1,
};

describe('its sentence', () => {
  it('tells both values', () => {
    expect(renderFinding({ ...finding, measured: '2026-04-14T10:19', params }).message).toBe(
      'First work said "2026-04-14 10:09" at an earlier check and was changed to "2026-04-14 10:19" since; "Hardware early" was found then and is not found any more.',
    );
  });
  it('tells that it was left out, and that it is one of several', () => {
    expect(renderFinding({ ...finding, measured: null, params: { ...params, changed: 3 } }).message).toBe(
      'First work said "2026-04-14 10:09" at an earlier check and was left out, one of 3 measured values that were, since; "Hardware early" was found then and is not found any more.',
    );
  });
});
