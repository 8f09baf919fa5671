import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { workOrderQuery } from '../api/work-order.ts';
import { OrderActions } from '../components/order-actions.tsx';
import { OrderBatches } from '../components/order-batches.tsx';
import { PlanProgress } from '../components/plan-progress.tsx';
import { StructureList } from '../components/structure-list.tsx';
import { STRUCTURE_FILTERS, STRUCTURE_SORTS } from '../lib/sort-structures.ts';
import { Cautions } from '#src/components/ui/caution.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Fact, PageBand, SectionHead } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { useUser } from '#src/lib/session/session.ts';

export function Component() {
  const { id = '' } = useParams();
  const contractor = useUser().role === 'contractor';
  const filters = useFilters(STRUCTURE_FILTERS, STRUCTURE_SORTS);
  const order = useQuery(workOrderQuery(id));
  if (order.isError && !order.data) {
    return <ErrorState error={order.error} what="The work order" onRetry={() => void order.refetch()} />;
  }
  if (!order.data) return <Skeleton lines={10} />;
  const { number, title, contractor: letTo, zone } = order.data;
  return (
    <>
      <DocumentTitle>{`Work order ${number}`}</DocumentTitle>
      <PageBand
        title={`Work order ${number} · ${title}`}
        facts={
          <>
            {contractor ? null : <Fact word="let to">{letTo.name}</Fact>}
            <Fact word="times in">{zone.replace('_', ' ')}</Fact>
          </>
        }
        actions={<OrderActions order={order.data} mayContinue={contractor} />}
      />
      <div className="border-b border-hairline px-gutter py-2 text-table">
        <PlanProgress order={order.data} words />
      </div>
      <div className="grid grid-cols-[minmax(0,1fr)] lg:grid-cols-[minmax(0,1fr)_27rem]">
        <section aria-label="Batches">
          <SectionHead title="Batches" />
          <OrderBatches orderId={id} />
        </section>
        <div className="border-hairline p-4 lg:border-l">
          <Cautions />
        </div>
      </div>
      <StructureList orderId={id} filters={filters} />
    </>
  );
}
