import { useId, type ReactNode } from 'react';

type Props = { readonly title: string; readonly note?: string; readonly children: ReactNode };

/** A small chart under its title. What is drawn also stands as text inside. */
export function ChartFigure({ title, note, children }: Props) {
  const id = useId();
  return (
    <figure aria-labelledby={id} className="min-w-0">
      <figcaption className="mb-2 flex flex-wrap items-baseline justify-between gap-x-4">
        <span id={id} className="text-table font-semibold text-ink-2">
          {title}
        </span>
        {note ? <span className="text-micro text-muted">{note}</span> : null}
      </figcaption>
      {children}
    </figure>
  );
}
