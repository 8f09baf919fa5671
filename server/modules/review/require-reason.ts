import { problem } from '#server/http/problem.ts';

/** @throws Problem 422 at `/reason` when nothing is said */
export function requireReason(text: string): string {
  const reason = text.trim();
  if (reason) return reason;
  throw problem(422, 'reason.required', 'Say why. The reason stands in the trail.', {
    errors: [{ pointer: '/reason', code: 'reason.required', detail: 'Say why.' }],
  });
}
