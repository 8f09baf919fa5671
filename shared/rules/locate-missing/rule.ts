import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

export const locateMissing: LineRule = {
  code: 'locate-missing',
  title: 'No locate ticket',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'locateTicket',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: ({ values, broken }) => {
    const ticket = values['locateTicket'];
    if (broken.has('locateTicket') || (typeof ticket === 'string' && ticket.trim() !== '')) return [];
    return [{ measured: null, limit: null, margin: null, unit: null }];
  },
  message: () =>
    'No locate ticket is given: nothing shows that buried lines were marked before the ground was opened.',
  remedy: () => 'Write the number of the locate ticket that was in force that day.',
};
