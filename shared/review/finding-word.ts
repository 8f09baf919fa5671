import { formatDay } from '#shared/dates/format-day.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

const ACTION_WORDS = { correct: 'correct the record', rework: 'rework', repair: 'repair' } as const;

/** Where a finding stands, as a shape and words; null while nothing is decided. */
export function findingWord(
  finding: FindingRow,
): { readonly glyph: 'tick' | 'cross' | 'lozenge'; readonly word: string } | null {
  const { state, decision, concession } = finding;
  if (state === 'approved') {
    if (decision?.grounds === 'concession')
      return { glyph: 'lozenge', word: `accepted by concession${concession ? ` ${concession.number}` : ''}` };
    return { glyph: 'tick', word: `approved${decision?.grounds ? ` on ${decision.grounds}` : ''}` };
  }
  if (state === 'rejected') {
    const due = decision?.action ? `, ${ACTION_WORDS[decision.action]}` : '';
    const by = decision?.dueOn ? ` by ${formatDay(decision.dueOn)}` : '';
    return { glyph: 'cross', word: `rejected${due}${by}` };
  }
  if (state === 'concession-asked')
    return { glyph: 'lozenge', word: `concession${concession ? ` ${concession.number}` : ''} asked` };
  if (concession?.state === 'refused')
    return { glyph: 'lozenge', word: `concession ${concession.number} refused` };
  return null;
}
