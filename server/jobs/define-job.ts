import type { EntityManager } from '@mikro-orm/postgresql';
import type { Services } from '#server/container.ts';

export type JobContext = {
  readonly services: Services;
  /** Fresh for this attempt. */
  readonly em: EntityManager;
  readonly job: {
    readonly id: string;
    /** 1 for the first attempt. */
    readonly attempt: number;
    /** No further attempt follows when this one throws. */
    readonly last: boolean;
  };
  /** Aborted when the job's time is up or the process ends; pass it on to what can be stopped. */
  readonly signal: AbortSignal;
};

/** Handlers are repeatable: a process may die after the work and before it is known to be done. */
export type JobHandler<P> = (payload: P, context: JobContext) => Promise<void>;

/** Brings the subject of a parked job to an end that its page shows. `em` is in the transaction that notes the parking. */
export type ParkedHandler<P> = (
  payload: P,
  context: { readonly em: EntityManager; readonly reason: string },
) => Promise<void>;

export type JobDefinition<P extends object = object> = {
  /** Also the queue's name. */
  readonly name: string;
  /** JSON Schema of the payload, checked when the job is enqueued. */
  readonly payload: Readonly<Record<string, unknown>>;
  /** Attempts after the first. */
  readonly retryLimit: number;
  /** Seconds before the first repeat; doubles with each, with jitter. */
  readonly retryDelay: number;
  /** An attempt that takes longer counts as failed. */
  readonly expireSeconds: number;
  /** Jobs of this queue that one process works on at once. */
  readonly concurrency: number;
  /** Enqueued by the workers themselves, once in so many seconds over all of them. */
  readonly everySeconds: number | null;
  readonly load: () => Promise<{ handler: JobHandler<P> }>;
  /** Null: nobody's page waits for it. Run once a parking, however the last attempt ended: thrown, killed, out of time. */
  readonly loadParked: (() => Promise<{ parked: ParkedHandler<P> }>) | null;
};

/** A job as data: its handler is loaded when the first one comes. */
export function defineJob<P extends object>(
  definition: Pick<JobDefinition<P>, 'name' | 'payload' | 'load'> & Partial<JobDefinition<P>>,
): JobDefinition<P> {
  return {
    retryLimit: 5,
    retryDelay: 2,
    expireSeconds: 300,
    concurrency: 1,
    everySeconds: null,
    loadParked: null,
    ...definition,
  };
}
