import { useQuery } from '@tanstack/react-query';
import { PlainTable } from '#src/components/table/plain-table.tsx';
import { ButtonLink } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { paths } from '#src/config/paths.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import { localToday } from '#src/lib/local-today.ts';
import { standardVersionsQuery } from '../api/standard.ts';
import { standOf } from '../components/standard-state.tsx';
import { VERSION_COLUMNS } from '../components/version-columns.tsx';

/** Versions of the construction standard, newest first. */
export function Component() {
  const versions = useQuery(standardVersionsQuery);
  const drafts = useCan('create', 'Standard');
  const all = versions.data ?? [];
  const today = localToday();
  const inForce = all.find((one) => standOf(one, { all, today }) === 'in-force');
  const base = all.find((one) => one.state === 'published') ?? all[0];
  return (
    <>
      <DocumentTitle>Standard</DocumentTitle>
      <PageBand
        title="Construction standard"
        facts={
          inForce ? (
            <Fact word="in force today">
              <b>version {inForce.n}</b>
            </Fact>
          ) : null
        }
        actions={
          drafts && base ? (
            <ButtonLink kind="primary" size="small" to={`${paths.standardVersion.to(base.n)}?draft=1`}>
              Draft the next version
            </ButtonLink>
          ) : null
        }
      />
      {versions.isPending ? <Skeleton lines={4} /> : null}
      {versions.isError ? (
        <ErrorState error={versions.error} what="The standard" onRetry={() => void versions.refetch()} />
      ) : null}
      {versions.isSuccess && all.length === 0 ? (
        <EmptyState title="There is no standard yet">
          An engineer drafts the first version; until one is published nothing can be checked.
        </EmptyState>
      ) : null}
      {all.length > 0 ? (
        <PlainTable
          caption="Versions of the standard"
          rows={all.map((one) => ({ ...one, stand: standOf(one, { all, today }) }))}
          rowKey={(row) => row.id}
          columns={VERSION_COLUMNS}
        />
      ) : null}
      <p className="max-w-prose px-gutter py-4 text-ink-2">
        Each line is checked on the version in force on its work day; what was submitted keeps that version
        whatever comes later. A version is published by another engineer than the one who drafted it.
      </p>
    </>
  );
}
