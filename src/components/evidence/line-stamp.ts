import type { SheetStampData } from '#src/components/drawing/sheet-stamp.tsx';
import { formatInstant } from '#src/lib/formats.ts';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';

/** What is stamped on the sheet of a decided line; null while it is open. */
export function lineStamp(record: RecordRow, findings: readonly FindingRow[]): SheetStampData | null {
  const newest = [record.decision, ...findings.map((finding) => finding.decision)]
    .filter((decision) => decision !== null)
    .toSorted((a, b) => a.at.localeCompare(b.at))
    .at(-1);
  const detail = newest ? `${newest.by}, ${formatInstant(newest.at).replace(/,.*/, '')}` : undefined;
  const conceded = findings.some((finding) => finding.decision?.grounds === 'concession');
  switch (record.state) {
    case 'approved':
      return conceded
        ? { word: 'Concession', tone: 'concession', detail }
        : { word: 'Approved', tone: 'conform', detail };
    case 'on-record':
      return { word: 'On record', tone: conceded ? 'concession' : 'conform' };
    case 'returned':
      return { word: 'Returned', tone: 'nonconform', detail };
    case 'held':
      return { word: 'Concession asked', tone: 'concession', detail };
    case 'abandoned':
      return { word: 'Abandoned', tone: 'nonconform', detail };
    case 'undecided':
      return null;
  }
}
