import trailEntrySchema from '#schemas/api/trail-entry.schema.json' with { type: 'json' };
import verificationSchema from '#schemas/api/trail-verification.schema.json' with { type: 'json' };
import { defineRoute, type Route } from '#server/http/define-route.ts';
import { pageSchema, PAGE_QUERY, type Page } from '#server/http/page.ts';
import { verifyTrail, type TrailFault } from '#server/trail/verify-trail.ts';
import type { TrailEntry, TrailVerification } from '#shared/generated/api-types.ts';
import { listTrail, type TrailQuery } from './list-trail.ts';

const FAULTS: Readonly<Record<TrailFault['fault'], string>> = {
  changed: 'This entry does not have the hash of its content: it was changed after it was written.',
  'missing-before': 'Entries before this one are gone.',
  'link-broken': 'This entry does not follow the one before it: entries were put in or moved.',
  'end-differs': 'The end of the trail is not where it was: entries were cut off or added past it.',
};

export const trailRoutes: readonly Route[] = [
  defineRoute<{ query: TrailQuery; reply: Page<TrailEntry> }>({
    method: 'get',
    path: '/api/trail',
    summary: 'Who did what when, newest first',
    permission: { action: 'read', subject: 'Trail' },
    query: {
      ...PAGE_QUERY,
      subject: { type: 'string', pattern: '^[a-z-]+(:[0-9A-Za-z-]{1,80})?$', maxLength: 120 },
      actor: { type: 'string', format: 'uuid' },
      action: { type: 'string', maxLength: 80 },
      from: { type: 'string', format: 'date' },
      to: { type: 'string', format: 'date' },
      q: { type: 'string', maxLength: 80, description: 'Beginning of what the step concerned.' },
    },
    reply: pageSchema(trailEntrySchema),
    handler: ({ em, query }) => listTrail(em, query),
  }),
  defineRoute<{ reply: TrailVerification }>({
    method: 'get',
    path: '/api/trail/verify',
    summary: 'Whether the chain of the trail is unbroken',
    permission: { action: 'verify', subject: 'Trail' },
    reply: verificationSchema,
    handler: async ({ em }) => {
      const verdict = await verifyTrail(em);
      const fault = verdict.faults[0];
      return {
        ok: verdict.intact,
        entries: verdict.entries,
        head: verdict.headHash || null,
        brokenAt: fault?.seq ?? null,
        problem: fault ? FAULTS[fault.fault] : null,
      };
    },
  }),
];
