import { Button } from '#src/components/ui/button.tsx';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { Moment } from '#src/components/ui/moment.tsx';
import { counted } from '#src/lib/formats.ts';
import type { ParkedJob } from '#shared/generated/api-types.ts';
import { useRetryJob } from '../api/parked-jobs.ts';

/** What stands still, what that means, why, and the one thing to do about it. */
export function ParkedJobItem({ job }: { job: ParkedJob }) {
  const retry = useRetryJob();
  const payload = Object.entries(job.payload).map(([name, value]) => `${name} ${JSON.stringify(value)}`);
  return (
    <li className="flex flex-wrap items-start gap-x-6 gap-y-2 border-b border-hairline px-gutter py-3">
      <div className="flex min-w-0 flex-1 basis-96 gap-3">
        <Glyph name="triangle" className="mt-0.5" />
        <div className="min-w-0">
          <h2 className="font-semibold">
            {job.title}
            {job.about ? <span className="font-normal">: {job.about}</span> : null}
          </h2>
          <p className="text-ink-2">{job.meaning}</p>
          <p className="mt-1">
            <span className="text-muted">Last attempt said: </span>
            <span className="break-words">{job.problem}</span>
          </p>
          <p className="mt-1 text-small break-all text-muted">
            {counted(job.attempts, 'attempt')}, asked for <Moment at={job.createdAt} />
            {job.failedAt ? (
              <>
                , parked <Moment at={job.failedAt} />
              </>
            ) : null}
            {payload.length > 0 ? `; ${payload.join(', ')}` : ''}
          </p>
          {retry.isError ? <p className="mt-1 text-nonconform">{retry.error.message}</p> : null}
        </div>
      </div>
      {job.can.includes('retry') ? (
        <Button size="small" busy={retry.isPending && 'Trying…'} onClick={() => retry.mutate(job)}>
          Try again
          <span className="sr-only">
            : {job.title} {job.about}
          </span>
        </Button>
      ) : null}
    </li>
  );
}
