import { describe, expect, it } from 'vitest';
import { KINDS, type Kind } from '#shared/records/types.ts';
import { RULES } from '#shared/rules/registry.ts';
import type { CheckContext, DesignFact, PhotoFact } from '#shared/rules/types.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { checkBatch } from './check-batch.ts';
import { DEMO_CONTEXT } from './demo-context.ts';
import { FAILING_CONTEXT } from './failing-context.ts';
import type { Failing } from './failing-lines.ts';
import { FAILING_MEASURES } from './failing-measures.ts';
import { FAILING_TIMES } from './failing-times.ts';
import { batchOf, CLEAN_LINES, CLEAN_POURS } from './testing.ts';

/** Every rule once failing through the whole check, alone; the clean line is its passing side. Limits: the demo standard. */

const FAILING = [...FAILING_MEASURES, ...FAILING_TIMES, ...FAILING_CONTEXT];
const NUMBER: Readonly<Record<Kind, string>> = { set: 'S-1', straighten: 'S-2', relevel: 'P-1' };

const photo = (view: string): PhotoFact => ({ id: view, fileName: `${view}.jpg`, sha256: view, view });
const planned = (kind: Kind): DesignFact => ({
  structureNumber: NUMBER[kind],
  kind,
  poleLengthFt: kind === 'set' ? 40 : null,
  poleClass: kind === 'set' ? '4' : null,
  poleMaterial: kind === 'set' ? 'southern-pine' : null,
  embedmentFt: null,
  latitude: Number(CLEAN_LINES[kind]['latitude']),
  longitude: Number(CLEAN_LINES[kind]['longitude']),
});
const CONTEXT: CheckContext = {
  ...DEMO_CONTEXT,
  asOfMs: Date.UTC(2026, 4, 1),
  lots: [{ product: 'EP-15', number: 'L-100', expiresOn: '2026-04-14', status: 'in-use', history: [] }],
  lotUse: [
    {
      product: 'EP-15',
      number: 'L-100',
      sizes: DEMO_PRODUCT.kitsFt3.map((kitFt3) => ({ kitFt3, received: 10, used: 4, own: 1 })),
    },
  ],
  design: KINDS.map(planned),
  neighbours: [],
  area: 'none',
  photos: new Map(
    KINDS.map((kind) => [
      `${kind}|${NUMBER[kind]}|1`,
      DEMO_STANDARD.requiredViews[kind].filter((view) => view !== 'water').map(photo),
    ]),
  ),
  siblings: new Set(),
};

const batch = ({ kind = 'set', values = {}, pours = CLEAN_POURS[kind] }: Partial<Failing>) =>
  batchOf({ lines: [{ kind, values: { ...CLEAN_LINES[kind], ...values } }], pours });

describe('every rule through the check', () => {
  it.each(KINDS)('passes on the clean %s line with all of the context known', (kind) => {
    expect(checkBatch(batch({ kind }), CONTEXT)).toMatchObject({
      findings: [],
      skipped: [{ code: 'brand-differs', reason: 'off' }],
    });
  });

  it('has a failing line here', () => {
    expect(FAILING.map(({ code }) => code).toSorted()).toEqual(RULES.map(({ code }) => code).toSorted());
  });

  it.each(FAILING)('$code fails alone', ({ code, context, expected, ...parts }) => {
    const { findings, records } = checkBatch(batch(parts), { ...CONTEXT, ...context });
    expect(findings.map((finding) => finding.code)).toEqual([code]);
    expect(findings[0]).toMatchObject(expected);
    expect(records[0]?.ruleCodes).toEqual(findings[0]?.kind === null ? [] : [code]);
  });
});
