import type { ReactNode } from 'react';
import { Glyph } from '#src/components/ui/glyph.tsx';

export type FieldLook = {
  readonly label: string;
  /** What is asked and in which form, before it is asked. */
  readonly hint?: string;
  readonly optional?: boolean;
};

type Props = FieldLook & { readonly id: string; readonly error?: string; readonly children: ReactNode };

export const CONTROL =
  'min-h-9 w-full border border-rule bg-sheet px-3 text-base text-ink aria-invalid:border-nonconform aria-invalid:border-2 disabled:bg-sunk disabled:text-muted pointer-coarse:min-h-11';

/** Ids of hint and error, for `aria-describedby`. */
export function describedBy(
  id: string,
  hint: string | undefined,
  error: string | undefined,
): string | undefined {
  return [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ') || undefined;
}

export function FieldFrame({ id, label, hint, optional, error, children }: Props) {
  return (
    <div className={error ? 'border-l-[3px] border-nonconform pl-3' : undefined}>
      <label htmlFor={id} className="block text-table font-semibold">
        {label}
        {optional ? <span className="font-normal text-muted"> (may stay blank)</span> : null}
      </label>
      <FieldNotes id={id} hint={hint} error={error} />
      <div className="mt-1">{children}</div>
    </div>
  );
}

export function FieldNotes({ id, hint, error }: { id: string; hint?: string; error?: string }) {
  return (
    <>
      {hint ? (
        <p id={`${id}-hint`} className="text-small text-muted">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p
          id={`${id}-error`}
          className="mt-0.5 flex items-start gap-1.5 text-table font-semibold text-nonconform"
        >
          <Glyph name="triangle" className="mt-0.5" />
          {error}
        </p>
      ) : null}
    </>
  );
}
