import type { ReactNode } from 'react';
import { FieldNotes } from '#src/components/form/field-frame.tsx';
import { useField, type FieldRules } from '#src/components/form/use-field.ts';

type Props = {
  readonly name: string;
  readonly label: ReactNode;
  readonly hint?: string;
  readonly rules?: FieldRules;
};

export function CheckboxField({ name, label, hint, rules }: Props) {
  const { id, error, control } = useField({ name, rules, hint });
  return (
    <div>
      <label htmlFor={id} className="flex items-start gap-2.5 py-0.5 pointer-coarse:py-2.5">
        <input type="checkbox" {...control} className="mt-1 size-4 accent-ink" />
        <span>{label}</span>
      </label>
      <FieldNotes id={id} hint={hint} error={error} />
    </div>
  );
}
