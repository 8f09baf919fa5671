import { memo, useId } from 'react';
import { usePlanForm, type PlanForm } from '../lib/plan-form.ts';
import { CONTROL, describedBy, FieldFrame } from '#src/components/form/field-frame.tsx';
import { classNames } from '#src/lib/class-names.ts';
import { planField } from '#shared/planner/plan-fields.ts';

type Props = { readonly name: string; readonly label?: string; readonly hint?: string };

/** A measure or a list of sizes. What a blank one is taken as stands in it. */
export function PlanInput(props: Props) {
  const { texts, type, settle, faultOf, assumed } = usePlanForm();
  const { name } = props;
  return (
    <Input
      {...props}
      value={texts[name] ?? ''}
      error={faultOf(name)}
      assumed={assumed[name]}
      type={type}
      settle={settle}
    />
  );
}

type InputProps = Props &
  Pick<PlanForm, 'type' | 'settle'> & {
    readonly value: string;
    readonly error: string | undefined;
    readonly assumed: string | undefined;
  };

/** A key in one field paints that field, not the form. */
const Input = memo(function Input({ name, label, hint, value, error, assumed, type, settle }: InputProps) {
  const field = planField(name);
  const id = useId();
  const unit = field?.unit ?? '';
  const wide = field?.read === 'text' || field?.read === 'sizes';
  return (
    <FieldFrame id={id} label={label ?? field?.title ?? name} hint={hint} error={error}>
      <span className="relative block">
        <input
          id={id}
          type="text"
          inputMode={field?.read === 'number' ? 'decimal' : undefined}
          autoComplete="off"
          value={value}
          placeholder={assumed}
          onChange={(event) => type(name, event.target.value)}
          onBlur={settle}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, hint, error)}
          className={classNames(
            CONTROL,
            unit && (unit.length > 3 ? 'pr-20' : 'pr-10'),
            !wide && 'text-right',
          )}
        />
        {unit ? (
          <span className="pointer-events-none absolute inset-y-0 right-2.5 flex items-center text-muted">
            {unit}
          </span>
        ) : null}
      </span>
    </FieldFrame>
  );
});
