import { useQuery } from '@tanstack/react-query';
import { workOrderChoicesQuery } from '#src/lib/api/reference-lists.ts';
import { assumptionsOf } from '#shared/planner/assumptions.ts';
import type { PlanContext } from '#shared/planner/plan-types.ts';
import type { PlanTexts } from '#shared/planner/plan-texts.ts';
import { readPlan } from '#shared/planner/read-plan.ts';
import { tableHead } from '#shared/planner/table-head.ts';

type Props = {
  readonly orderId: string;
  readonly everything: boolean;
  readonly texts: PlanTexts;
  readonly context: PlanContext;
};

/** On paper the fields are not there: which order, which of its structures, and what was assumed of all of them. */
export function OrderPrintHead({ orderId, everything, texts, context }: Props) {
  const orders = useQuery(workOrderChoicesQuery);
  const order = (orders.data ?? []).find(({ id }) => id === orderId);
  const reading = readPlan(texts);
  // The poles are the design list's, each its own.
  const head = tableHead(reading, { assumptions: assumptionsOf(reading, context), context }).filter(
    ([word]) => word !== 'Pole',
  );
  const rows = [
    ...(order ? [['Work order', `${order.number} · ${order.title}`] as const] : []),
    ['Structures', everything ? 'all of them' : 'not handed in yet'] as const,
    ...head,
  ];
  return (
    <dl className="hidden grid-cols-[max-content_minmax(0,1fr)] gap-x-4 px-gutter py-2 text-table print:grid">
      {rows.map(([word, text]) => (
        <div key={word} className="contents">
          <dt className="text-muted">{word}</dt>
          <dd>{text}</dd>
        </div>
      ))}
    </dl>
  );
}
