import { useForm, useWatch } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { RadioField } from '#src/components/form/radio-field.tsx';
import { SelectField } from '#src/components/form/select-field.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { useWorkOrderOptions } from '#src/lib/filters/reference-options.ts';
import type { FilterValues } from '#src/lib/filters/filter-params.ts';
import type { Transmittal, TransmittalBody } from '#shared/generated/api-types.ts';
import { useIssueTransmittal } from '../api/issue-transmittal.ts';
import { readRecordNumbers } from './scope-text.ts';
import { useScopeWords } from './use-scope-words.ts';

/** Named as the request names them, so that a refusal lands beside its field. */
type Values = {
  of: 'workOrder' | 'recordNumbers' | 'filter';
  scope: { workOrder: string; recordNumbers: string };
  title: string;
};
type Props = {
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  /** The register's filter that one came from; null: none. */
  readonly filter: FilterValues | null;
  readonly onIssued: (made: Transmittal) => void;
};

function scopeOf(values: Values, filter: FilterValues | null): TransmittalBody['scope'] {
  if (values.of === 'workOrder') return { workOrder: values.scope.workOrder };
  if (values.of === 'filter') return { filter: { ...filter } };
  const [first = '', ...rest] = readRecordNumbers(values.scope.recordNumbers);
  return { recordNumbers: [first, ...rest] };
}

export function IssueDialog({ open, onOpenChange, filter, onIssued }: Props) {
  const issue = useIssueTransmittal();
  const workOrders = useWorkOrderOptions();
  const words = useScopeWords();
  const form = useForm<Values>({
    defaultValues: {
      of: filter ? 'filter' : 'workOrder',
      scope: { workOrder: '', recordNumbers: '' },
      title: '',
    },
  });
  const of = useWatch({ control: form.control, name: 'of' });
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title="Issue an as-built workbook"
      description="It holds the versions on record now. Once issued it stays as it is, byte for byte; a later state is issued as its next revision. Clerks and auditors are told by e-mail."
    >
      <AppForm
        form={form}
        label="Issue a transmittal"
        draftKey="transmittal issue"
        onSubmit={async (values) => {
          onIssued(await issue({ scope: scopeOf(values, filter), title: values.title.trim() || undefined }));
          form.reset();
        }}
      >
        <RadioField
          name="of"
          label="Of what"
          options={[
            { value: 'workOrder', label: 'A work order' },
            { value: 'recordNumbers', label: 'Chosen record numbers' },
            {
              value: 'filter',
              label: 'The register as filtered',
              note: filter
                ? words({ filter })
                : 'Filter the register, then press Issue there; without a filter it is the whole register.',
            },
          ]}
        />
        {of === 'workOrder' ? (
          <SelectField
            name="scope.workOrder"
            label="Work order"
            options={workOrders}
            rules={{ required: 'Choose the work order.', shouldUnregister: true }}
          />
        ) : null}
        {of === 'recordNumbers' ? (
          <TextArea
            name="scope.recordNumbers"
            label="Record numbers"
            hint="As R-000017, parted by blanks, commas or lines."
            rows={4}
            rules={{
              shouldUnregister: true,
              validate: (text: string) =>
                readRecordNumbers(text).length > 0 || 'Write at least one record number.',
            }}
          />
        ) : null}
        <TextField
          name="title"
          label="Title"
          optional
          hint="Stands on the cover; blank: made from the scope."
          maxLength={200}
        />
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Sending…'}>
            Issue
          </Button>
          <Button onClick={() => onOpenChange(false)}>Not now</Button>
        </div>
      </AppForm>
    </Dialog>
  );
}
