import type { Services } from '#server/container.ts';
import { JOBS } from '#server/jobs/registry.ts';
import { workOnQueues, type Worker } from '#server/jobs/work-on-queues.ts';

/** The part of a process that works on jobs; beside the web part or alone (setting RUN). */
export function startWorker(services: Services): Promise<Worker> {
  return workOnQueues(services, JOBS);
}
