import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { poleWords } from '#shared/units/pole-words.ts';

/** The pole of a record in the chosen units; a pad has none. */
export function Pole({ pole }: { pole: string | null }) {
  const metric = useUnitSystem() === 'metric';
  return pole === null ? '–' : poleWords(pole, { metric });
}
