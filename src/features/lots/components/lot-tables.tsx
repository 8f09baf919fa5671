import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { Day, Moment } from '#src/components/ui/moment.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { LINE_WORDS, StateWord } from '#src/components/ui/state-word.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { kindWord } from '#src/lib/filters/rule-options.ts';
import { counted, formatCount } from '#src/lib/formats.ts';
import type { LotDetail, LotEvent } from '#shared/generated/api-types.ts';
import { EVENT_WORDS } from './lot-words.tsx';

type Use = LotDetail['uses'][number];

const EVENTS: readonly PlainColumn<LotEvent>[] = [
  { id: 'type', title: 'What', cell: (row) => <b>{EVENT_WORDS[row.type]}</b> },
  {
    id: 'kits',
    title: 'Kits',
    figures: true,
    cell: (row) =>
      row.quantity === null || row.kitFt3 === null ? (
        ''
      ) : (
        <>
          {formatCount(row.quantity)} × <Quantity value={row.kitFt3} unit="ft3" />
        </>
      ),
  },
  {
    id: 'volume',
    title: 'Foam',
    figures: true,
    cell: (row) =>
      row.quantity === null || row.kitFt3 === null ? (
        ''
      ) : (
        <Quantity value={row.quantity * row.kitFt3} unit="ft3" />
      ),
  },
  { id: 'reason', title: 'Reason', cell: (row) => row.reason ?? '–' },
  { id: 'at', title: 'When', cell: (row) => <Moment at={row.at} /> },
  { id: 'by', title: 'By', cell: (row) => row.by || '–' },
];

const USES: readonly PlainColumn<Use>[] = [
  {
    id: 'structure',
    title: 'Structure',
    cell: (row) => (
      <TextLink to={paths.record.to(row.recordId)} className="font-semibold">
        {row.structureNumber}
      </TextLink>
    ),
  },
  { id: 'kind', title: 'Kind', cell: (row) => kindWord(row.kind) },
  { id: 'state', title: 'State', cell: (row) => <StateWord {...LINE_WORDS[row.state]} /> },
  {
    id: 'used',
    title: 'Foam of this lot',
    figures: true,
    cell: (row) => <Quantity value={row.usedFt3} unit="ft3" />,
  },
  { id: 'batch', title: 'Batch', cell: (row) => row.batch.number },
  { id: 'contractor', title: 'Contractor', cell: (row) => row.contractor.name },
  {
    id: 'day',
    title: 'Installed',
    figures: true,
    cell: (row) => (row.workDay ? <Day on={row.workDay} /> : 'not known'),
  },
];

/** Receipts and steps, newest first, then every structure with foam of the lot. */
export function LotTables({ lot }: { lot: LotDetail }) {
  return (
    <>
      <SectionHead title="Receipts and steps" aside={counted(lot.events.length, 'entry', 'entries')} />
      {lot.events.length === 0 ? (
        <p className="px-gutter py-3 text-ink-2">Nothing was received of it yet.</p>
      ) : (
        <PlainTable
          caption="Receipts and steps"
          columns={EVENTS}
          rows={lot.events}
          rowKey={(row) => row.id}
        />
      )}
      <div className="h-5" />
      <SectionHead title="Structures with foam of this lot" aside={counted(lot.uses.length, 'structure')} />
      {lot.uses.length === 0 ? (
        <p className="px-gutter py-3 text-ink-2">None so far.</p>
      ) : (
        <PlainTable
          caption="Structures with foam of this lot"
          columns={USES}
          rows={lot.uses}
          rowKey={(row) => row.recordId}
        />
      )}
    </>
  );
}
