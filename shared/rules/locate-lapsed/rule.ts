import { daysBetween } from '#shared/dates/calendar-day.ts';
import { say } from '#shared/findings/say.ts';
import { dayOpened } from '../ground-opened.ts';
import { unproved } from '../need.ts';
import { paramsSchema } from '../params.ts';
import type { FindingDraft, LineRule } from '../types.ts';

const ENDS = ['locateFrom', 'locateTo'] as const;

export const locateLapsed: LineRule = {
  code: 'locate-lapsed',
  title: 'Locate ticket not in force',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'locateTo',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: (line) => {
    const { values, broken } = line;
    const day = dayOpened(line);
    // Without a ticket its days do not matter: `locate-missing` says so.
    if (typeof values['locateTicket'] !== 'string' || day === null) return [];
    return ENDS.flatMap((field): readonly FindingDraft[] => {
      if (broken.has(field)) return [];
      const limit = values[field];
      if (typeof limit !== 'string') return [unproved(field)];
      const days = field === 'locateFrom' ? daysBetween(limit, day) : daysBetween(day, limit);
      if (days === null || days >= 0) return [];
      const params = { end: field === 'locateFrom' ? 'begins' : 'ended', days: -days };
      return [{ field, part: field, measured: day, limit, margin: days, unit: 'd', params }];
    });
  },
  message: ({ measured, limit, params }) =>
    `The ground was opened on ${say(measured, null)}; the locate ticket ${say(params['end'], null)} on ${say(limit, null)}.`,
  remedy: () => 'Check the ticket’s days and the day of work; name the ticket that was in force that day.',
};
