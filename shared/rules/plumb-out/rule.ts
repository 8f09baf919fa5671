import { leanDeviation } from '#shared/calc/lean.ts';
import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { designRake, lastLean, unprovedDirection } from '../last-lean.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  limitInPer10Ft: {
    type: 'number',
    title: 'Greatest deviation from the design rake',
    'x-unit': 'in-per-10ft',
    default: 1,
    minimum: 0,
    maximum: 60,
  },
});
const OWN = { amount: 'leanInPer10Ft', azimuth: 'leanAzimuthDeg' };

export const plumbOut: LineRule = {
  code: 'plumb-out',
  title: 'Out of plumb',
  kinds: ['set'],
  scope: 'line',
  severity: 'nonconformity',
  field: OWN.amount,
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const reading = lastLean(line, OWN);
    if (!reading) return needNumbers(line, [OWN.amount]).missing ?? [];
    const rake = designRake(line);
    if (!rake) return [];
    const measured = leanDeviation(reading.lean, rake);
    if (measured === null) {
      return reading.lean.azimuthDeg === null ? [unprovedDirection(reading, OWN)] : [];
    }
    return aboveLimit({
      field: reading.amountField,
      source: reading.source,
      measured,
      limit: numberOf(params, schema, 'limitInPer10Ft'),
      unit: 'in-per-10ft',
      params: { lean: reading.lean.inPer10Ft, rake: rake.inPer10Ft, event: reading.event },
    });
  },
  message: ({ measured, limit, params }) =>
    params['rake'] === 0
      ? `The pole leans ${say(measured, 'in-per-10ft')}; ${say(limit, 'in-per-10ft')} is allowed.`
      : `The pole leans ${say(params['lean'], 'in-per-10ft')}, which is ${say(measured, 'in-per-10ft')} from the rake of ${say(params['rake'], 'in-per-10ft')} that the design asks for; ${say(limit, 'in-per-10ft')} is allowed.`,
  remedy: () =>
    'Check the lean of the axis (the mean of two opposite faces) and its direction; a pole that leans must be put right.',
};
