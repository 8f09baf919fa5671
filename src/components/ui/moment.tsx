import { formatDay, formatInstant } from '#src/lib/formats.ts';

/** An instant in the reader's own zone, or in the work order's when `zone` is given. */
export function Moment({ at, zone }: { at: string; zone?: string }) {
  return <time dateTime={at}>{formatInstant(at, zone)}</time>;
}

/** A calendar day `YYYY-MM-DD`: never an instant, so never shifted. */
export function Day({ on }: { on: string }) {
  return <time dateTime={on}>{formatDay(on)}</time>;
}
