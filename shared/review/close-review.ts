import { accept, refuse, type Outcome } from './outcome.ts';
import type { LineState } from './states.ts';

export type ReviewLine = {
  readonly recordId: string;
  readonly structureNumber: string;
  readonly state: LineState;
};

export type Closing = {
  readonly approved: readonly string[];
  readonly returned: readonly string[];
  readonly held: readonly string[];
  /** Returned lines make the next revision. */
  readonly nextRevision: boolean;
};

/** What closing the review does, or which lines still keep it open. Record ids in the order given. */
export function closeReview(lines: readonly ReviewLine[], undecidedFindings: number): Outcome<Closing> {
  const open = lines.filter((line) => line.state === 'undecided');
  if (open.length > 0) {
    const named = open.slice(0, 5).map((line) => line.structureNumber);
    const more = open.length > named.length ? ` and ${open.length - named.length} more` : '';
    return refuse(
      'review.undecided',
      `${open.length === 1 ? 'One line is' : `${open.length} lines are`} not decided: ${named.join(', ')}${more}.`,
    );
  }
  if (undecidedFindings > 0)
    return refuse(
      'review.undecided',
      `${undecidedFindings === 1 ? 'One finding that belongs' : `${undecidedFindings} findings that belong`} to no line ${undecidedFindings === 1 ? 'is' : 'are'} not decided.`,
    );
  const ids = (state: LineState) => lines.filter((line) => line.state === state).map((line) => line.recordId);
  const returned = ids('returned');
  return accept({
    approved: ids('approved'),
    returned,
    held: ids('held'),
    nextRevision: returned.length > 0,
  });
}
