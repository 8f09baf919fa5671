import { HistoryList } from '#src/components/evidence/history-list.tsx';
import { LineRevisions } from '#src/components/evidence/line-revisions.tsx';
import { PhotoGrid, PhotoGridSpace } from '#src/components/evidence/photo-grid.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { FindingDecision } from '#src/features/review/components/finding-decision.tsx';
import { FindingItem } from '#src/features/review/components/finding-item.tsx';
import { LineDecision } from '#src/features/review/components/line-decision.tsx';
import { ValueChanges } from '#src/features/review/components/value-changes.tsx';
import type { DeskModel } from '#src/features/review/desk/use-desk.ts';
import { counted } from '#src/lib/formats.ts';

/** Photographs, findings and the word on them. */
export function EvidencePane({ desk, onPhoto }: { desk: DeskModel; onPhoto: (index: number) => void }) {
  const { hand, sheet, whole } = desk;
  const photos = whole ? [] : (sheet.data?.photos ?? []);
  // Known with the list of lines, before the record is.
  const expected = sheet.data ? photos : (desk.record?.photos ?? []);
  const views = new Set(expected.map((photo) => photo.view)).size;
  const decided = desk.due.filter((finding) => finding.state !== 'undecided').length;
  const numbers = new Map(desk.due.map((finding, index) => [finding.id, index + 1]));
  const record = whole ? null : (sheet.data?.record ?? null);
  return (
    <>
      {whole ? null : (
        <section aria-label="Photographs">
          <SectionHead
            title="Evidence"
            aside={
              expected.length === 0
                ? 'no photographs'
                : `${counted(expected.length, 'photograph')}, ${counted(views, 'view')}`
            }
          />
          {photos.length > 0 ? <PhotoGrid photos={photos} onOpen={onPhoto} /> : null}
          {!sheet.data && expected.length > 0 ? <PhotoGridSpace photos={expected} /> : null}
        </section>
      )}
      <section aria-label="Findings">
        <SectionHead
          title={whole ? 'Findings of the batch itself' : 'Findings'}
          aside={
            desk.due.length === 0
              ? 'none to decide'
              : `${desk.due.length}, ${decided === 0 ? 'none' : decided === desk.due.length ? 'all' : decided} decided`
          }
        />
        <ul>
          {desk.findings.map((finding) => {
            const inHand = finding.id === hand.finding?.id;
            return (
              <FindingItem
                key={finding.id}
                finding={finding}
                number={numbers.get(finding.id) ?? null}
                inHand={inHand}
                marked={finding.id === hand.marked}
                onTake={() => hand.take(finding.id)}
                onHover={(on) => hand.hover(on ? finding.id : null)}
              >
                {inHand ? (
                  <FindingDecision
                    finding={finding}
                    saying={hand.saying === 'return' ? null : hand.saying}
                    sending={isAbout(desk, finding.id)}
                    stale={desk.stale === finding.id}
                    say={hand.say}
                    send={desk.send}
                    sendPlain={desk.sendPlain}
                  />
                ) : null}
              </FindingItem>
            );
          })}
        </ul>
        {record ? (
          <LineDecision
            record={record}
            saying={hand.saying}
            sending={isAbout(desk, record.id)}
            say={hand.say}
            send={desk.send}
            sendPlain={desk.sendPlain}
          />
        ) : null}
      </section>
      <ValueChanges items={desk.changes} />
      {sheet.data && !whole ? (
        <details className="border-b border-hairline">
          <summary className="px-gutter py-2.5 text-table font-semibold text-ink-2">
            History, {counted(sheet.data.history.length, 'entry', 'entries')}
          </summary>
          <LineRevisions batch={sheet.data.batch} record={sheet.data.record} />
          <HistoryList entries={sheet.data.history} />
        </details>
      ) : null}
    </>
  );
}

function isAbout({ sending }: DeskModel, id: string): boolean {
  if (!sending) return false;
  return ('finding' in sending ? sending.finding.id : sending.record.id) === id;
}
