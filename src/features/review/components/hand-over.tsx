import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { SelectField } from '#src/components/form/select-field.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { inspectorsQuery, useHandOver } from '#src/features/review/api/hand-over.ts';
import type { Batch, Person } from '#shared/generated/api-types.ts';

/** The administrator's way to move a review that is stuck: to another inspector, or to a first one. */
export function HandOver({ batch }: { batch: Batch }) {
  const [open, setOpen] = useState(false);
  if (!batch.can.includes('assign')) return null;
  return (
    <>
      <Button onClick={() => setOpen(true)}>Hand to an inspector…</Button>
      {open ? <HandOverDialog batch={batch} onClose={() => setOpen(false)} /> : null}
    </>
  );
}

function HandOverDialog({ batch, onClose }: { batch: Batch; onClose: () => void }) {
  const people = useQuery(inspectorsQuery);
  const holder = batch.revision.inspector;
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={`Hand the review of ${batch.number} to an inspector`}
      description={
        holder
          ? `${holder.name} holds it now and can decide nothing more of it afterwards. What is decided already stays.`
          : 'No inspector has taken it yet. Afterwards the contractor can no longer withdraw it.'
      }
    >
      {people.error ? (
        <ErrorState error={people.error} what="The inspectors" onRetry={() => void people.refetch()} />
      ) : people.data ? (
        <HandOverForm
          batch={batch}
          inspectors={people.data.filter(({ id }) => id !== holder?.id)}
          onClose={onClose}
        />
      ) : (
        <Skeleton lines={3} />
      )}
    </Dialog>
  );
}

type FormProps = {
  readonly batch: Batch;
  readonly inspectors: readonly Person[];
  readonly onClose: () => void;
};

function HandOverForm({ batch, inspectors, onClose }: FormProps) {
  const handOver = useHandOver(batch.id);
  const form = useForm({ defaultValues: { inspectorId: '', reason: '' } });
  if (inspectors.length === 0)
    return (
      <>
        <p className="mb-4">
          There is no other inspector with an open account. Invite one on the People page first.
        </p>
        <Button onClick={onClose}>Leave it as it is</Button>
      </>
    );
  return (
    <AppForm
      form={form}
      label={`Hand over ${batch.number}`}
      draftKey={`hand-over ${batch.id}`}
      onSubmit={async ({ inspectorId, reason }) => {
        await handOver.mutateAsync({ inspectorId, ...(reason.trim() ? { reason: reason.trim() } : {}) });
        onClose();
      }}
    >
      <SelectField
        name="inspectorId"
        label="Inspector"
        rules={{ required: 'Choose who is to review it.' }}
        options={inspectors.map(({ id, name }) => ({ value: id, label: name }))}
      />
      <TextArea name="reason" label="Why" hint="Kept in the trail." optional rows={2} />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Handing over…'}>
          Hand it over
        </Button>
        <Button onClick={onClose}>Leave it as it is</Button>
      </div>
    </AppForm>
  );
}
