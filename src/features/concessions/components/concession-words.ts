import type { GlyphName } from '#src/components/ui/glyph.tsx';
import { counted } from '#src/lib/formats.ts';
import type { Concession } from '#shared/generated/api-types.ts';

export const CONCESSION_WORDS: Record<
  Concession['state'],
  { readonly glyph: GlyphName; readonly word: string }
> = {
  asked: { glyph: 'lozenge', word: 'asked' },
  granted: { glyph: 'tick', word: 'granted' },
  refused: { glyph: 'cross', word: 'refused' },
  withdrawn: { glyph: 'dotted', word: 'withdrawn' },
};

/** `17-0403`, or `17-0403 and 2 more`. */
export function structuresOf({ findings }: Pick<Concession, 'findings'>): string {
  const numbers = [...new Set(findings.flatMap((finding) => finding.structureNumber ?? []))];
  const [first, ...more] = numbers;
  if (!first) return 'the batch itself';
  return more.length === 0 ? first : `${first} and ${counted(more.length, 'more', 'more')}`;
}

export function titlesOf({ findings }: Pick<Concession, 'findings'>): string {
  return [...new Set(findings.map((finding) => finding.title))].join(', ');
}
