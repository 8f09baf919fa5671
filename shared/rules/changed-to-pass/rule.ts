import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

/** Raised by the engine, which alone knows what every other rule now says of the line. */
export const changedToPass: LineRule = {
  code: 'changed-to-pass',
  title: 'Changed to pass',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'query',
  field: 'structureNumber',
  needs: ['previous'],
  paramsSchema: paramsSchema({}),
  check: () => [],
  message: ({ measured, params }) => {
    const now = measured === null ? 'was left out' : `was changed to "${say(measured, 'clock')}"`;
    const more =
      Number(params['changed']) > 1
        ? `, one of ${say(params['changed'], 'count')} measured values that were,`
        : '';
    return `${say(params['title'], null)} said "${say(params['before'], 'clock')}" at an earlier check and ${now}${more} since; "${say(params['ruleTitle'], null)}" was found then and is not found any more.`;
  },
  remedy: () =>
    'Say why the value was changed: what was misread or mistyped, and where the right value comes from.',
};
