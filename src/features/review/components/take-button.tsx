import { useNavigate } from 'react-router-dom';
import { Button } from '#src/components/ui/button.tsx';
import { paths } from '#src/config/paths.ts';
import { useMoveBatch } from '#src/features/review/api/move-batch.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** Takes a batch from the list and opens its desk. A batch that another took meanwhile says so on the desk. */
export function TakeButton({ batch }: { batch: Batch }) {
  const navigate = useNavigate();
  const move = useMoveBatch(batch.id);
  if (!batch.can.includes('take')) return null;
  return (
    <Button
      size="small"
      aria-label={`Take ${batch.number}`}
      busy={move.isPending && 'Taking…'}
      onClick={() => move.mutate('take', { onSettled: () => void navigate(paths.reviewBatch.to(batch.id)) })}
    >
      Take
    </Button>
  );
}
