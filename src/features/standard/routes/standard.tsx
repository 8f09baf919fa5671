import { useQuery } from '@tanstack/react-query';
import { PlainTable } from '#src/components/table/plain-table.tsx';
import { ButtonLink } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Day, Moment } from '#src/components/ui/moment.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import { localToday } from '#src/lib/local-today.ts';
import { standardVersionsQuery } from '../api/standard.ts';
import { standOf, StandardState } from '../components/standard-state.tsx';

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
          rows={all}
          rowKey={(row) => row.id}
          columns={[
            {
              id: 'n',
              title: 'Version',
              cell: (row) => (
                <TextLink to={paths.standardVersion.to(row.n)} className="font-semibold whitespace-nowrap">
                  Version {row.n}
                </TextLink>
              ),
            },
            { id: 'title', title: 'Title', cell: (row) => row.title },
            {
              id: 'state',
              title: 'State',
              cell: (row) => <StandardState stand={standOf(row, { all, today })} />,
            },
            {
              id: 'day',
              title: 'Takes effect',
              figures: true,
              cell: (row) => (row.effectiveOn ? <Day on={row.effectiveOn} /> : '–'),
            },
            { id: 'author', title: 'Drafted by', cell: (row) => row.author || '–' },
            {
              id: 'published',
              title: 'Published',
              cell: (row) =>
                row.publishedAt ? (
                  <span className="whitespace-nowrap">
                    <Moment at={row.publishedAt} />
                    {row.approver ? ` by ${row.approver}` : ''}
                  </span>
                ) : (
                  'not yet'
                ),
            },
            { id: 'note', title: 'Why', cell: (row) => row.note ?? '' },
          ]}
        />
      ) : null}
      <p className="max-w-prose px-gutter py-4 text-ink-2">
        Each line is checked on the version in force on its work day; what was submitted keeps that version
        whatever comes later. A version is published by another engineer than the one who drafted it.
      </p>
    </>
  );
}
