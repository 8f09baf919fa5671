import { useQuery } from '@tanstack/react-query';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { PageBand } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { counted } from '#src/lib/formats.ts';
import { ordersToCheckQuery } from '../api/orders-to-check.ts';

/** What a workbook is checked against hangs on its work order. */
export function Component() {
  const orders = useQuery(ordersToCheckQuery);
  return (
    <>
      <DocumentTitle>Check before handing in</DocumentTitle>
      <PageBand title="Check before handing in" />
      {orders.isPending ? <Skeleton lines={6} /> : null}
      {orders.isError ? (
        <ErrorState error={orders.error} what="The work orders" onRetry={() => void orders.refetch()} />
      ) : null}
      {orders.data?.length === 0 ? (
        <EmptyState title="No work order yet">
          A workbook is checked against its work order: one appears here when the owner lets it to you.
        </EmptyState>
      ) : null}
      {orders.data && orders.data.length > 0 ? (
        <section aria-label="Work orders">
          <p className="border-b border-hairline px-gutter py-2.5 text-table text-ink-2">
            For which work order? Its design list, the owner’s standard and the lots are what a workbook is
            checked against.
          </p>
          <ul>
            {orders.data.map((order) => (
              <li
                key={order.id}
                className="flex flex-wrap items-baseline gap-x-4 border-b border-hairline px-gutter py-2.5"
              >
                <TextLink to={paths.checkFirst.to(order.id)} className="font-semibold pointer-coarse:py-2">
                  {`Work order ${order.number}`}
                </TextLink>
                <span className="text-table text-muted">
                  {order.title} · {counted(order.structures, 'structure')}
                </span>
              </li>
            ))}
          </ul>
        </section>
      ) : null}
    </>
  );
}
