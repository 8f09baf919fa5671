import type { ReactNode } from 'react';
import { Glyph, type GlyphName } from '#src/components/ui/glyph.tsx';
import type { LineState, RevisionStatus } from '#shared/review/states.ts';
import type { Severity } from '#shared/findings/types.ts';

type Word = { readonly glyph: GlyphName; readonly word: string };

export const LINE_WORDS: Record<LineState, Word> = {
  undecided: { glyph: 'dotted', word: 'undecided' },
  approved: { glyph: 'tick', word: 'approved' },
  returned: { glyph: 'cross', word: 'returned' },
  held: { glyph: 'lozenge', word: 'concession asked' },
  'on-record': { glyph: 'tick', word: 'on record' },
  abandoned: { glyph: 'cross', word: 'abandoned' },
};

export const STATUS_WORDS: Record<RevisionStatus, Word> = {
  draft: { glyph: 'dotted', word: 'draft' },
  checking: { glyph: 'dotted', word: 'being checked' },
  checked: { glyph: 'info', word: 'checked, not submitted' },
  submitted: { glyph: 'info', word: 'submitted' },
  'in-review': { glyph: 'info', word: 'in review' },
  decided: { glyph: 'tick', word: 'decided' },
  'on-record': { glyph: 'tick', word: 'on record' },
};

export const SEVERITY_WORDS: Record<Severity, Word> = {
  nonconformity: { glyph: 'triangle', word: 'nonconformity' },
  query: { glyph: 'circle', word: 'query' },
  note: { glyph: 'info', word: 'note' },
};

/** A state: shape and word, never colour alone. `children` replaces the word ("concession C-0031"). */
export function StateWord({ glyph, word, children }: Word & { children?: ReactNode }) {
  return (
    <span className="inline-flex items-center gap-1.5 align-bottom whitespace-nowrap">
      <Glyph name={glyph} />
      {children ?? word}
    </span>
  );
}
