import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { againstBand } from '../component-band.ts';
import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

export const foamHot: LineRule = {
  code: 'foam-hot',
  title: 'Foam hot',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'componentATempF',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: (line, _params, context) =>
    againstBand(line, context, ({ measured, product }) =>
      aboveLimit({ measured, limit: product.allowedF.highF, unit: 'degF' }),
    ),
  message: ({ measured, limit, params }) =>
    `Component ${say(params['component'], null)} of pour ${say(params['pourNumber'], null)} was at ${say(measured, 'degF')}; ${say(params['product'], null)} may not be poured above ${say(limit, 'degF')}.`,
  remedy: () => 'Check the reading; kits are kept in the shade and cooled before they are mixed.',
};
