import type { ComponentProps } from 'react';
import { CONTROL, FieldFrame, type FieldLook } from '#src/components/form/field-frame.tsx';
import { useField, type FieldRules } from '#src/components/form/use-field.ts';
import { classNames } from '#src/lib/class-names.ts';

type Props = FieldLook & {
  readonly name: string;
  readonly rules?: FieldRules;
  /** Stands inside the control at the right: a value is never typed without its unit in sight. */
  readonly unit?: string;
} & Omit<ComponentProps<'input'>, 'name' | 'ref'>;

/** One line: text, e-mail, password, date, number. */
export function TextField({ name, rules, label, hint, optional, unit, className, ...input }: Props) {
  const { id, error, control } = useField({ name, rules, hint });
  return (
    <FieldFrame id={id} label={label} hint={hint} optional={optional} error={error}>
      <span className="relative block">
        <input
          type="text"
          {...input}
          {...control}
          className={classNames(CONTROL, unit && 'pr-12 text-right', className)}
        />
        {unit ? (
          <span className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-muted">
            {unit}
          </span>
        ) : null}
      </span>
    </FieldFrame>
  );
}
