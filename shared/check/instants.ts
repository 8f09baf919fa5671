import { toInstant } from '#shared/dates/wall-clock.ts';
import type { FieldValues } from '#shared/records/types.ts';

export type Clock = {
  /** UTC milliseconds of a wall-clock value; null for a word, a blank or a time that is not one real instant. */
  readonly at: (wall: unknown) => number | null;
  readonly instants: (values: FieldValues, fields: readonly string[]) => ReadonlyMap<string, number>;
};

/** Wall clocks of one zone; a batch repeats its times, and a zone's rules are slow to ask. */
export const clockOf = (zone: string): Clock => {
  const known = new Map<string, number | null>();
  const at = (wall: unknown): number | null => {
    if (typeof wall !== 'string') return null;
    const before = known.get(wall);
    if (before !== undefined) return before;
    const instant = toInstant(wall, zone);
    const ms = 'ms' in instant ? instant.ms : null;
    known.set(wall, ms);
    return ms;
  };
  const instants = (values: FieldValues, fields: readonly string[]): ReadonlyMap<string, number> => {
    const found = new Map<string, number>();
    for (const field of fields) {
      const ms = at(values[field]);
      if (ms !== null) found.set(field, ms);
    }
    return found;
  };
  return { at, instants };
};
