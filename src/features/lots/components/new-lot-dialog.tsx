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

type Props = {
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly onEntered: (lot: LotDetail) => void;
};

export function NewLotDialog({ open, onOpenChange, onEntered }: Props) {
  const products = useQuery({ ...productsQuery, enabled: open });
  const send = useSendLot();
  const form = useForm({ defaultValues: { productId: '', number: '', expiresOn: '' } });
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title="Enter a lot"
      description="As printed on its kits. What was received of it is entered on its own page."
    >
      <AppForm
        form={form}
        label="Enter a lot"
        draftKey="lot new"
        onSubmit={async ({ productId, number, expiresOn }) => {
          onEntered(
            await send('/api/lots', { productId, number: number.trim(), expiresOn: expiresOn || null }),
          );
          form.reset();
        }}
      >
        <SelectField
          name="productId"
          label="Product"
          rules={{ required: 'Choose the product.' }}
          options={(products.data ?? []).map((one) => ({ value: one.id, label: one.code }))}
        />
        <TextField
          name="number"
          label="Lot number"
          rules={{ required: 'Write the number of the lot.' }}
          maxLength={60}
        />
        <TextField name="expiresOn" label="Expires on" type="date" optional />
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Saving…'}>
            Enter the lot
          </Button>
          <Button onClick={() => onOpenChange(false)}>Not now</Button>
        </div>
      </AppForm>
    </Dialog>
  );
}
