import type { ComponentProps } from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { Kbd } from '#src/components/ui/kbd.tsx';
import { classNames } from '#src/lib/class-names.ts';

/** `primary` is the one next step of a page; everything else is secondary or quiet. */
export type ButtonKind = 'primary' | 'secondary' | 'quiet';
export type ButtonSize = 'small' | 'base' | 'large';

type Look = { readonly kind?: ButtonKind; readonly size?: ButtonSize; readonly wide?: boolean };

const KINDS: Record<ButtonKind, string> = {
  primary:
    'border border-accent bg-accent text-on-accent hover:bg-accent/90 disabled:bg-transparent disabled:text-muted',
  secondary: 'border border-ink text-ink hover:bg-sunk disabled:text-muted',
  quiet:
    'text-ink underline decoration-rule underline-offset-4 hover:decoration-ink disabled:text-muted disabled:no-underline',
};
const SIZES: Record<ButtonSize, string> = {
  small: 'min-h-7 px-2.5 text-small pointer-coarse:min-h-11',
  base: 'min-h-8.5 px-3.5 text-table pointer-coarse:min-h-11',
  large: 'min-h-13 px-5 text-lead',
};

function look({ kind = 'secondary', size = 'base', wide }: Look): string {
  return classNames(
    'inline-flex items-center justify-center gap-2.5 font-semibold whitespace-nowrap select-none',
    'disabled:cursor-not-allowed disabled:border-rule print:hidden',
    KINDS[kind],
    kind === 'quiet'
      ? classNames('min-h-7 pointer-coarse:min-h-11', size === 'small' ? 'text-small' : 'text-table')
      : SIZES[size],
    wide && 'w-full',
  );
}

export type ButtonProps = ComponentProps<'button'> &
  Look & {
    /** The key that does the same, shown where it acts. */
    readonly hotkey?: string;
    /** Says what is under way; the button stays in place and does not act twice. */
    readonly busy?: string | false;
  };

export function Button({
  kind,
  size,
  wide,
  hotkey,
  busy,
  children,
  className,
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      className={classNames(look({ kind, size, wide }), className)}
      aria-disabled={busy ? true : undefined}
      aria-keyshortcuts={hotkey}
      onClick={busy ? (event) => event.preventDefault() : onClick}
    >
      {busy || children}
      {hotkey ? <Kbd>{hotkey}</Kbd> : null}
    </button>
  );
}

export function ButtonLink({ kind, size, wide, className, ...rest }: LinkProps & Look) {
  return <Link {...rest} className={classNames(look({ kind, size, wide }), className)} />;
}
