import type { ReactNode } from 'react';
import { TypedInput } from './typed-input.tsx';
import type { PlacedFinding } from '../lib/place-findings.ts';
import { inputId, type TypedField } from '../lib/typed-fields.ts';
import type { TypedValues } from '#shared/workbook/typed-workbook.ts';

type Props = {
  readonly title: string;
  readonly fields: readonly TypedField[];
  readonly pour: number | null;
  readonly values: TypedValues;
  readonly placed: ReadonlyMap<string, readonly PlacedFinding[]>;
  /** Inputs that were left once: a blank one is told of from then on. */
  readonly left: ReadonlySet<string>;
  readonly onChange: (key: string, value: string) => void;
  readonly onLeave: (input: string) => void;
  readonly children?: ReactNode;
};

/** Fields that belong together. */
export function TypedFieldset(props: Props) {
  const { title, fields, pour, values, placed, left, onChange, onLeave, children } = props;
  return (
    <fieldset className="border-b border-hairline px-gutter py-4">
      <legend className="float-left mb-2 w-full text-table font-semibold text-ink-2">{title}</legend>
      <div className="clear-both grid gap-x-6 gap-y-4 sm:grid-cols-2 xl:grid-cols-3">
        {fields.map((field) => {
          const id = inputId(pour, field.key);
          const findings = placed.get(id) ?? [];
          return (
            <TypedInput
              key={field.key}
              field={field}
              pour={pour}
              value={values[field.key] ?? ''}
              findings={left.has(id) ? findings : findings.filter((one) => !one.blank)}
              onChange={(value) => onChange(field.key, value)}
              onLeave={() => onLeave(id)}
            />
          );
        })}
      </div>
      {children}
    </fieldset>
  );
}
