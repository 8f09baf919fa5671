import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

/** Raised by the engine, once a field and cell, for whatever rule lacked the value; it has nothing to look at by itself. */
export const unprovedRule: LineRule = {
  code: 'unproved',
  title: 'Unproved',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'query',
  field: 'structureNumber',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: () => [],
  message: ({ params, measured }) =>
    measured === null
      ? `${say(params['title'], null)} was left blank, so what depends on it is not proven.`
      : `${say(params['title'], null)} says "${say(measured, null).replaceAll('-', ' ')}", so what depends on it is not proven.`,
  remedy: () =>
    'Fill it in if it is known; otherwise answer how it is otherwise known that the work is right.',
};
