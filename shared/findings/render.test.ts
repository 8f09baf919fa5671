import { describe, expect, it } from 'vitest';
import { checkBatch } from '#shared/check/check-batch.ts';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import { batchOf, CLEAN_LINES, CLEAN_POURS } from '#shared/check/testing.ts';
import type { FieldValues } from '#shared/records/types.ts';
import { RULES } from '#shared/rules/registry.ts';
import { findingTitle, renderFinding } from './render.ts';
import type { Finding } from './types.ts';

const first = (values: FieldValues, pours: readonly FieldValues[] = CLEAN_POURS.set): Finding =>
  checkBatch(
    batchOf({ lines: [{ kind: 'set', values: { ...CLEAN_LINES.set, ...values } }], pours }),
    DEMO_CONTEXT,
  ).findings[0]!;

describe('renderFinding', () => {
  it.each([
    [
      'says measured and limit with units',
      first({ embedmentFt: 5.5, boreDepthFt: 5.5 }),
      'Embedment short',
      'The pole is set 5.5 ft deep; at least 6 ft is due. Uncertainty of the readings ± 0.08 ft (k = 2).',
    ],
    [
      'says when a shortfall is smaller than the uncertainty',
      // 8 ft³ in WR-01's void of 8.6701 ft³.
      first({}, CLEAN_POURS.set.slice(0, 1)),
      'Fill short',
      '8.00 ft³ of foam was placed for a void of 8.67 ft³: fill ratio 0.92, at least 1.00 is due. The difference of 0.08 is smaller than the uncertainty of the readings, ± 0.09 (k = 2).',
    ],
    [
      'quotes what stood in the cell',
      first({ ground: 'mud' }),
      'Not on the list',
      'Cell I4 (Ground) says "mud", which is not on the list for that column.',
    ],
    [
      'says on which side a value is out of range',
      first({ boreTopIn: 200 }),
      'Out of range',
      'Bore at top, 200 in, is above 144 in and cannot be.',
    ],
    [
      'says the condition',
      first({ ground: 'soil-over-rock' }),
      'Does not go together',
      'Rock from is not filled in; it is needed where the ground is soil over rock.',
    ],
    [
      'tells a word from a blank',
      first({ waterIn: 'not-measured' }),
      'Unproved',
      'Water says "not measured", so what depends on it is not proven.',
    ],
  ])('%s', (_name, finding, title, message) => {
    expect(renderFinding(finding)).toMatchObject({ title, message });
  });

  it('says what is expected in the cell', () => {
    expect(renderFinding(first({ boreTopIn: 200 })).remedy).toBe(
      'Write in cell G4 a length in inches, as 18, 18.5 or 18 1/2, from 4 in to 144 in.',
    );
  });

  it('has a title of its own for each rule', () => {
    const titles = RULES.map(({ code }) => findingTitle(code));
    expect(new Set(titles).size).toBe(RULES.length);
  });

  it('knows a notice of the reader, and says what it can of a code it does not know', () => {
    const finding = { ...first({ ground: 'mud' }), params: {} };
    expect(findingTitle('workbook-no-lines')).toBe('No lines');
    expect(
      renderFinding({ ...finding, code: 'some-later-rule', measured: 3, limit: 2, unit: 'in' }).message,
    ).toBe('Rule some-later-rule was not met: 3 in against 2 in.');
  });
});
