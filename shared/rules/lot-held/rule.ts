import { say } from '#shared/findings/say.ts';
import { lotIndex, lotKey } from '../lot-index.ts';
import { lotDay, lotStatusOn } from '../lot-status.ts';
import { paramsSchema } from '../params.ts';
import { pourPart } from '../pour-part.ts';
import type { FindingDraft, LineRule, LotFact } from '../types.ts';

/** Held or recalled on the day of work; or recalled since, which speaks of the foam itself. */
const blocked = (
  lot: LotFact,
  day: string | null,
): { readonly status: string; readonly since: string | null; readonly later: boolean } | null => {
  const then = lotStatusOn(lot, day);
  if (then.status !== 'in-use') return { ...then, later: false };
  if (lot.status !== 'recalled') return null;
  return { status: lot.status, since: lot.history?.at(-1)?.on ?? null, later: true };
};

export const lotHeld: LineRule = {
  code: 'lot-held',
  title: 'Lot held or recalled',
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
      const fact = product === null || lot === null ? undefined : known.get(lotKey(product, lot));
      const found = fact && blocked(fact, lotDay(line, pour));
      if (!found) return [];
      const params = { product, lot, since: found.since, later: found.later };
      return [
        {
          source: pour.source,
          part: pourPart(pour),
          measured: found.status,
          limit: 'in-use',
          margin: null,
          unit: null,
          params,
        },
      ];
    });
  },
  message: ({ measured, params }) => {
    const since = params['since'] === null ? '' : ` since ${say(params['since'], null)}`;
    const lot = `Lot ${say(params['lot'], null)} of ${say(params['product'], null)}`;
    return params['later'] === true
      ? `${lot} was recalled after it was poured${params['since'] === null ? '' : ` (${say(params['since'], null)})`}.`
      : `${lot} was ${say(measured, null)}${since} when it was poured.`;
  },
  remedy: () =>
    'Check the lot on the label; if it is right, the owner decides what becomes of the structure.',
};
