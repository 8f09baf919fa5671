import { StateWord } from '#src/components/ui/state-word.tsx';
import type { RegisterRow } from '#shared/generated/api-types.ts';

/** Conforms, or stands by concession: that never wears off. */
export function Conformity({ row }: { row: Pick<RegisterRow, 'nonconforming' | 'concessions'> }) {
  if (!row.nonconforming) return <StateWord glyph="tick" word="conforms" />;
  const numbers = row.concessions.join(', ');
  return <StateWord glyph="lozenge" word={numbers ? `concession ${numbers}` : 'by concession'} />;
}
