import { useId } from 'react';
import { usePlanForm } from '../lib/plan-form.ts';
import { CONTROL, describedBy, FieldFrame } from '#src/components/form/field-frame.tsx';
import { classNames } from '#src/lib/class-names.ts';
import { planField } from '#shared/planner/plan-fields.ts';

type Props = {
  readonly name: string;
  readonly label?: string;
  readonly hint?: string;
  readonly fault?: string;
};

/** A measure or a list of sizes. What a blank one is taken as stands in it. */
export function PlanInput({ name, label, hint, fault }: Props) {
  const { texts, type, settle, faultOf, assumed } = usePlanForm();
  const field = planField(name);
  const id = useId();
  const error = fault ?? faultOf(name);
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
          value={texts[name] ?? ''}
          placeholder={assumed[name]}
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
}
