import type { DataColumn } from '#src/components/table/columns.ts';
import { Moment } from '#src/components/ui/moment.tsx';
import { STATUS_WORDS, StateWord } from '#src/components/ui/state-word.tsx';
import { TakeButton } from '#src/features/review/components/take-button.tsx';
import { ageWords } from '#src/features/review/desk/age-words.ts';
import { formatCount } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

export const QUEUE_COLUMNS: readonly DataColumn<Batch>[] = [
  { id: 'number', title: 'Batch', main: true, min: 5, grow: 0, cell: (batch) => batch.number },
  {
    id: 'order',
    title: 'Work order',
    min: 11,
    grow: 2,
    cell: ({ workOrder }) => `${workOrder.number} · ${workOrder.title}`,
  },
  { id: 'contractor', title: 'Contractor', min: 10, grow: 2, cell: (batch) => batch.contractor.name },
  {
    id: 'revision',
    title: 'Revision',
    figures: true,
    min: 4.5,
    grow: 0,
    cell: (batch) => batch.revision.number,
  },
  {
    id: 'age',
    title: 'Waits for',
    figures: true,
    min: 6.5,
    grow: 0,
    cell: ({ revision }) => (revision.submittedAt ? ageWords(revision.submittedAt, new Date()) : ''),
  },
  {
    id: 'submitted',
    title: 'Submitted',
    off: true,
    min: 9.5,
    cell: ({ revision }) => (revision.submittedAt ? <Moment at={revision.submittedAt} /> : ''),
  },
  {
    id: 'lines',
    title: 'Lines',
    figures: true,
    min: 3.5,
    grow: 0,
    cell: (batch) => formatCount(batch.counts.lines),
  },
  {
    id: 'nonconformities',
    title: 'Nonconformities',
    figures: true,
    min: 7.5,
    grow: 0,
    cell: (batch) => formatCount(batch.counts.nonconformity),
  },
  {
    id: 'queries',
    title: 'Queries',
    figures: true,
    min: 4.5,
    grow: 0,
    cell: (batch) => formatCount(batch.counts.query),
  },
  {
    id: 'decided',
    title: 'Decided',
    figures: true,
    min: 5,
    grow: 0,
    cell: ({ counts }) => `${formatCount(counts.decided)} of ${formatCount(counts.lines)}`,
  },
  {
    id: 'holder',
    title: 'With',
    min: 9,
    grow: 1,
    cell: (batch) =>
      batch.revision.inspector ? (
        batch.revision.inspector.name
      ) : (
        <StateWord {...STATUS_WORDS[batch.status]}>nobody yet</StateWord>
      ),
  },
  { id: 'take', title: 'Take', min: 5, grow: 0, cell: (batch) => <TakeButton batch={batch} /> },
];
