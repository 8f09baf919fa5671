import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { batchFindingsQuery } from '../api/batch-findings.ts';
import { batchLinesQuery } from '../api/batch-lines.ts';
import { usePhotosPrepared } from '../api/batch-photos.ts';
import { useCheck } from '../api/use-check.ts';
import { BatchHead } from './batch-head.tsx';
import { BatchTabs, readTab, type BatchTab } from './batch-tabs.tsx';
import { EarlierRevision } from './earlier-revision.tsx';
import { Intake } from './intake.tsx';
import { SubmitBar } from './submit-bar.tsx';
import { SubmitDialog } from './submit-dialog.tsx';
import { useFileDrop } from './use-file-drop.ts';
import { useIntake } from './use-intake.ts';
import { WithdrawDialog } from './withdraw-dialog.tsx';
import { LINE_FILTERS } from '../lib/filter-lines.ts';
import { joinFindings } from '../lib/line-view.ts';
import { whyNotSubmit } from '../lib/why-not-submit.ts';
import { RulesOff } from '#src/components/evidence/rules-off.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { useUser } from '#src/lib/session/session.ts';
import type { Batch } from '#shared/generated/api-types.ts';

const NONE: never[] = [];

export function BatchPage({ batch }: { batch: Batch }) {
  const user = useUser();
  const [search, setSearch] = useSearchParams();
  const filters = useFilters(LINE_FILTERS);
  const [dialog, setDialog] = useState<'submit' | 'withdraw' | null>(null);
  const revision = readRevision(search.get('revision'), batch);
  // By its number: asked without one, a revision that was not checked yet would show the lines of the one before.
  const n = revision ?? batch.revision.number;
  const lines = useQuery(batchLinesQuery(batch.id, n));
  const findings = useQuery(batchFindingsQuery(batch.id, n));
  usePhotosPrepared(batch.id);
  const check = useCheck(batch);
  const intake = useIntake(batch);
  const view = useMemo(
    () => joinFindings(lines.data ?? NONE, findings.data ?? NONE),
    [lines.data, findings.data],
  );
  const newest = revision === null;
  const open = newest && batch.can.includes('upload');
  const over = useFileDrop(open ? intake.take : null);
  const returned = open && batch.revision.number > 0;
  const tab = readTab(search.get('tab'), { returned, checked: batch.status !== 'draft' });

  function go(changes: Readonly<Record<string, string | null>>): void {
    setSearch(
      (current) => {
        const next = new URLSearchParams(current);
        for (const [name, value] of Object.entries(changes)) {
          if (value === null) next.delete(name);
          else next.set(name, value);
        }
        return next;
      },
      { preventScrollReset: true },
    );
  }
  const show = (which: 'incomplete' | 'want') => {
    setDialog(null);
    go({ tab: 'lines', show: which, severity: null, rule: null, structure: null });
  };

  return (
    <>
      <DocumentTitle>{`Batch ${batch.number}`}</DocumentTitle>
      <BatchHead
        batch={batch}
        revision={revision}
        withContractor={user.role !== 'contractor'}
        onRevision={(n) => go({ revision: n === null ? null : String(n), tab: 'lines', show: null })}
      />
      <div className="grid flex-1 content-start lg:grid-cols-[21rem_minmax(0,1fr)] lg:content-stretch">
        <aside
          aria-label="Files and check"
          className="lg:sticky lg:top-band lg:max-h-[calc(100dvh-2.75rem)] lg:self-start lg:overflow-y-auto"
        >
          {revision === null ? (
            <Intake
              batch={batch}
              view={view}
              check={check}
              intake={intake}
              onUnplaced={() => go({ tab: 'photos' })}
            />
          ) : (
            <EarlierRevision
              batchId={batch.id}
              revision={revision}
              onNewest={() => go({ revision: null, tab: null, show: null })}
            />
          )}
          <RulesOff batchId={batch.id} revision={n} />
        </aside>
        <div className="flex min-h-[50dvh] min-w-0 flex-col border-hairline lg:border-l">
          <BatchTabs
            tab={tab}
            onTab={(next: BatchTab) => go({ tab: next })}
            batch={batch}
            revision={revision}
            returned={returned}
            view={view}
            queries={{ lines, findings }}
            filters={filters}
            onPhotograph={intake.photograph}
          />
        </div>
      </div>
      {newest ? (
        <SubmitBar
          batch={batch}
          onSubmit={() => setDialog('submit')}
          onWithdraw={() => setDialog('withdraw')}
        />
      ) : null}
      {dialog === 'submit' ? (
        <SubmitDialog
          batch={batch}
          view={view}
          hindrances={whyNotSubmit(batch, view, intake.counts)}
          onClose={() => setDialog(null)}
          onShow={show}
        />
      ) : null}
      {dialog === 'withdraw' ? <WithdrawDialog batch={batch} onClose={() => setDialog(null)} /> : null}
      {over ? (
        <div className="pointer-events-none fixed inset-3 z-40 flex items-center justify-center border-2 border-dashed border-accent bg-paper/90 text-title font-semibold">
          Let go: workbook and photographs are sorted by themselves
        </div>
      ) : null}
    </>
  );
}

/** Null: the newest. */
function readRevision(text: string | null, batch: Batch): number | null {
  const n = text === null || !/^\d{1,5}$/.test(text) ? Number.NaN : Number(text);
  return n < batch.revision.number ? n : null;
}
