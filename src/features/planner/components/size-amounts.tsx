import { useId } from 'react';
import { usePlanForm } from '../lib/plan-form.ts';
import { FoldedSection } from './form-section.tsx';
import { CONTROL, describedBy, FieldFrame } from '#src/components/form/field-frame.tsx';
import { amountFault } from '#shared/planner/plan-texts.ts';
import { formatNumber } from '#shared/units/format-quantity.ts';

type What = 'price' | 'hand';
type Props = {
  readonly what: What;
  readonly sizes: readonly number[];
  readonly title: string;
  readonly note: string;
};

/** An amount for each kit size. */
export function SizeAmounts({ what, sizes, title, note }: Props) {
  const { texts } = usePlanForm();
  const given = sizes.some((size) => texts[`${what}-${size}`]);
  if (sizes.length === 0) return null;
  return (
    <FoldedSection title={title} note={note} open={given}>
      {sizes.map((size) => (
        <Amount key={size} what={what} size={size} />
      ))}
    </FoldedSection>
  );
}

function Amount({ what, size }: { readonly what: What; readonly size: number }) {
  const { texts, type, settle } = usePlanForm();
  const id = useId();
  const key = `${what}-${size}`;
  const error = amountFault(texts, what, size) ?? undefined;
  return (
    <FieldFrame id={id} label={`${formatNumber(size, { digits: 4 })} ft³`} error={error}>
      <input
        id={id}
        type="text"
        inputMode="decimal"
        autoComplete="off"
        value={texts[key] ?? ''}
        onChange={(event) => type(key, event.target.value)}
        onBlur={settle}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, undefined, error)}
        className={`${CONTROL} text-right`}
      />
    </FieldFrame>
  );
}
