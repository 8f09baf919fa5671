import type { LineView, LotFact, LotStatus, Pour } from './types.ts';

const DAY = /^\d{4}-\d{2}-\d{2}/;

/** Calendar day (wall clock) of a pour; null when its time is not known. */
const pourDay = (pour: Pour): string | null =>
  pour.pouredAt === null ? null : (DAY.exec(pour.pouredAt)?.[0] ?? null);

/** The day that counts for a pour's lot: the line's work day, for a later event the day it was poured. */
export const lotDay = (line: LineView, pour: Pour): string | null =>
  pour.event > 1 ? (pourDay(pour) ?? line.workDay) : (line.workDay ?? pourDay(pour));

/** The day on which foam of a lot was poured; the work day where the time of the pour is not known. */
export const dayPoured = (line: LineView, pour: Pour): string | null => pourDay(pour) ?? line.workDay;

/** How a lot stood on a day, and since when. Without dated events the status now has always been so. */
export const lotStatusOn = (
  lot: LotFact,
  day: string | null,
): { readonly status: LotStatus; readonly since: string | null } => {
  if (lot.history === undefined || day === null) return { status: lot.status, since: null };
  const last = lot.history.findLast((change) => change.on <= day);
  return { status: last?.status ?? 'in-use', since: last?.on ?? null };
};
