import { StateWord } from '#src/components/ui/state-word.tsx';
import type { StandardVersion } from '#shared/generated/api-types.ts';

export type Stand = 'draft' | 'coming' | 'in-force' | 'past';

/** Where a version stands on a day: the last published one whose day has come is in force. `all`: every version. */
export function standOf(
  one: StandardVersion,
  { all, today }: { all: readonly StandardVersion[]; today: string },
): Stand {
  if (one.state === 'draft') return 'draft';
  if (one.effectiveOn !== null && one.effectiveOn > today) return 'coming';
  const newest = all
    .filter((each) => each.state === 'published' && (each.effectiveOn ?? '') <= today)
    .toSorted((a, b) => (b.effectiveOn ?? '').localeCompare(a.effectiveOn ?? ''))[0];
  return newest === undefined || newest.n === one.n ? 'in-force' : 'past';
}

const WORDS = {
  draft: { glyph: 'dotted', word: 'draft' },
  coming: { glyph: 'info', word: 'published, not yet in force' },
  'in-force': { glyph: 'tick', word: 'in force' },
  past: { glyph: 'dotted', word: 'in force before' },
} as const;

export function StandardState({ stand }: { stand: Stand }) {
  return <StateWord {...WORDS[stand]} />;
}
