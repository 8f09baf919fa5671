import { Link, type LinkProps } from 'react-router-dom';
import { classNames } from '#src/lib/class-names.ts';

/** A link inside text: underlined, since colour alone would not tell it. */
export function TextLink({ className, ...rest }: LinkProps) {
  return (
    <Link
      {...rest}
      className={classNames(
        'text-ink underline decoration-rule underline-offset-4 hover:decoration-ink',
        className,
      )}
    />
  );
}
