import { useEffect, useState } from 'react';
import { useForm } from 'react-hook-form';
import { RadioField } from '#src/components/form/radio-field.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { DecisionForm, type FormFrame } from '#src/features/review/components/decision-form.tsx';
import { dayFrom } from '#src/features/review/desk/day-from.ts';
import type { FindingDecisionBody, FindingRow } from '#shared/generated/api-types.ts';

type Values = { action: '' | 'correct' | 'rework' | 'repair'; dueOn: string; reason: string };
type Props = FormFrame & {
  readonly finding: FindingRow;
  readonly onSend: (request: FindingDecisionBody) => Promise<unknown>;
};

const USUAL_DAYS = 14;

/** Rejects, and says what is due by when and why. */
export function RejectForm({ finding, onSend, ...frame }: Props) {
  const [dueOn] = useState(() => dayFrom(new Date(), USUAL_DAYS));
  const form = useForm<Values>({ defaultValues: { action: '', dueOn, reason: '' } });
  const { setFocus } = form;
  useEffect(() => setFocus('action'), [setFocus]);
  return (
    <DecisionForm
      {...frame}
      form={form}
      label={`Reject: ${finding.title}`}
      action="Reject"
      onSubmit={({ action, dueOn, reason }) =>
        onSend({
          decision: 'reject',
          action: action || null,
          dueOn: dueOn || null,
          reason: reason.trim() || null,
        })
      }
    >
      <RadioField
        name="action"
        label="What is due"
        rules={{ required: 'Say what is due: correct the record, rework or repair.' }}
        options={[
          {
            value: 'correct',
            label: 'Correct the record',
            note: 'The work may stand; what was written does not.',
          },
          { value: 'rework', label: 'Rework', note: 'Make it conform.' },
          { value: 'repair', label: 'Repair', note: 'Make it usable, though it will not conform.' },
        ]}
      />
      <TextField
        name="dueOn"
        type="date"
        label="Due by"
        rules={{ required: 'Say by which day it is due.' }}
      />
      <TextArea
        name="reason"
        label="Why, in words for the contractor"
        rows={2}
        rules={{
          validate: (value: unknown) =>
            String(value).trim() !== '' || 'Say why, so that the contractor knows what to mend.',
        }}
      />
    </DecisionForm>
  );
}
