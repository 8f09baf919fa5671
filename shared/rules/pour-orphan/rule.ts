import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import type { BatchRule } from '../types.ts';

export const pourOrphan: BatchRule = {
  code: 'pour-orphan',
  title: 'Pour without a line',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'batch',
  severity: 'nonconformity',
  field: 'structureNumber',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: ({ orphans }) =>
    orphans.map((pour) => {
      const structure = pour.source.values['structureNumber'] ?? null;
      return {
        source: pour.source,
        part: [structure, pour.event, pour.pourNumber, pour.product, pour.lot, pour.kitFt3].join(' '),
        measured: structure === null ? null : String(structure),
        limit: null,
        margin: null,
        unit: null,
        params: { pourNumber: pour.pourNumber },
      };
    }),
  message: ({ measured, params }) =>
    `Pour ${say(params['pourNumber'], null)} is for structure ${say(measured, null)}, which has no line in this batch.`,
  remedy: () => 'Correct the structure number of the pour, or add the line that it belongs to.',
};
