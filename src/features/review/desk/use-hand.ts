import { useState } from 'react';
import { findingInHand } from '#src/features/review/desk/steps.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

/** What is being said: a form that is open beside its finding or line. */
export type Saying = 'approve' | 'reject' | 'concession' | 'return';
type Hand = {
  readonly line: string | null;
  readonly finding: string | null;
  readonly end: 'first' | 'last';
  readonly saying: Saying | null;
};

const EMPTY: Hand = { line: null, finding: null, end: 'first', saying: null };

/** Which finding of the current line is in hand, which one the pointer is on, and which form is open. Another line starts afresh. */
export function useHand(line: string | null, findings: readonly FindingRow[]) {
  const [hand, setHand] = useState<Hand>(EMPTY);
  const [hovered, setHovered] = useState<string | null>(null);
  const own: Hand = hand.line === line ? hand : { ...EMPTY, line };
  const finding = findingInHand(findings, own.finding, own.end);
  return {
    finding,
    /** Marked on drawing and list alike. */
    marked: hovered ?? finding?.id ?? null,
    saying: own.saying,
    hover: setHovered,
    take: (id: string, at: string | null = line) => setHand({ ...EMPTY, line: at, finding: id }),
    takeEnd: (at: string, end: 'first' | 'last') => setHand({ ...EMPTY, line: at, end }),
    say: (saying: Saying | null, id: string | null = finding?.id ?? null) =>
      setHand({ ...EMPTY, line, finding: id, saying }),
    /** The form of a decision that went through closes, unless another is open by now. */
    said: (at: string) =>
      setHand((now) => (now.line === at && now.saying !== null ? { ...now, saying: null } : now)),
    sayOn: (place: { line: string; finding: string | null; saying: Saying }) =>
      setHand({ ...EMPTY, ...place }),
  };
}
