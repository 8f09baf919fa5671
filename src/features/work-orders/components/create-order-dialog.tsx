import { useQuery } from '@tanstack/react-query';
import { useForm, useWatch } from 'react-hook-form';
import { contractorsQuery } from '../api/contractors.ts';
import { useCreateWorkOrder } from '../api/create-work-order.ts';
import { DESIGN_COLUMNS, parseDesignList } from '../lib/parse-design-list.ts';
import { AppForm } from '#src/components/form/app-form.tsx';
import { SelectField } from '#src/components/form/select-field.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { counted } from '#src/lib/formats.ts';

type Props = { readonly onClose: () => void; readonly onCreated: (id: string) => void };

const ZONES = [
  'America/New_York',
  'America/Chicago',
  'America/Denver',
  'America/Phoenix',
  'America/Los_Angeles',
  'America/Anchorage',
  'Pacific/Honolulu',
].map((zone) => ({ value: zone, label: zone.replace('_', ' ') }));
const EMPTY = { number: '', title: '', contractorId: '', zone: '', structures: '' };
const MOST_FAULTS = 5;

export function CreateOrderDialog({ onClose, onCreated }: Props) {
  const contractors = useQuery(contractorsQuery);
  const create = useCreateWorkOrder();
  const form = useForm({ defaultValues: EMPTY });
  const rows = useWatch({ control: form.control, name: 'structures' });
  const { structures } = parseDesignList(rows);
  return (
    <Dialog
      open
      wide
      onOpenChange={(open) => !open && onClose()}
      title="New work order"
      description="It is let to one contractor, who then sees its design list and hands in batches of it."
    >
      <AppForm
        form={form}
        draftKey="new-work-order"
        label="New work order"
        onSubmit={async ({ structures: text, ...order }) => {
          const made = await create.mutateAsync({
            ...order,
            structures: [...parseDesignList(text).structures],
          });
          onCreated(made.id);
        }}
      >
        <div className="grid gap-4 sm:grid-cols-2">
          <TextField
            name="number"
            label="Number"
            hint="Batches are numbered after it: 17-01, 17-02."
            rules={{ required: 'Give the number of the work order.' }}
          />
          <TextField
            name="title"
            label="Title"
            rules={{ required: 'Give a title, such as the line or road.' }}
          />
          <SelectField
            name="contractorId"
            label="Contractor"
            rules={{ required: 'Choose the contractor.' }}
            options={(contractors.data ?? []).map(({ id, name }) => ({ value: id, label: name }))}
          />
          <SelectField
            name="zone"
            label="Time zone"
            hint="Times in its workbooks are read in this zone."
            rules={{ required: 'Choose the time zone of the work.' }}
            options={ZONES}
          />
        </div>
        <TextArea
          name="structures"
          label="Design list"
          rows={8}
          hint={`One structure a row, pasted from a sheet or typed with commas: ${DESIGN_COLUMNS.join('; ')}. What is not designed stays blank.`}
          rules={{ validate: faultsOf }}
        />
        <p className="text-table text-muted" aria-live="polite">
          {counted(structures.length, 'structure')} read
        </p>
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={create.isPending ? 'Creating' : false}>
            Create the work order
          </Button>
          <Button onClick={onClose}>Not now</Button>
        </div>
      </AppForm>
    </Dialog>
  );
}

function faultsOf(text: string): true | string {
  const { structures, faults } = parseDesignList(text);
  if (faults.length > 0) {
    const more = faults.length - MOST_FAULTS;
    return (
      faults
        .slice(0, MOST_FAULTS)
        .map((fault) => fault.text)
        .join(' ') + (more > 0 ? ` And ${more} more.` : '')
    );
  }
  if (structures.length === 0) return 'Give at least one structure.';
  return structures.length <= 5000 || 'A work order has at most 5,000 structures: part it.';
}
