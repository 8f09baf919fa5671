import { leanDeviation } from '#shared/calc/lean.ts';
import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { designRake, lastLean, unprovedDirection } from '../last-lean.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  limitInPer10Ft: {
    type: 'number',
    title: 'Greatest deviation left after release',
    'x-unit': 'in-per-10ft',
    default: 1,
    minimum: 0,
    maximum: 60,
  },
});
const OWN = { amount: 'leanAfterInPer10Ft', azimuth: 'leanAfterAzimuthDeg' };

export const leanLeft: LineRule = {
  code: 'lean-left',
  title: 'Lean left',
  kinds: ['straighten'],
  scope: 'line',
  severity: 'nonconformity',
  field: OWN.amount,
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const reading = lastLean(line, OWN);
    const rake = designRake(line);
    // A lean that is not recorded is the matter of `lean-unproved`.
    if (!reading || !rake) return [];
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
      ? `After release the pole still leans ${say(measured, 'in-per-10ft')}; ${say(limit, 'in-per-10ft')} is allowed.`
      : `After release the pole stands ${say(measured, 'in-per-10ft')} from the rake of ${say(params['rake'], 'in-per-10ft')} that the design asks for; ${say(limit, 'in-per-10ft')} is allowed.`,
  remedy: () =>
    'Check the lean after release and its direction; a pole that sprang back must be pulled and filled again.',
};
