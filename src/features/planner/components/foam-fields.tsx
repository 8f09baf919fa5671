import { useMemo } from 'react';
import { FoldedSection, FormSection } from './form-section.tsx';
import { PlanInput } from './plan-input.tsx';
import { PlanSelect } from './plan-select.tsx';
import { SizeAmounts } from './size-amounts.tsx';
import type { Kind } from '#shared/records/types.ts';
import type { Product } from '#shared/standard/types.ts';

type Props = {
  readonly products: readonly Product[];
  readonly kitsFt3: readonly number[];
  readonly kinds: readonly Kind[];
  /** A work order: spares, and kits counted by hand. */
  readonly order?: boolean;
};

/** Foam, kits, prices, and how far what is measured may be off. */
export function FoamFields({ products, kitsFt3, kinds, order = false }: Props) {
  const options = useMemo(
    () =>
      products.map(({ code, name }) => ({
        value: code,
        label: `${code} ${name.replace(code, '').trim()}`,
      })),
    [products],
  );
  const poles = kinds.includes('set') || kinds.includes('straighten');
  return (
    <>
      <FormSection title="Foam">
        <div className="col-span-2">
          <PlanSelect name="product" options={options} blank={options[0]?.label ?? 'No foam is entered'} />
        </div>
        <PlanInput name="tempF" label="Components at" />
        <PlanInput name="allowancePct" label="Allowance" />
        <div className="col-span-2">
          <PlanInput name="kitsFt3" label="Kit sizes to choose from" />
        </div>
        {order ? <PlanInput name="sparePct" label="Spare kits" /> : null}
      </FormSection>
      <SizeAmounts
        what="price"
        sizes={kitsFt3}
        title="Price of a kit"
        note="For this visit; in the address, nowhere else."
      />
      {order ? (
        <SizeAmounts
          what="hand"
          sizes={kitsFt3}
          title="Kits at hand"
          note="Your own count; it stands for the lots of that size."
        />
      ) : null}
      <FoldedSection
        title="Tolerances"
        note="The void runs from low to high over these. Blank: twice the uncertainty of the owner’s tape (k = 2)."
        open
      >
        {kinds.includes('set') ? <PlanInput name="tolBoreIn" /> : null}
        {poles ? <PlanInput name="tolPoleIn" /> : null}
        {poles ? <PlanInput name="tolDepthIn" /> : null}
        {kinds.some((kind) => kind !== 'set') ? <PlanInput name="tolGapIn" /> : null}
      </FoldedSection>
    </>
  );
}
