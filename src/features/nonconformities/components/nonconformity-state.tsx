import { StateWord } from '#src/components/ui/state-word.tsx';
import { formatDay } from '#src/lib/formats.ts';
import type { Nonconformity } from '#shared/generated/api-types.ts';

export const ACTION_WORDS = {
  correct: 'correct the record',
  rework: 'rework',
  repair: 'repair',
} as const;

/** How the finding stands: shape, word, and the number of its concession. */
export function NonconformityState({ row }: { row: Nonconformity }) {
  const number = row.concession ? ` ${row.concession}` : '';
  switch (row.state) {
    case 'approved':
      return <StateWord glyph="lozenge" word={`concession${number}`} />;
    case 'concession-asked':
      return <StateWord glyph="lozenge" word={`asked${number}`} />;
    case 'rejected':
      return <StateWord glyph="cross" word="rejected" />;
    default:
      return <StateWord glyph="dotted" word="undecided" />;
  }
}

/** What is due, and by when. */
export function actionDue(row: Pick<Nonconformity, 'state' | 'condition' | 'action' | 'dueOn'>): string {
  if (row.state === 'approved') return row.condition ?? 'none';
  if (row.state === 'concession-asked') return 'an engineer decides';
  if (row.state === 'undecided' || !row.action) return 'a decision';
  return row.dueOn ? `${ACTION_WORDS[row.action]}, ${formatDay(row.dueOn)}` : ACTION_WORDS[row.action];
}
