import { say } from '#shared/findings/say.ts';
import { belowLimit } from '../against-limit.ts';
import { againstBand, celsiusHint } from '../component-band.ts';
import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

export const foamCold: LineRule = {
  code: 'foam-cold',
  title: 'Foam cold',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'componentATempF',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: (line, _params, context) =>
    againstBand(line, context, ({ measured, product, asCelsius }) =>
      belowLimit({
        ...(asCelsius ? { severity: 'query' as const } : {}),
        measured,
        limit: product.allowedF.lowF,
        unit: 'degF',
      }),
    ),
  message: ({ measured, limit, params }) =>
    `Component ${say(params['component'], null)} of pour ${say(params['pourNumber'], null)} was at ${say(measured, 'degF')}; ${say(params['product'], null)} may not be poured below ${say(limit, 'degF')}.`,
  remedy: (finding) =>
    `Check the reading and that it is in °F${celsiusHint(finding)}; kits are warmed before they are mixed.`,
};
