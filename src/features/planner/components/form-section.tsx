import type { ReactNode } from 'react';

type Props = { readonly title: string; readonly note?: string; readonly children: ReactNode };

/** A group of fields under its heading, two to a line. */
export function FormSection({ title, note, children }: Props) {
  return (
    <fieldset className="min-w-0 border-b border-hairline px-gutter py-3">
      <legend className="float-left w-full text-table font-semibold text-ink-2">{title}</legend>
      {note ? <p className="clear-both text-small text-muted">{note}</p> : null}
      <div className="clear-both grid grid-cols-2 items-end gap-x-3 gap-y-2.5 pt-1.5">{children}</div>
    </fieldset>
  );
}

/** The same, folded away until it is asked for: what seldom changes. */
export function FoldedSection({ title, note, open = false, children }: Props & { readonly open?: boolean }) {
  return (
    <details className="border-b border-hairline px-gutter py-3" open={open}>
      <summary className="text-table font-semibold text-ink-2 pointer-coarse:min-h-8">{title}</summary>
      {note ? <p className="mt-1 text-small text-muted">{note}</p> : null}
      <div className="grid grid-cols-2 items-end gap-x-3 gap-y-2.5 pt-1.5">{children}</div>
    </details>
  );
}
