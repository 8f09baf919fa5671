import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { OneView } from '../components/one-view.tsx';
import { OrderView } from '../components/order-view.tsx';
import { TableView } from '../components/table-view.tsx';
import { plannerAddress } from '../lib/planner-address.ts';
import { usePlanContext } from '../lib/use-plan-context.ts';
import { usePlanTexts } from '../lib/use-plan-texts.ts';
import { structuresQuery } from '#src/features/work-orders/api/structures.ts';
import { Button } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { Tabs } from '#src/components/ui/tabs.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { PLAN_DEFAULTS } from '#shared/planner/plan-fields.ts';
import { designTexts } from '#shared/planner/plan-order.ts';

const VIEWS = ['one', 'order', 'table'] as const;
type View = (typeof VIEWS)[number];

const TABS: readonly { readonly value: View; readonly label: string }[] = [
  { value: 'one', label: 'One structure' },
  { value: 'order', label: 'Work order' },
  { value: 'table', label: 'Table for the truck' },
];

export function Component() {
  const [search] = useSearchParams();
  const state = usePlanTexts();
  const { typed, type, settle, go } = state;
  const view = VIEWS.find((one) => one === search.get('view')) ?? 'one';
  const orderId = search.get('order') ?? '';
  const structureId = search.get('structure') ?? '';
  const sources = usePlanContext(typed['product']);
  const listed = useQuery({ ...structuresQuery(orderId), enabled: orderId !== '' && structureId !== '' });
  const structure = listed.data?.find((one) => one.id === structureId) ?? null;
  const texts = useMemo(() => {
    const { augersIn = '' } = PLAN_DEFAULTS;
    return { ...(structure ? { augersIn, ...designTexts(structure) } : PLAN_DEFAULTS), ...typed };
  }, [structure, typed]);
  const designing = orderId !== '' && structureId !== '' && listed.isPending;
  return (
    <>
      <DocumentTitle>Kit planner</DocumentTitle>
      <div className={view === 'table' ? 'print:hidden' : undefined}>
        <PageBand
          title="Kit planner"
          facts={
            structure && view !== 'order' ? (
              <>
                <Fact word="structure">{structure.structureNumber}</Fact>
                <Fact>
                  <TextLink to={plannerAddress({ view: 'order', order: orderId }, typed)}>
                    all of its work order
                  </TextLink>
                </Fact>
              </>
            ) : null
          }
          actions={
            <>
              <CopyLink settle={settle} />
              {view === 'table' ? null : (
                <Button size="small" onClick={() => window.print()}>
                  Print
                </Button>
              )}
              <Button size="small" onClick={() => go({ structure: null }, {})}>
                Begin again
              </Button>
            </>
          }
        />
      </div>
      {listed.isError && structureId !== '' ? (
        <ErrorState error={listed.error} what="The structure" onRetry={() => void listed.refetch()} />
      ) : null}
      {listed.data && !structure && structureId !== '' ? (
        <p role="alert" className="px-gutter py-2 text-query">
          The structure of this address is not on the work order any more. What was typed is kept below.
        </p>
      ) : null}
      {sources.error ? (
        <ErrorState error={sources.error} what="Standard and foam" onRetry={sources.retry} />
      ) : sources.pending || designing ? (
        <Skeleton lines={10} />
      ) : sources.context === null ? (
        <EmptyState title="No standard is in force today">
          Depths due and limits come from the owner’s construction standard. An engineer publishes one.
        </EmptyState>
      ) : (
        <div className="flex min-h-0 flex-1 flex-col print:[&_[role=tablist]]:hidden">
          <Tabs
            label="What is planned"
            value={view}
            tabs={TABS}
            onChange={(next) => go({ view: next === 'one' ? null : next })}
          >
            {view === 'order' ? (
              <OrderView
                orderId={orderId}
                everything={search.get('built') === 'too'}
                state={state}
                context={sources.context}
                products={sources.products}
              />
            ) : view === 'table' ? (
              <TableView {...{ texts, type, settle }} context={sources.context} products={sources.products} />
            ) : (
              <OneView {...{ texts, type, settle }} context={sources.context} products={sources.products} />
            )}
          </Tabs>
        </div>
      )}
    </>
  );
}

/** The address is the plan: whoever opens it sees the same, as far as it is theirs to see. */
function CopyLink({ settle }: { readonly settle: () => void }) {
  const [said, setSaid] = useState('');
  const copy = async () => {
    settle();
    // The address follows at once, in the router's own time.
    await new Promise((resolve) => setTimeout(resolve, 0));
    try {
      await navigator.clipboard.writeText(location.href);
      setSaid('Copied.');
    } catch {
      setSaid('Copy it from the address bar.');
    }
  };
  return (
    <>
      <span role="status" className="text-small text-ink-2 print:hidden">
        {said}
      </span>
      <Button size="small" onClick={() => void copy()}>
        Copy link
      </Button>
    </>
  );
}
