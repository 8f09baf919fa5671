import { CONTROL, FieldFrame, type FieldLook } from '#src/components/form/field-frame.tsx';
import { useField, type FieldRules } from '#src/components/form/use-field.ts';

export type Option = { readonly value: string; readonly label: string };

type Props = FieldLook & {
  readonly name: string;
  readonly rules?: FieldRules;
  readonly options: readonly Option[];
  /** The first, empty choice. */
  readonly blank?: string;
};

export function SelectField({ name, rules, label, hint, optional, options, blank = 'Choose' }: Props) {
  const { id, error, control } = useField({ name, rules, hint });
  return (
    <FieldFrame id={id} label={label} hint={hint} optional={optional} error={error}>
      <select {...control} className={CONTROL}>
        <option value="">{blank}</option>
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}
