import { coldestComponentF } from './placed-volume.ts';
import { strengthShare } from './strength-share.ts';
import type { Product } from '#shared/standard/types.ts';

export type PourAt = {
  readonly event: number;
  readonly pourNumber: number | null;
  readonly atMs: number | null;
  readonly componentATempF: number | null;
  readonly componentBTempF: number | null;
};
/** When something was done to the structure: UTC milliseconds. */
export type DoneAt = { readonly event: number; readonly field: string; readonly atMs: number };

export type StrengthAt = {
  readonly event: number;
  readonly field: string;
  /** Since the event's last pour. */
  readonly minutes: number;
  /** The coldest component of that pour. */
  readonly tempF: number;
  /** Estimated share of full strength, 0 to 1. Never a design value. */
  readonly share: number;
};

const MINUTE_MS = 60_000;
const UNUSED = { kitFt3: null, quantity: null, wastedQuantity: 0 };

/** The rows of the event's last pour, of two at one time that of the higher number; null without one, or where a time that could be later is not known. */
function lastPour(pours: readonly PourAt[], event: number) {
  const own = pours.filter((pour) => pour.event === event);
  let last: (PourAt & { readonly atMs: number }) | null = null;
  for (const pour of own) {
    const { atMs } = pour;
    if (atMs === null) return null;
    const later =
      last === null ||
      atMs > last.atMs ||
      (atMs === last.atMs && (pour.pourNumber ?? 0) > (last.pourNumber ?? 0));
    if (later) last = { ...pour, atMs };
  }
  if (last === null) return null;
  const { atMs, pourNumber } = last;
  return { atMs, rows: own.filter((pour) => pour.pourNumber === pourNumber) };
}

/** The estimated strength of the foam when each thing was done, by the clock of its event's last pour. */
export function strengthAt(
  done: readonly DoneAt[],
  { pours, product }: { readonly pours: readonly PourAt[]; readonly product: Product },
): readonly StrengthAt[] {
  return done.flatMap(({ event, field, atMs }) => {
    const last = lastPour(pours, event);
    const tempF = last && coldestComponentF(last.rows.map((row) => ({ ...UNUSED, ...row })));
    if (last === null || tempF === null) return [];
    const minutes = (atMs - last.atMs) / MINUTE_MS;
    return [{ event, field, minutes, tempF, share: strengthShare({ minutes, product, tempF }) }];
  });
}
