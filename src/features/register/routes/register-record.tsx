import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { RecordDrawing } from '#src/components/drawing/record-drawing.tsx';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { ButtonLink } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Day, Moment } from '#src/components/ui/moment.tsx';
import { Fact, PageBand, SectionHead } from '#src/components/ui/page-band.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { StateWord } from '#src/components/ui/state-word.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { kindWord } from '#src/lib/filters/rule-options.ts';
import { counted } from '#src/lib/formats.ts';
import type { RegisterRow } from '#shared/generated/api-types.ts';
import { registerVersionsQuery } from '../api/register-versions.ts';
import { Pole } from '../components/pole.tsx';
import { Conformity } from '../components/conformity.tsx';

const COLUMNS: readonly PlainColumn<RegisterRow>[] = [
  {
    id: 'version',
    title: 'Version',
    cell: (row) => (
      <TextLink to={paths.record.to(row.recordId)} className="font-semibold">
        Version {row.version}, record sheet
      </TextLink>
    ),
  },
  {
    id: 'current',
    title: 'Stands',
    cell: (row) =>
      row.current ? (
        <StateWord glyph="tick" word="current" />
      ) : (
        <StateWord glyph="dotted" word="superseded" />
      ),
  },
  { id: 'state', title: 'State', cell: (row) => <Conformity row={row} /> },
  { id: 'pole', title: 'Pole', cell: (row) => <Pole pole={row.pole} /> },
  {
    id: 'embedment',
    title: 'Embedment',
    figures: true,
    // A pad has neither depth; what is due is due of a pole that is set.
    cell: (row) => (row.kind === 'relevel' ? '–' : <Quantity value={row.embedmentFt} unit="ft" />),
  },
  {
    id: 'due',
    title: 'Due',
    figures: true,
    cell: (row) => (row.kind === 'set' ? <Quantity value={row.dueFt} unit="ft" /> : '–'),
  },
  {
    id: 'fill',
    title: 'Fill ratio',
    figures: true,
    cell: (row) => <Quantity value={row.fillRatio} unit="ratio" plusMinus={row.fillRatioU} />,
  },
  { id: 'lots', title: 'Lots', cell: (row) => row.lots.join(', ') || '–' },
  {
    id: 'installed',
    title: 'Installed',
    figures: true,
    cell: (row) => (row.installedOn ? <Day on={row.installedOn} /> : 'not known'),
  },
  {
    id: 'entered',
    title: 'Entered',
    cell: (row) => (
      <span className="whitespace-nowrap">
        <Moment at={row.enteredAt} /> by {row.enteredBy}
      </span>
    ),
  },
];

/** One structure on record with every version that ever stood. */
export function Component() {
  const { recordNumber = '' } = useParams();
  const versions = useQuery(registerVersionsQuery(recordNumber));
  const rows = versions.data ?? [];
  const newest = rows.find((row) => row.current) ?? rows[0];
  return (
    <>
      <DocumentTitle>{recordNumber}</DocumentTitle>
      <PageBand
        title={recordNumber}
        facts={
          newest ? (
            <>
              <Fact word="structure">
                <b>{newest.structureNumber}</b>
              </Fact>
              <Fact>{kindWord(newest.kind)}</Fact>
              <Fact word="work order">
                <TextLink to={paths.workOrder.to(newest.workOrder.id)}>{newest.workOrder.number}</TextLink>
              </Fact>
              <Fact word="by">{newest.contractor.name}</Fact>
            </>
          ) : null
        }
        actions={
          newest ? (
            <ButtonLink kind="primary" size="small" to={paths.record.to(newest.recordId)}>
              Open the record sheet
            </ButtonLink>
          ) : null
        }
      />
      {versions.isPending ? <Skeleton lines={4} /> : null}
      {versions.isError ? (
        <ErrorState
          error={versions.error}
          what={`Record ${recordNumber}`}
          onRetry={() => void versions.refetch()}
        />
      ) : null}
      {newest ? (
        <>
          <SectionHead title="Versions" aside={counted(rows.length, 'version')} />
          <PlainTable
            caption={`Versions of ${recordNumber}`}
            columns={COLUMNS}
            rows={rows}
            rowKey={(row) => row.id}
          />
          <Supersedings rows={rows} />
          <SectionHead title="Drawing" aside={`of version ${newest.version}`} />
          <div className="max-w-4xl px-gutter py-3">
            <RecordDrawing recordId={newest.recordId} />
          </div>
        </>
      ) : null}
    </>
  );
}

function Supersedings({ rows }: { rows: readonly RegisterRow[] }) {
  const later = rows.filter((row) => row.supersedes !== null);
  return (
    <div className="max-w-prose px-gutter py-4 text-ink-2">
      {later.length === 0 ? (
        <p>
          Nothing has superseded this record. A correction is entered as a further version; this one stays as
          it was entered.
        </p>
      ) : (
        <ul className="grid gap-2">
          {later.map((row) => (
            <li key={row.id}>
              <span className="font-semibold text-ink">
                Version {row.version} superseded version {row.supersedes}
              </span>{' '}
              on <Moment at={row.enteredAt} />, entered by {row.enteredBy}:{' '}
              {row.reason ?? 'no reason was kept'}
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
