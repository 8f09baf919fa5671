import { formatInstant } from '#shared/dates/format-moment.ts';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';
import type { SheetStampData } from './sheet-types.ts';

/** What is stamped on the sheet of a decided line; null while it is open. Days by `zone` (IANA), else by the reader's own. */
export function lineStamp(
  record: RecordRow,
  findings: readonly FindingRow[],
  zone?: string,
): SheetStampData | null {
  const newest = [record.decision, ...findings.map((finding) => finding.decision)]
    .filter((decision) => decision !== null)
    .toSorted((a, b) => a.at.localeCompare(b.at))
    .at(-1);
  const detail = newest ? `${newest.by}, ${formatInstant(newest.at, zone).replace(/,.*/, '')}` : undefined;
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
