import { useQuery } from '@tanstack/react-query';
import { useId } from 'react';
import type { PlanState } from '../lib/use-plan-texts.ts';
import { CONTROL, FieldFrame } from '#src/components/form/field-frame.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { workOrderChoicesQuery } from '#src/lib/api/reference-lists.ts';

type Props = { readonly orderId: string; readonly everything: boolean; readonly go: PlanState['go'] };

/** Which work order, and which of its structures. */
export function OrderPicker({ orderId, everything, go }: Props) {
  const [orderField, builtField] = [useId(), useId()];
  const orders = useQuery(workOrderChoicesQuery);
  return (
    <div className="grid gap-2.5 border-b border-hairline px-gutter py-3">
      <FieldFrame id={orderField} label="Work order">
        <select
          id={orderField}
          value={orderId}
          onChange={(event) => go({ order: event.target.value })}
          className={CONTROL}
        >
          <option value="">Choose</option>
          {(orders.data ?? []).map((order) => (
            <option key={order.id} value={order.id}>
              {order.number} · {order.title}
            </option>
          ))}
        </select>
      </FieldFrame>
      <FieldFrame id={builtField} label="Structures">
        <select
          id={builtField}
          value={everything ? 'too' : ''}
          onChange={(event) => go({ built: event.target.value })}
          className={CONTROL}
        >
          <option value="">not handed in yet</option>
          <option value="too">all of them</option>
        </select>
      </FieldFrame>
      {orderId === '' ? null : (
        <p className="text-table">
          <TextLink to={paths.workOrder.to(orderId)}>Open the work order</TextLink>
        </p>
      )}
    </div>
  );
}
