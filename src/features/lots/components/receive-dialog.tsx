import { useQuery } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { SelectField } from '#src/components/form/select-field.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { productsQuery } from '#src/lib/api/reference-lists.ts';
import type { LotDetail } from '#shared/generated/api-types.ts';
import { useSendLot } from '../api/lot.ts';

type Props = { readonly lot: LotDetail; readonly onDone: () => void };

export function ReceiveDialog({ lot, onDone }: Props) {
  const send = useSendLot();
  const products = useQuery(productsQuery);
  const body = products.data?.find((one) => one.id === lot.product.id)?.body;
  const sizes = Array.isArray(body?.['kitsFt3'])
    ? body['kitsFt3'].filter((size): size is number => typeof size === 'number')
    : [];
  const form = useForm({ defaultValues: { kitFt3: '', quantity: '' } });
  return (
    <Dialog
      open
      onOpenChange={onDone}
      title={`Kits received of ${lot.number}`}
      description="Adds to the balance of the lot. A receipt stays as it is entered: compare size and count with the delivery note first."
    >
      <AppForm
        form={form}
        label="Kits received"
        draftKey={`lot received ${lot.id}`}
        onSubmit={async ({ kitFt3, quantity }) => {
          await send(`/api/lots/${lot.id}/events`, {
            type: 'received',
            kitFt3: Number(kitFt3),
            quantity: Number(quantity),
          });
          onDone();
        }}
      >
        <SelectField
          name="kitFt3"
          label="Kit size"
          rules={{ required: 'Choose the kit size.' }}
          options={sizes.map((size) => ({ value: String(size), label: `${size} ft³` }))}
        />
        <TextField
          name="quantity"
          label="How many kits"
          inputMode="numeric"
          unit="kits"
          rules={{
            validate: (text: string) =>
              /^[1-9]\d{0,5}$/.test(text.trim()) || 'Write a whole number of kits, 1 or more.',
          }}
        />
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Saving…'}>
            Add the receipt
          </Button>
          <Button onClick={onDone}>Not now</Button>
        </div>
      </AppForm>
    </Dialog>
  );
}
