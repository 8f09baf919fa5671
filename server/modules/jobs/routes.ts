import { defineRoute, type Route } from '#server/http/define-route.ts';
import { notFound } from '#server/http/problem.ts';
import { listParked } from '#server/jobs/list-parked.ts';
import { retryParked } from '#server/jobs/retry-parked.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import parkedSchema from '#schemas/api/parked-job.schema.json' with { type: 'json' };
import type { ParkedJob } from '#shared/generated/api-types.ts';
import { jobWords } from './job-words.ts';

/** More than this is no list to work through but one fault: the newest show which. */
const SHOWN = 200;

export const jobRoutes: readonly Route[] = [
  defineRoute<{ reply: { items: ParkedJob[] } }>({
    method: 'get',
    path: '/api/jobs/parked',
    summary: 'Jobs whose attempts are used up, newest first',
    permission: { action: 'read', subject: 'Job' },
    reply: {
      type: 'object',
      properties: { items: { type: 'array', items: parkedSchema } },
      required: ['items'],
    },
    handler: async ({ em, ability }) => ({
      items: (await listParked(em, SHOWN)).map((job) => ({
        ...job,
        ...jobWords(job.name),
        can: ability.can('update', 'Job') ? ['retry'] : [],
      })),
    }),
  }),
  defineRoute({
    method: 'post',
    path: '/api/jobs/parked/:id/retry',
    summary: 'Give a parked job one more attempt, at once',
    permission: { action: 'update', subject: 'Job' },
    handler: ({ em, params, actor }) =>
      em.transactional(async (tx) => {
        const name = await retryParked(tx, params.id);
        if (name === null) throw notFound();
        await appendTrail(tx, {
          actor,
          action: 'job.retried',
          subject: { type: 'job', id: params.id, label: jobWords(name).title },
          payload: { name },
        });
      }),
  }),
];
