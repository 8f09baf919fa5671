import type { PlainColumn } from '#src/components/table/plain-table.tsx';
import { Day, Moment } from '#src/components/ui/moment.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import type { StandardVersion } from '#shared/generated/api-types.ts';
import { StandardState, type Stand } from './standard-state.tsx';

export const VERSION_COLUMNS: readonly PlainColumn<StandardVersion & { readonly stand: Stand }>[] = [
  {
    id: 'n',
    title: 'Version',
    cell: (row) => (
      <TextLink to={paths.standardVersion.to(row.n)} className="font-semibold whitespace-nowrap">
        Version {row.n}
      </TextLink>
    ),
  },
  { id: 'title', title: 'Title', cell: (row) => row.title },
  {
    id: 'state',
    title: 'State',
    cell: (row) => <StandardState stand={row.stand} />,
  },
  {
    id: 'day',
    title: 'Takes effect',
    figures: true,
    cell: (row) => (row.effectiveOn ? <Day on={row.effectiveOn} /> : '–'),
  },
  { id: 'author', title: 'Drafted by', cell: (row) => row.author || '–' },
  {
    id: 'published',
    title: 'Published',
    cell: (row) =>
      row.publishedAt ? (
        <span className="whitespace-nowrap">
          <Moment at={row.publishedAt} />
          {row.approver ? ` by ${row.approver}` : ''}
        </span>
      ) : (
        'not yet'
      ),
  },
  { id: 'note', title: 'Why', cell: (row) => row.note ?? '' },
];
