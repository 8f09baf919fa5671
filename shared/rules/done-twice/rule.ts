import { kindKey } from '#shared/records/structure-key.ts';
import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

export const doneTwice: LineRule = {
  code: 'done-twice',
  title: 'Done twice',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'structureNumber',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: (line, _params, { siblings }) => {
    if (line.broken.has('structureNumber')) return [];
    const approved = siblings?.has(kindKey(line.kind, line.structureNumber)) === true;
    const measured = line.occurrence + (approved ? 1 : 0);
    return measured > 1
      ? [{ measured, limit: 1, margin: 1 - measured, unit: 'count', params: { approved } }]
      : [];
  },
  message: ({ structureNumber, params, measured }) =>
    params['approved'] === true
      ? `Structure ${say(structureNumber, null)} already has an approved line of this kind in this batch.`
      : `Structure ${say(structureNumber, null)} stands ${say(measured, null)} times on this sheet.`,
  remedy: () => 'Leave one line a structure; later work on it belongs on the Events sheet.',
};
