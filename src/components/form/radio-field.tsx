import { FieldNotes } from '#src/components/form/field-frame.tsx';
import { useField, type FieldRules } from '#src/components/form/use-field.ts';
import type { Option } from '#src/components/form/select-field.tsx';

type Props = {
  readonly name: string;
  readonly label: string;
  readonly hint?: string;
  readonly rules?: FieldRules;
  /** `note` says what the choice means. */
  readonly options: readonly (Option & { readonly note?: string })[];
};

/** One of a few, all in sight. */
export function RadioField({ name, label, hint, rules, options }: Props) {
  const { id, error, control } = useField({ name, rules, hint });
  const { 'aria-describedby': described, onChange, onBlur, name: group, ref } = control;
  return (
    <fieldset
      aria-describedby={described}
      className={error ? 'border-l-[3px] border-nonconform pl-3' : undefined}
    >
      <legend className="text-table font-semibold">{label}</legend>
      <FieldNotes id={id} hint={hint} error={error} />
      <div className="mt-1 grid gap-1">
        {options.map((option) => (
          <label key={option.value} className="flex items-start gap-2.5 py-0.5 pointer-coarse:py-2.5">
            <input
              type="radio"
              name={group}
              ref={ref}
              onChange={onChange}
              onBlur={onBlur}
              value={option.value}
              className="mt-1 size-4 accent-ink"
            />
            <span>
              {option.label}
              {option.note ? <span className="block text-small text-muted">{option.note}</span> : null}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
