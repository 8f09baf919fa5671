import { useId } from 'react';
import { useFormContext, type RegisterOptions } from 'react-hook-form';
import { describedBy } from '#src/components/form/field-frame.tsx';

export type FieldRules = RegisterOptions;

/** What every control of a form needs: its registration, its id, its error and the attributes that tell about it. */
export function useField({ name, rules, hint }: { name: string; rules?: FieldRules; hint?: string }) {
  const { register, getFieldState, formState } = useFormContext();
  const id = useId();
  const error = getFieldState(name, formState).error?.message;
  return {
    id,
    error,
    control: {
      id,
      ...register(name, rules),
      'aria-invalid': error ? (true as const) : undefined,
      'aria-describedby': describedBy(id, hint, error),
    },
  };
}
