import { designOf } from '#shared/check/context-keys.ts';
import { structureKey } from '#shared/records/structure-key.ts';
import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import { atMost } from '../slack.ts';
import type { FindingDraft, LineRule } from '../types.ts';

const COMPARED = [
  ['poleLengthFt', 'length', 'ft'],
  ['poleClass', 'class', null],
  ['poleMaterial', 'material', null],
] as const;

const isSame = (measured: number | string, designed: number | string): boolean =>
  typeof measured === 'number' && typeof designed === 'number'
    ? atMost(Math.abs(measured - designed), 0)
    : structureKey(measured) === structureKey(designed);

export const designDiffers: LineRule = {
  code: 'design-differs',
  title: 'Not as designed',
  kinds: ['set'],
  scope: 'line',
  severity: 'query',
  field: 'poleLengthFt',
  needs: ['design'],
  paramsSchema: paramsSchema({}),
  check: (line, _params, context) => {
    const design = designOf(context, line);
    if (!design) return [];
    return COMPARED.flatMap(([field, what, unit]): FindingDraft[] => {
      const measured = line.values[field];
      const limit = design[field];
      if ((typeof measured !== 'number' && typeof measured !== 'string') || limit === null) return [];
      if (isSame(measured, limit)) return [];
      const both = typeof measured === 'number' && typeof limit === 'number';
      const margin = both ? -Math.abs(measured - limit) : null;
      return [{ field, part: field, measured, limit, margin, unit, params: { what } }];
    });
  },
  message: ({ measured, limit, unit, params }) =>
    `The pole set has the ${say(params['what'], null)} ${say(measured, unit)}; the work order asks for ${say(limit, unit)}.`,
  remedy: () => 'Correct what was written down, or answer who agreed to the other pole and why.',
};
