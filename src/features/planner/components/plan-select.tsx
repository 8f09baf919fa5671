import { memo, useId } from 'react';
import { usePlanForm, type PlanForm } from '../lib/plan-form.ts';
import { CONTROL, describedBy, FieldFrame } from '#src/components/form/field-frame.tsx';
import { planField } from '#shared/planner/plan-fields.ts';

type Option = { readonly value: string; readonly label: string };
type Props = {
  readonly name: string;
  readonly label?: string;
  readonly hint?: string;
  /** Instead of the field's own codes; the same list each time. */
  readonly options?: readonly Option[];
  /** What no choice means. */
  readonly blank?: string;
};

const KIND_LABELS: Readonly<Record<string, string>> = { relevel: 're-level' };

/** A choice. What cannot be known, as from an old address, stays in sight as such. */
export function PlanSelect(props: Props) {
  const { texts, type, settle, faultOf } = usePlanForm();
  const { name } = props;
  return <Select {...props} value={texts[name] ?? ''} error={faultOf(name)} type={type} settle={settle} />;
}

type SelectProps = Props &
  Pick<PlanForm, 'type' | 'settle'> & { readonly value: string; readonly error: string | undefined };

const Select = memo(function Select(props: SelectProps) {
  const { name, label, hint, options, blank, value, error, type, settle } = props;
  const field = planField(name);
  const id = useId();
  const codes = field?.codes ?? [];
  const offered =
    options ?? codes.map((code) => ({ value: code, label: KIND_LABELS[code] ?? code.replaceAll('-', ' ') }));
  const known = value === '' || offered.some((one) => one.value === value);
  return (
    <FieldFrame id={id} label={label ?? field?.title ?? name} hint={hint} error={error}>
      <select
        id={id}
        value={value}
        onChange={(event) => type(name, event.target.value)}
        onBlur={settle}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, hint, error)}
        className={CONTROL}
      >
        {blank !== undefined || value === '' ? <option value="">{blank ?? 'Choose'}</option> : null}
        {known ? null : <option value={value}>{value}</option>}
        {offered.map((one) => (
          <option key={one.value} value={one.value}>
            {one.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
});
