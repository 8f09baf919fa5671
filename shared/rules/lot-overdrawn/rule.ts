import { productInForce } from '#shared/check/in-force.ts';
import { say } from '#shared/findings/say.ts';
import { lotKey } from '../lot-index.ts';
import { paramsSchema } from '../params.ts';
import type { BatchRule, FindingDraft, LineView, LotUse } from '../types.ts';
import { atMost } from '../slack.ts';

/** Kits by lot and size that this batch's lines poured. */
const usedHere = (lines: readonly LineView[]): ReadonlyMap<string, number> => {
  const used = new Map<string, number>();
  for (const { product, lot, kitFt3, quantity } of lines.flatMap((line) => line.pours)) {
    if (product === null || lot === null || kitFt3 === null || quantity === null) continue;
    const key = `${lotKey(product, lot)}|${kitFt3}`;
    used.set(key, (used.get(key) ?? 0) + quantity);
  }
  return used;
};

const sizesOf = (use: LotUse, here: ReadonlyMap<string, number>): readonly number[] => {
  const prefix = `${lotKey(use.product, use.number)}|`;
  const keys = [...here.keys()].filter((key) => key.startsWith(prefix));
  return keys.map((key) => Number(key.slice(prefix.length))).toSorted((a, b) => a - b);
};

/** Only sizes that this batch used: what others overdrew is no matter of it. */
const overdrawn = (use: LotUse, here: ReadonlyMap<string, number>): readonly FindingDraft[] =>
  sizesOf(use, here).flatMap((kitFt3): FindingDraft[] => {
    const mine = here.get(`${lotKey(use.product, use.number)}|${kitFt3}`) ?? 0;
    const size = use.sizes.find((one) => atMost(Math.abs(one.kitFt3 - kitFt3), 0));
    const { received, used, own } = size ?? { received: 0, used: 0, own: 0 };
    const total = used + mine;
    if (atMost(total, received)) return [];
    return [
      {
        field: null,
        part: `${lotKey(use.product, use.number)} ${kitFt3}`,
        measured: own + mine,
        limit: null,
        margin: null,
        unit: 'count',
        params: { product: use.product, lot: use.number, kitFt3 },
        ownerParams: { used: total, received, over: total - received },
      },
    ];
  });

export const lotOverdrawn: BatchRule = {
  code: 'lot-overdrawn',
  title: 'Lot overdrawn',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'batch',
  severity: 'query',
  field: 'lot',
  needs: ['lotUse'],
  paramsSchema: paramsSchema({}),
  check: ({ lines }, _params, { lotUse, products }) => {
    if (lotUse === null) return [];
    const here = usedHere(lines);
    return lotUse.flatMap((use) => {
      const kits = productInForce(products, use.product, null)?.body.kitsFt3 ?? [];
      // A size that the product lacks is the matter of `kit-unknown`.
      return overdrawn(use, here).filter(({ params }) => kits.includes(Number(params?.['kitFt3'])));
    });
  },
  message: ({ measured, params, ownerParams }) => {
    const { used, received } = ownerParams;
    const all = used === undefined ? '' : `: ${say(used, 'count')} used, ${say(received, 'count')} received`;
    return `Of lot ${say(params['lot'], null)} of ${say(params['product'], null)} more kits of ${say(params['kitFt3'], 'ft3')} were used over all batches than the owner received${all}. This contractor's batches use ${say(measured, 'count')} of them.`;
  },
  remedy: () =>
    'Check the lot, kit size and quantity of each pour; if they are right, the owner has a receipt to enter.',
};
