import { describe, expect, it } from 'vitest';
import { checkBatch } from './check-batch.ts';
import { FULL_CONTEXT } from './full-context.ts';
import { shownFinding } from './shown-finding.ts';
import { cleanBatch } from './testing.ts';

describe('a finding as it is shown beside the server', () => {
  it('neither carries nor names what only the owner may see', () => {
    const register = new Map([['S-1', { recordNumber: 'R-000007', own: false }]]);
    const neighbours = [
      { structureNumber: 'X-9', latitude: 35.1, longitude: -97.4, accuracyFt: 5, own: false },
    ];
    const { findings } = checkBatch(cleanBatch({ set: {} }), { ...FULL_CONTEXT, register, neighbours });
    expect(findings.map(({ code }) => code).toSorted()).toEqual(['already-on-record', 'position-shared']);
    const shown = findings.map(shownFinding);
    expect(JSON.stringify(shown)).not.toMatch(/R-000007|X-9|ownerParams/u);
    for (const { message } of shown) expect(message).toMatch(/^\S.*\.$/u);
  });
});
