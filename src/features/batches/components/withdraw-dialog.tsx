import { useMoveBatch } from '../api/move-batch.ts';
import { Refusal } from './refusal.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import type { Batch } from '#shared/generated/api-types.ts';

export function WithdrawDialog({ batch, onClose }: { batch: Batch; onClose: () => void }) {
  const move = useMoveBatch(batch);
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Withdraw batch ${batch.number}`}
      description="It comes back to you as it was handed in, to be changed and submitted again. That it was submitted and withdrawn stays in the trail."
    >
      <div className="grid gap-4">
        {move.isError ? (
          <Refusal error={move.error} batch={batch} onShow={onClose} onClose={onClose} />
        ) : null}
        <div className="flex flex-wrap gap-3">
          <Button
            kind="primary"
            busy={move.isPending ? 'Withdrawing' : false}
            onClick={() => move.mutate('withdraw', { onSuccess: onClose })}
          >
            Withdraw it
          </Button>
          <Button onClick={onClose}>Leave it submitted</Button>
        </div>
      </div>
    </Dialog>
  );
}
