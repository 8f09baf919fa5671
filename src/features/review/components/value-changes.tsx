import { SectionHead } from '#src/components/ui/page-band.tsx';
import type { BatchChanges } from '#shared/generated/api-types.ts';

/** Values that differ from the check before: both are shown. */
export function ValueChanges({ items }: { items: BatchChanges['items'] }) {
  if (items.length === 0) return null;
  return (
    <section aria-label="Changed since the check before">
      <SectionHead title="Changed since the check before" aside={items.length} />
      <ul className="px-3 py-1.5 text-table">
        {items.map((item) => (
          <li
            key={`${item.field} ${item.cell ?? item.title}`}
            className="border-b border-hairline py-1 last:border-b-0"
          >
            <span className="font-semibold">{item.title}</span>{' '}
            <del className="text-muted">{item.before ?? 'blank'}</del>{' '}
            <ins className="no-underline">
              <span className="sr-only">now </span>
              <span aria-hidden="true">→ </span>
              {item.after ?? 'blank'}
            </ins>
            {item.cell ? <span className="text-muted"> {item.cell.replace(' ', '!')}</span> : null}
          </li>
        ))}
      </ul>
    </section>
  );
}
