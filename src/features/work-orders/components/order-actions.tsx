import { useNavigate } from 'react-router-dom';
import { useStartBatch } from '../api/start-batch.ts';
import { Button, ButtonLink } from '#src/components/ui/button.tsx';
import { paths } from '#src/config/paths.ts';
import { plannerAddress } from '#src/features/planner/lib/planner-address.ts';
import { usePlansKits } from '#src/features/planner/lib/use-plans-kits.ts';
import type { WorkOrder } from '#shared/generated/api-types.ts';

/** The template to fill in, and the batch to hand it in with. */
export function OrderActions({ order, mayContinue }: { order: WorkOrder; mayContinue: boolean }) {
  const start = useStartBatch();
  const navigate = useNavigate();
  const plansKits = usePlansKits();
  const open = mayContinue ? order.openBatch : null;
  return (
    <>
      {start.isError ? (
        <p role="alert" className="text-table text-nonconform">
          {start.error.message}
        </p>
      ) : null}
      {plansKits ? (
        <ButtonLink size="small" to={plannerAddress({ view: 'order', order: order.id })}>
          Plan kits
        </ButtonLink>
      ) : null}
      <a
        href={`/api/work-orders/${order.id}/template.xlsx`}
        download
        className="inline-flex min-h-7 items-center border border-ink px-2.5 text-small font-semibold whitespace-nowrap hover:bg-sunk pointer-coarse:min-h-11"
      >
        Download workbook template
      </a>
      <ButtonLink size="small" to={paths.checkFirst.to(order.id)}>
        Check a workbook first
      </ButtonLink>
      {order.can.includes('create-batch') ? (
        <Button
          kind={open ? 'secondary' : 'primary'}
          size="small"
          busy={start.isPending ? 'Opening' : false}
          onClick={() =>
            start.mutate(order.id, { onSuccess: (batch) => void navigate(paths.batch.to(batch.id)) })
          }
        >
          Open a new batch
        </Button>
      ) : null}
      {open ? (
        <ButtonLink kind="primary" size="small" to={paths.batch.to(open)}>
          Continue the open batch
        </ButtonLink>
      ) : null}
    </>
  );
}
