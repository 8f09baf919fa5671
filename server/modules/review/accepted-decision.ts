import { conflict, problem } from '#server/http/problem.ts';
import { isRefusal, type Outcome } from '#shared/review/outcome.ts';

/** Which field a refused decision should mend; others are conflicts with how things stand. */
const FIELD_OF: Readonly<Record<string, string>> = {
  'decision.grounds-required': '/grounds',
  'decision.answer-settles-queries-only': '/grounds',
  'decision.not-answered': '/grounds',
  'decision.reason-required': '/reason',
  'decision.action-required': '/action',
  'decision.due-required': '/dueOn',
  'decision.due-past': '/dueOn',
};

/** @throws Problem 422 naming the field, or 409 where the state of things refuses */
export function acceptedDecision<T>(outcome: Outcome<T>): T {
  if (!isRefusal(outcome)) return outcome.accepted;
  const pointer = FIELD_OF[outcome.refused];
  if (pointer === undefined) throw conflict(outcome.refused, outcome.detail);
  throw problem(422, outcome.refused, outcome.detail, {
    errors: [{ pointer, code: outcome.refused, detail: outcome.detail }],
  });
}
