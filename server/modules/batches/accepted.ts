import { conflict } from '#server/http/problem.ts';
import { isRefusal, type Outcome } from '#shared/review/outcome.ts';

/**
 * What the state machine accepted.
 * @throws Problem 409 with the refusal's own code and sentence
 */
export function accepted<T>(outcome: Outcome<T>): T {
  if (isRefusal(outcome)) throw conflict(outcome.refused, outcome.detail);
  return outcome.accepted;
}
