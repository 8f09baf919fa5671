import { numberOf } from '#shared/calc/values.ts';
import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import type { FindingDraft, LineRule } from '../types.ts';

const WHEN = [
  ['leanBeforeInPer10Ft', 'before work'],
  ['leanAfterInPer10Ft', 'after release'],
] as const;

export const leanUnproved: LineRule = {
  code: 'lean-unproved',
  title: 'Lean unproved',
  kinds: ['straighten'],
  scope: 'line',
  severity: 'query',
  field: 'leanAfterInPer10Ft',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: ({ values, broken, events }) =>
    WHEN.flatMap(([field, when]): FindingDraft[] => {
      if (broken.has(field) || numberOf(values, field) !== null) return [];
      // What a later event left is the lean after.
      const later = events.some((event) => numberOf(event.values, 'leanInPer10Ft') !== null);
      if (field === 'leanAfterInPer10Ft' && later) return [];
      const said = values[field];
      const measured = typeof said === 'string' ? said : null;
      return [{ field, part: field, measured, limit: null, margin: null, unit: null, params: { when } }];
    }),
  message: ({ measured, params }) =>
    measured === null
      ? `The lean ${say(params['when'], null)} was left blank, so it is not proven that the pole was straightened.`
      : `The lean ${say(params['when'], null)} was not measured, so it is not proven that the pole was straightened.`,
  remedy: () =>
    'Fill the lean in if it was measured; otherwise measure it now, or answer how it is otherwise known.',
};
