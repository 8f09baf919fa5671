import type { ParkedHandler } from '#server/jobs/define-job.ts';
import type { CheckRevisionPayload } from './check-revision.job.ts';
import { failCheck } from './fail-check.ts';

/** No attempt at a check is left: its revision is a draft again, and its contractor reads why. */
export const parkCheck: ParkedHandler<CheckRevisionPayload> = (payload, { em }) =>
  failCheck(em, payload, {
    code: 'check.failed',
    detail:
      'The check could not be finished after several attempts; what you uploaded is kept. Press “Check again”; if it fails again, tell the administrator, who sees the reason.',
  });
