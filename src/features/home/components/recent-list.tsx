import { Link } from 'react-router-dom';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Moment } from '#src/components/ui/moment.tsx';
import type { Recent } from '#src/features/home/api/home.ts';

export function RecentList({ items }: { items: readonly Recent[] }) {
  return (
    <section aria-labelledby="recent" className="border-hairline bg-sheet max-lg:border-t lg:border-l">
      <SectionHead id="recent" title="Lately" aside={items.length > 0 ? `last ${items.length}` : null} />
      {items.length === 0 ? <p className="px-gutter py-4 text-table text-muted">Nothing yet.</p> : null}
      <ul>
        {items.map((item) => (
          <li
            key={`${item.at} ${item.title}`}
            className="border-b border-hairline px-gutter py-2.5 text-table"
          >
            <p className="font-semibold">
              {item.to ? (
                <Link to={item.to} className="hover:underline">
                  {item.title}
                </Link>
              ) : (
                item.title
              )}
            </p>
            <p className="text-muted">
              <Moment at={item.at} />
              {item.detail ? ` · ${item.detail}` : null}
            </p>
          </li>
        ))}
      </ul>
    </section>
  );
}
