import { say } from '#shared/findings/say.ts';
import { lotIndex, lotKey } from '../lot-index.ts';
import { paramsSchema } from '../params.ts';
import type { FindingDraft, LineRule } from '../types.ts';

export const lotUnknown: LineRule = {
  code: 'lot-unknown',
  title: 'Lot unknown',
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
      const { lot, product } = pour;
      if (lot === null || product === null || known.has(lotKey(product, lot))) return [];
      const part = `event ${pour.event} pour ${pour.pourNumber ?? '?'} ${product} ${lot}`;
      return [
        {
          source: pour.source,
          part,
          measured: lot,
          limit: null,
          margin: null,
          unit: null,
          params: { product },
        },
      ];
    });
  },
  message: ({ measured, params }) =>
    `Lot ${say(measured, null)} of ${say(params['product'], null)} is not a lot that the owner knows.`,
  remedy: () =>
    'Write the lot number as it stands on the kit; if it is right, the owner must receive the lot first.',
};
