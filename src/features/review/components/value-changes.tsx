import { SectionHead } from '#src/components/ui/page-band.tsx';
import { formatWallClock } from '#src/lib/formats.ts';
import type { BatchChanges } from '#shared/generated/api-types.ts';

/** Values that differ from the workbook before, of a later revision from the one that was decided: both are shown. */
export function ValueChanges({ items }: { items: BatchChanges['items'] }) {
  if (items.length === 0) return null;
  return (
    <section aria-label="Changed since the workbook before">
      <SectionHead title="Changed since the workbook before" aside={items.length} />
      <ul className="px-3 py-1.5 text-table">
        {items.map((item) => (
          <li
            key={`${item.title} ${item.cell} ${item.before} ${item.after}`}
            className="border-b border-hairline py-1 last:border-b-0"
          >
            <Title text={item.title} /> <del className="text-muted">{words(item.before)}</del>{' '}
            <ins className="no-underline">
              <span className="sr-only">now </span>
              <span aria-hidden="true">→ </span>
              {words(item.after)}
            </ins>
            {item.cell ? <span className="text-muted"> {item.cell.replace(' ', '!')}</span> : null}
          </li>
        ))}
      </ul>
    </section>
  );
}

/** `Kit size (event 2, pour 1)`: the thing in bold, which one of several beside it. */
function Title({ text }: { text: string }) {
  const at = text.indexOf(' (');
  if (at < 0) return <span className="font-semibold">{text}</span>;
  return (
    <>
      <span className="font-semibold">{text.slice(0, at)}</span>
      <span className="text-muted">{text.slice(at)}</span>
    </>
  );
}

function words(value: string | number | null): string {
  if (value === null || value === '') return 'blank';
  return typeof value === 'string' ? formatWallClock(value) : String(value);
}
