import { CONTROL, FieldFrame, type FieldLook } from '#src/components/form/field-frame.tsx';
import { useField, type FieldRules } from '#src/components/form/use-field.ts';
import { classNames } from '#src/lib/class-names.ts';

type Props = FieldLook & {
  readonly name: string;
  readonly rules?: FieldRules;
  readonly rows?: number;
  readonly autoFocus?: boolean;
};

export function TextArea({ name, rules, label, hint, optional, rows = 3, autoFocus }: Props) {
  const { id, error, control } = useField({ name, rules, hint });
  return (
    <FieldFrame id={id} label={label} hint={hint} optional={optional} error={error}>
      <textarea {...control} rows={rows} autoFocus={autoFocus} className={classNames(CONTROL, 'py-1.5')} />
    </FieldFrame>
  );
}
