import { daysBetween } from '#shared/dates/calendar-day.ts';
import { say } from '#shared/findings/say.ts';
import { lotIndex, lotKey } from '../lot-index.ts';
import { dayPoured } from '../lot-status.ts';
import { paramsSchema } from '../params.ts';
import { pourPart } from '../pour-part.ts';
import type { FindingDraft, LineRule } from '../types.ts';

export const lotExpired: LineRule = {
  code: 'lot-expired',
  title: 'Lot expired',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'lot',
  needs: ['lots'],
  paramsSchema: paramsSchema({}),
  check: (line, _params, { lots }) => {
    if (lots === null) return [];
    const known = lotIndex(lots);
    return line.pours.flatMap((pour): FindingDraft[] => {
      const { product, lot } = pour;
      const limit = product === null || lot === null ? null : known.get(lotKey(product, lot))?.expiresOn;
      const measured = dayPoured(line, pour);
      if (limit === null || limit === undefined || measured === null) return [];
      const days = daysBetween(measured, limit);
      if (days === null || days >= 0) return [];
      const params = { product, lot, days: -days };
      return [
        { source: pour.source, part: pourPart(pour), measured, limit, margin: days, unit: 'd', params },
      ];
    });
  },
  message: ({ measured, limit, params }) =>
    `Lot ${say(params['lot'], null)} of ${say(params['product'], null)} expired on ${say(limit, null)} and was poured on ${say(measured, null)}.`,
  remedy: () =>
    'Check the lot and its date on the label; foam past its date must be answered for, or the work done again.',
};
