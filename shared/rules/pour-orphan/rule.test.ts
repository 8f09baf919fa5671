import { describe, expect, it } from 'vitest';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import { lineOf, pourOf, sourceRow } from '../testing.ts';
import { pourOrphan } from './rule.ts';

const batch = sourceRow('Batch', 1, {});
const stray = pourOf({ structureNumber: 'S-9', pourNumber: 2 });

describe('pour-orphan', () => {
  it('meets: every pour has a line', () => {
    const view = { lines: [lineOf({})], pours: [pourOf()], orphans: [], batch };
    expect(pourOrphan.check(view, {}, DEMO_CONTEXT)).toEqual([]);
  });

  it('finds: a pour of a structure without a line', () => {
    const view = { lines: [lineOf({})], pours: [pourOf(), stray], orphans: [stray], batch };
    expect(pourOrphan.check(view, {}, DEMO_CONTEXT)).toMatchObject([
      { measured: 'S-9', limit: null, margin: null, params: { pourNumber: 2 }, source: { sheet: 'Pours' } },
    ]);
  });
});
