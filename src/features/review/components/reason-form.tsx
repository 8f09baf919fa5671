import { useForm } from 'react-hook-form';
import { TextArea } from '#src/components/form/text-area.tsx';
import { DecisionForm, type FormFrame } from '#src/features/review/components/decision-form.tsx';

type Props = FormFrame & {
  readonly title: string;
  readonly label: string;
  readonly hint?: string;
  readonly missing: string;
  readonly action: string;
  readonly onSend: (reason: string) => Promise<unknown>;
};

/** A decision that needs nothing but its reason: a concession asked for, a line returned. */
export function ReasonForm({ title, label, hint, missing, action, onSend, ...frame }: Props) {
  const form = useForm<{ reason: string }>({ defaultValues: { reason: '' } });
  return (
    <DecisionForm
      {...frame}
      form={form}
      label={title}
      action={action}
      onSubmit={({ reason }) => onSend(reason.trim())}
    >
      <TextArea
        name="reason"
        label={label}
        hint={hint}
        rows={2}
        autoFocus
        rules={{ validate: (value: unknown) => String(value).trim() !== '' || missing }}
      />
    </DecisionForm>
  );
}
