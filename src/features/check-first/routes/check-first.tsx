import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import { checkContextQuery } from '../api/check-context.ts';
import { TypedPanel } from '../components/typed-panel.tsx';
import { WorkbookPanel } from '../components/workbook-panel.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { Tabs } from '#src/components/ui/tabs.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { workOrderQuery } from '#src/features/work-orders/api/work-order.ts';
import { useUser } from '#src/lib/session/session.ts';

const TABS = [
  { value: 'workbook', label: 'A workbook' },
  { value: 'line', label: 'Type a line' },
] as const;
type Tab = (typeof TABS)[number]['value'];

export function Component() {
  const { id = '' } = useParams();
  const contractor = useUser().role === 'contractor';
  const [search, setSearch] = useSearchParams();
  const tab: Tab = search.get('tab') === 'line' ? 'line' : 'workbook';
  const order = useQuery(workOrderQuery(id));
  const context = useQuery(checkContextQuery(id));
  if (order.isError && !order.data)
    return <ErrorState error={order.error} what="The work order" onRetry={() => void order.refetch()} />;
  if (context.isError && !context.data)
    return (
      <ErrorState
        error={context.error}
        what="What it is checked against"
        onRetry={() => void context.refetch()}
      />
    );
  if (!order.data || !context.data) return <Skeleton lines={10} />;
  const { number } = order.data;
  return (
    <>
      <DocumentTitle>{`Check before handing in, work order ${number}`}</DocumentTitle>
      <PageBand
        title="Check before handing in"
        facts={
          <>
            <span>
              <span className="text-muted">work order </span>
              <TextLink to={paths.workOrder.to(id)}>{number}</TextLink>
            </span>
            <Fact word="times in">{order.data.zone.replace('_', ' ')}</Fact>
          </>
        }
      />
      <Tabs
        label="What is checked"
        value={tab}
        tabs={TABS}
        onChange={(next) => setSearch(next === 'workbook' ? {} : { tab: next }, { replace: true })}
      >
        {tab === 'workbook' ? (
          <WorkbookPanel order={order.data} context={context.data} mayHandIn={contractor} />
        ) : (
          <TypedPanel order={order.data} context={context.data} />
        )}
      </Tabs>
    </>
  );
}
