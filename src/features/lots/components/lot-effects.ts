import { counted } from '#src/lib/formats.ts';
import type { LotDetail } from '#shared/generated/api-types.ts';

export type BlockingType = 'held' | 'released' | 'recalled';

const STATES: readonly (readonly [LotDetail['uses'][number]['state'], string])[] = [
  ['on-record', 'on record'],
  ['approved', 'approved'],
  ['held', 'waiting for an engineer'],
  ['returned', 'returned'],
  ['undecided', 'undecided'],
  ['abandoned', 'abandoned'],
];

/** What a step will do, said before it is taken. */
export function effectsOf(lot: LotDetail, type: BlockingType): readonly string[] {
  const said = [whereItWent(lot)];
  if (type === 'released') {
    said.push('The lot is in use again. Nobody is told by e-mail.');
    said.push('What was poured of it on the days it was held is still found by the check.');
    return said;
  }
  const contractors = [...new Set(lot.uses.map((use) => use.contractor.name))].toSorted();
  if (contractors.length > 0)
    said.push(
      `${contractors.join(' and ')} ${contractors.length === 1 ? 'is' : 'are'} told by e-mail, each of their own structures only.`,
    );
  said.push(
    'No decision changes by itself: what is submitted, approved or on record is not checked again, and is listed on this page.',
  );
  said.push(
    type === 'recalled'
      ? 'Every check from now on finds each pour of it, whenever it was poured.'
      : 'Every check from now on finds what is poured of it while it is held; what was poured before stands.',
  );
  said.push(
    type === 'recalled'
      ? 'A recall is final. Nothing more can be received of the lot, and it cannot be released.'
      : 'A hold ends when the lot is released or recalled.',
  );
  return said;
}

function whereItWent(lot: LotDetail): string {
  if (lot.uses.length === 0) return 'No structure has foam of this lot so far.';
  const counts = STATES.map(([state, word]) => ({
    word,
    n: lot.uses.filter((use) => use.state === state).length,
  })).filter(({ n }) => n > 0);
  const parts = counts.map(({ n, word }) => `${n} ${word}`).join(', ');
  return `${counted(lot.uses.length, 'structure')} ${lot.uses.length === 1 ? 'has' : 'have'} foam of it: ${parts}.`;
}
