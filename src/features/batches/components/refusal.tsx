import { useMoveBatch } from '../api/move-batch.ts';
import { Button } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import type { Batch } from '#shared/generated/api-types.ts';

type Props = {
  readonly error: Error;
  readonly batch: Batch;
  readonly onShow: (show: 'incomplete' | 'want') => void;
  readonly onClose: () => void;
};

/** Why the server did not take it, and the way to what must be mended. */
export function Refusal({ error, batch, onShow, onClose }: Props) {
  const again = useMoveBatch(batch);
  const problem = error instanceof ApiProblem ? error : null;
  return (
    <div role="alert">
      <Callout tone="nonconform" title={problem?.title ?? 'That did not work'}>
        <p>{problem?.message ?? 'Nothing was changed. Try again.'}</p>
        {problem?.code === 'revision.incomplete' ? (
          <Button kind="quiet" size="small" onClick={() => onShow('incomplete')}>
            Show what is missing
          </Button>
        ) : null}
        {problem?.code === 'revision.standard-changed' ? (
          <Button
            size="small"
            className="mt-2"
            busy={again.isPending ? 'Asking for the check' : false}
            onClick={() => again.mutate('recheck', { onSuccess: onClose })}
          >
            Check it again
          </Button>
        ) : null}
        {again.isError ? <p className="mt-1">{again.error.message}</p> : null}
      </Callout>
    </div>
  );
}
