import { useForm, useWatch } from 'react-hook-form';
import { RadioField } from '#src/components/form/radio-field.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { DecisionForm, type FormFrame } from '#src/features/review/components/decision-form.tsx';
import type { FindingDecisionBody, FindingRow } from '#shared/generated/api-types.ts';

type Values = { grounds: 'evidence' | 'answer'; reason: string };
type Props = FormFrame & {
  readonly finding: FindingRow;
  readonly onSend: (request: FindingDecisionBody) => Promise<unknown>;
};

/** Approves on evidence, or, for a query that was answered, on the answer. */
export function ApproveForm({ finding, onSend, ...frame }: Props) {
  const answered = finding.severity === 'query' && finding.answer !== null;
  const form = useForm<Values>({ defaultValues: { grounds: answered ? 'answer' : 'evidence', reason: '' } });
  const grounds = useWatch({ control: form.control, name: 'grounds' });
  const onEvidence = grounds === 'evidence';
  return (
    <DecisionForm
      {...frame}
      form={form}
      label={`Approve: ${finding.title}`}
      action="Approve"
      onSubmit={({ grounds, reason }) =>
        onSend({ decision: 'approve', grounds, reason: reason.trim() || null })
      }
    >
      {answered ? (
        <RadioField
          name="grounds"
          label="Ground"
          options={[
            { value: 'answer', label: 'Answer', note: 'The contractor’s answer is accepted.' },
            {
              value: 'evidence',
              label: 'Evidence',
              note: 'A photograph or a field check shows that it does not stand.',
            },
          ]}
        />
      ) : null}
      <TextArea
        name="reason"
        label={onEvidence ? 'What the photograph or field check shows' : 'Remark'}
        optional={!onEvidence}
        rows={2}
        autoFocus
        rules={{
          validate: (value: unknown) =>
            !onEvidence || String(value).trim() !== '' || 'Say what the photograph or field check shows.',
        }}
      />
    </DecisionForm>
  );
}
