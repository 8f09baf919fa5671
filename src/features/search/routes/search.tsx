import { useQuery } from '@tanstack/react-query';
import { Form, Link, useSearchParams } from 'react-router-dom';
import { Button } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Fact, PageBand, SectionHead } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { paths } from '#src/config/paths.ts';
import { searchQuery, type SearchHit } from '#src/features/search/api/search.ts';
import { counted } from '#src/lib/formats.ts';

const KINDS: readonly { type: SearchHit['type']; title: string; to: (id: string) => string }[] = [
  { type: 'record', title: 'On record', to: paths.registerRecord.to },
  { type: 'structure', title: 'Lines handed in', to: paths.record.to },
  { type: 'batch', title: 'Batches', to: paths.batch.to },
  { type: 'work-order', title: 'Work orders', to: paths.workOrder.to },
  { type: 'lot', title: 'Lots', to: paths.lot.to },
  { type: 'concession', title: 'Concessions', to: paths.concession.to },
  { type: 'transmittal', title: 'Transmittals', to: paths.transmittal.to },
];

export function Component() {
  const [params] = useSearchParams();
  const q = (params.get('q') ?? '').trim();
  const { data: hits, error, refetch, isPending } = useQuery(searchQuery(q));
  return (
    <>
      <DocumentTitle>{q ? `Search: ${q}` : 'Search'}</DocumentTitle>
      <PageBand title="Search" facts={hits ? <Fact>{counted(hits.length, 'hit')}</Fact> : null} />
      <Form
        role="search"
        action={paths.search.to()}
        className="flex gap-2 border-b border-hairline px-4 py-3"
      >
        <input
          key={q}
          type="search"
          name="q"
          defaultValue={q}
          aria-label="Number of a structure, record, batch, order, lot, concession or transmittal"
          className="h-9 w-full max-w-100 border border-rule bg-sheet px-3"
        />
        <Button type="submit">Search</Button>
      </Form>
      {q === '' ? (
        <EmptyState title="What are you looking for?">
          Type the beginning of a number: a structure, batch, record, lot or concession.
        </EmptyState>
      ) : error ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : isPending ? (
        <Skeleton />
      ) : hits.length === 0 ? (
        <EmptyState title={`Nothing begins with “${q}”`}>
          Search goes by the beginning of a number. Try fewer characters.
        </EmptyState>
      ) : (
        KINDS.map((kind) => (
          <Hits
            key={kind.type}
            title={kind.title}
            to={kind.to}
            hits={hits.filter((hit) => hit.type === kind.type)}
          />
        ))
      )}
    </>
  );
}

function Hits({
  title,
  hits,
  to,
}: {
  title: string;
  hits: readonly SearchHit[];
  to: (id: string) => string;
}) {
  if (hits.length === 0) return null;
  return (
    <section aria-label={title}>
      <SectionHead title={title} />
      <ul>
        {hits.map((hit) => (
          <li key={hit.id} className="border-b border-hairline">
            <Link to={to(hit.id)} className="flex flex-wrap gap-x-3 px-4 py-2 hover:bg-sheet">
              <span className="font-bold">{hit.label}</span>
              <span className="text-muted">{hit.detail}</span>
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
