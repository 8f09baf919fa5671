import { DataList } from '#src/components/table/data-list.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { PageBand } from '#src/components/ui/page-band.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { paths } from '#src/config/paths.ts';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { counted } from '#src/lib/formats.ts';
import type { CapturedMail } from '#shared/generated/api-types.ts';
import { MAIL_COLUMNS } from '../components/mail-columns.tsx';

const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['Enter'], does: 'open' },
] as const;

/** What this installation would have sent: it keeps its messages itself. */
export function Component() {
  const list = useKeysetList<CapturedMail>({ key: 'mail', path: '/api/mail' });
  const columns = useColumns({
    columns: MAIL_COLUMNS,
    rows: list.rows,
    rowKey: (row) => row.id,
    storageKey: 'mail',
  });
  const sends = list.error instanceof ApiProblem && list.error.status === 404;
  return (
    <>
      <DocumentTitle>Mail</DocumentTitle>
      <PageBand title="Mail" facts={<span>kept here instead of being sent, newest first</span>} />
      {sends ? (
        <EmptyState title="This installation sends its mail">
          Messages go to a mail server, so none are kept here. Those that could not be sent stand among the
          parked jobs.
        </EmptyState>
      ) : (
        <DataList
          label="Captured mail"
          list={list}
          columns={columns}
          rowTo={(row) => paths.mailMessage.to(row.id)}
          empty={
            <EmptyState title="No message yet">
              A message is written when a batch comes in or goes back, a concession is asked for, a
              transmittal is issued, a lot is held, or a person is invited.
            </EmptyState>
          }
        />
      )}
      <StatusBar
        left={
          list.isPending || sends
            ? undefined
            : `${counted(list.rows.length, 'message')}${list.hasMore ? ' and more' : ''}`
        }
        keys={KEYS}
      />
    </>
  );
}
