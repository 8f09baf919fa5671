import { useQuery } from '@tanstack/react-query';
import { ButtonLink } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { paths } from '#src/config/paths.ts';
import { homeQuery } from '#src/features/home/api/home.ts';
import { RecentList } from '#src/features/home/components/recent-list.tsx';
import { WaitingList } from '#src/features/home/components/waiting-list.tsx';
import { useUser } from '#src/lib/session/session.ts';

export function Component() {
  const user = useUser();
  const home = useQuery(homeQuery);
  const waiting = home.data?.items.filter((item) => item.count > 0) ?? [];
  const clear = home.data?.items.filter((item) => item.count === 0) ?? [];
  return (
    <>
      <DocumentTitle>What waits for you</DocumentTitle>
      <PageBand
        title="What waits for you"
        facts={<Fact word={`${user.role}, for`}>{user.organisation.name}</Fact>}
        actions={
          user.role === 'contractor' ? (
            <ButtonLink to={paths.checkFirstOrders.to()}>Check before handing in</ButtonLink>
          ) : null
        }
      />
      {home.isPending ? <Skeleton lines={6} /> : null}
      {home.isError ? (
        <ErrorState error={home.error} what="Your home page" onRetry={() => void home.refetch()} />
      ) : null}
      {home.data ? (
        <div className="grid flex-1 lg:grid-cols-[minmax(0,1fr)_24rem]">
          <div>
            {waiting.length > 0 ? (
              <WaitingList items={waiting} />
            ) : (
              <EmptyState title="Nothing waits for you">
                What comes in for your role appears here; the pages above are open meanwhile.
              </EmptyState>
            )}
            {clear.length > 0 ? (
              <p className="px-gutter py-3 text-table text-muted">
                Clear: {clear.map((item) => item.title.toLowerCase()).join(', ')}.
              </p>
            ) : null}
          </div>
          <RecentList items={home.data.recent} />
        </div>
      ) : null}
    </>
  );
}
