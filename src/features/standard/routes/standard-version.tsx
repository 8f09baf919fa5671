import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams, useSearchParams } from 'react-router-dom';
import { ButtonLink } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Day } from '#src/components/ui/moment.tsx';
import { Fact, PageBand, SectionHead } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { paths } from '#src/config/paths.ts';
import { localToday } from '#src/lib/local-today.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { StandardVersion } from '#shared/generated/api-types.ts';
import { standardVersionsQuery } from '../api/standard.ts';
import { ChangesView } from '../components/changes-view.tsx';
import { DraftForm } from '../components/draft-form.tsx';
import { PublishPanel } from '../components/publish-panel.tsx';
import { ruleChanges } from '../components/rule-changes.ts';
import { ruleRows } from '../components/rule-table.ts';
import { RulesView } from '../components/rules-view.tsx';
import { standOf, StandardState } from '../components/standard-state.tsx';

export function Component() {
  const { n } = useParams();
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const mayDraft = useCan('create', 'Standard');
  const versions = useQuery(standardVersionsQuery);
  const all = versions.data ?? [];
  const one = all.find((each) => String(each.n) === n);
  const drafting = mayDraft && search.get('draft') === '1';
  const title = drafting ? `Draft from version ${n}` : `Standard, version ${n}`;
  return (
    <>
      <DocumentTitle>{title}</DocumentTitle>
      <PageBand
        title={title}
        facts={one ? <Facts one={one} all={all} /> : null}
        actions={
          one && mayDraft && !drafting ? (
            <ButtonLink size="small" to="?draft=1">
              Draft from it
            </ButtonLink>
          ) : null
        }
      />
      {versions.isPending ? <Skeleton lines={10} /> : null}
      {versions.isError ? (
        <ErrorState error={versions.error} what="The standard" onRetry={() => void versions.refetch()} />
      ) : null}
      {versions.isSuccess && !one ? (
        <EmptyState
          title={`There is no version ${n}`}
          action={<ButtonLink to={paths.standard.to()}>See all versions</ButtonLink>}
        />
      ) : null}
      {one && drafting ? (
        <DraftForm
          key={one.n}
          base={one}
          onDrafted={(made) => void navigate(paths.standardVersion.to(made.n))}
          onLeave={() => void navigate(paths.standardVersion.to(one.n))}
        />
      ) : null}
      {one && !drafting ? <Version one={one} all={all} /> : null}
    </>
  );
}

type OneOfAll = { readonly one: StandardVersion; readonly all: readonly StandardVersion[] };

function Facts({ one, all }: OneOfAll) {
  return (
    <>
      <StandardState stand={standOf(one, { all, today: localToday() })} />
      {one.effectiveOn ? (
        <Fact word="takes effect">
          <Day on={one.effectiveOn} />
        </Fact>
      ) : null}
      <Fact word="drafted by">{one.author || 'nobody known'}</Fact>
      {one.approver ? <Fact word="published by">{one.approver}</Fact> : null}
    </>
  );
}

function Version({ one, all }: OneOfAll) {
  const rows = ruleRows(one.body);
  const before = all
    .filter((each) => each.n < one.n && each.state === 'published')
    .toSorted((a, b) => b.n - a.n)[0];
  return (
    <>
      {one.state === 'draft' ? <PublishPanel one={one} /> : null}
      {one.note ? <p className="max-w-prose px-gutter py-3 text-ink-2">Why: {one.note}</p> : null}
      {before ? (
        <ChangesView
          changes={ruleChanges(before.body, one.body)}
          before={`version ${before.n}`}
          after={`version ${one.n}`}
        />
      ) : null}
      <SectionHead title="Rules" aside={`${rows.filter((row) => row.on).length} of ${rows.length} on`} />
      <RulesView rows={rows} />
    </>
  );
}
