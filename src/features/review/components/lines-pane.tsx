import { Button } from '#src/components/ui/button.tsx';
import { RulesOff } from '#src/components/evidence/rules-off.tsx';
import { Tabs } from '#src/components/ui/tabs.tsx';
import { useApproveClean } from '#src/features/review/api/approve-clean.ts';
import { LineList } from '#src/features/review/components/line-list.tsx';
import { isUnder, type DeskTab } from '#src/features/review/desk/desk-tabs.ts';
import type { DeskModel } from '#src/features/review/desk/use-desk.ts';
import { counted } from '#src/lib/formats.ts';
import type { Batch, RecordRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly desk: DeskModel;
  readonly batch: Batch;
  readonly lines: readonly RecordRow[];
  /** Undecided lines without findings. */
  readonly clean: number;
};

const TAB_WORDS: Record<DeskTab, string> = {
  undecided: 'Undecided',
  findings: 'Findings',
  returned: 'Returned',
  changed: 'Changed',
  all: 'All',
};

export function LinesPane({ desk, batch, lines, clean }: Props) {
  const approve = useApproveClean(batch.id);
  const count = (tab: DeskTab) => lines.filter((line) => isUnder(tab, line, desk.changed)).length;
  // A view that would be empty in most batches is not offered until there is something in it.
  const tabs = (Object.keys(TAB_WORDS) as DeskTab[])
    .map((value) => ({ value, label: TAB_WORDS[value], count: value === 'all' ? undefined : count(value) }))
    .filter(
      ({ value, count }) =>
        count !== 0 || value === 'undecided' || value === 'findings' || value === desk.place.tab,
    );
  return (
    <>
      <Tabs pane label="Which lines" value={desk.place.tab} onChange={desk.place.setTab} tabs={tabs}>
        <div className="flex h-full min-h-0 flex-col max-lg:h-[60dvh]">
          <LineList lines={desk.listed} selected={desk.line} onSelect={desk.select} ownFindings={desk.own} />
        </div>
      </Tabs>
      <RulesOff batchId={batch.id} revision={shownRevision(batch)} />
      {clean > 0 && batch.can.includes('close-review') ? (
        <div className="shrink-0 border-t border-hairline px-3 py-2">
          {approve.error ? (
            <p role="alert" className="mb-1 text-table text-nonconform">
              {approve.error.message}
            </p>
          ) : null}
          <Button
            size="small"
            wide
            className="py-1 whitespace-normal!"
            busy={approve.isPending && 'Approving…'}
            onClick={() => approve.mutate()}
          >
            Approve {clean === 1 ? 'the one line' : `all ${counted(clean, 'line')}`} without findings
          </Button>
        </div>
      ) : null}
    </>
  );
}

/** What is decided here was submitted; a newer revision is the contractor's until they submit it. */
function shownRevision({ status, revision }: Batch): number {
  const open = status === 'draft' || status === 'checking' || status === 'checked';
  return open ? revision.number - 1 : revision.number;
}
