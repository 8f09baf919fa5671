import { useForm, useWatch } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { RadioField } from '#src/components/form/radio-field.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { useDecideConcession } from '#src/features/concessions/api/concession.ts';
import type { Concession } from '#shared/generated/api-types.ts';

type Values = { decision: '' | 'grant' | 'refuse'; reason: string; condition: string; endsOn: string };

/** The engineer's answer. It cannot be taken back, and says so. */
export function AnswerForm({ concession }: { concession: Concession }) {
  const form = useForm<Values>({ defaultValues: { decision: '', reason: '', condition: '', endsOn: '' } });
  const decision = useWatch({ control: form.control, name: 'decision' });
  const answer = useDecideConcession(concession.id);
  return (
    <AppForm
      form={form}
      label={`Answer to ${concession.number}`}
      draftKey={`concession.${concession.id}`}
      onSubmit={({ decision, reason, condition, endsOn }) =>
        answer.mutateAsync({
          version: concession.version,
          body: {
            decision: decision === 'grant' ? 'grant' : 'refuse',
            reason: reason.trim(),
            ...(decision === 'grant' ? { condition: condition.trim() || null, endsOn: endsOn || null } : {}),
          },
        })
      }
    >
      <RadioField
        name="decision"
        label="Your answer"
        rules={{ required: 'Choose: grant or refuse.' }}
        options={[
          {
            value: 'grant',
            label: 'Grant',
            note: 'Accepted as built. The record stays non-conforming in the register and in every filter.',
          },
          { value: 'refuse', label: 'Refuse', note: 'The line goes back: to the inspector, or as rework.' },
        ]}
      />
      <TextArea
        name="reason"
        label="Reason"
        hint="It is read by the contractor and by auditors."
        rows={4}
        rules={{ validate: (value: unknown) => String(value).trim() !== '' || 'Say why.' }}
      />
      {decision === 'grant' ? (
        <>
          <TextArea
            name="condition"
            label="Condition"
            hint="What has to be done or watched. It is kept as an open action of the contractor."
            optional
            rows={2}
          />
          <TextField
            name="endsOn"
            type="date"
            label="Ends on"
            hint="The day by which the condition is met."
            optional
          />
        </>
      ) : null}
      <div>
        <Button type="submit" kind="primary" busy={answer.isPending && 'Sending…'}>
          {decision === 'refuse'
            ? 'Refuse the concession'
            : decision === 'grant'
              ? 'Grant the concession'
              : 'Answer'}
        </Button>
        <p className="mt-1.5 text-small text-muted">An answer cannot be taken back.</p>
      </div>
    </AppForm>
  );
}
