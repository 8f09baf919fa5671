import type { Lean } from '#shared/calc/lean.ts';
import { numberOf } from '#shared/calc/values.ts';
import type { SourceRow } from '#shared/records/types.ts';
import { unproved } from './need.ts';
import type { FindingDraft, LineView } from './types.ts';

type Fields = { readonly amount: string; readonly azimuth: string };

export type LeanReading = {
  readonly lean: Lean;
  readonly amountField: string;
  readonly source: SourceRow;
  /** 1: the line's own reading; 2 …: what an event left. */
  readonly event: number;
};

const EVENT: Fields = { amount: 'leanInPer10Ft', azimuth: 'leanAzimuthDeg' };

/** The lean that the last event left, else the line's own; null where neither has a number, or its direction could not be read. */
export const lastLean = (line: LineView, own: Fields): LeanReading | null => {
  const last = line.events.findLast((event) => numberOf(event.values, EVENT.amount) !== null);
  const { values, broken, source } = last ?? line;
  const fields = last ? EVENT : own;
  const inPer10Ft = numberOf(values, fields.amount);
  if (inPer10Ft === null || broken.has(fields.azimuth)) return null;
  const lean = { inPer10Ft, azimuthDeg: numberOf(values, fields.azimuth) };
  return { lean, amountField: fields.amount, source, event: last?.event ?? 1 };
};

/** The rake that the design asks for, plumb where it asks for none; null where it could not be read. */
export const designRake = ({ values, broken }: LineView): Lean | null =>
  broken.has('designRakeInPer10Ft') || broken.has('designRakeAzimuthDeg')
    ? null
    : {
        inPer10Ft: numberOf(values, 'designRakeInPer10Ft') ?? 0,
        azimuthDeg: numberOf(values, 'designRakeAzimuthDeg'),
      };

/** The query for a direction without which two leans cannot be compared. */
export const unprovedDirection = ({ source, event }: LeanReading, own: Fields): FindingDraft =>
  unproved(event > 1 ? EVENT.azimuth : own.azimuth, { source });
