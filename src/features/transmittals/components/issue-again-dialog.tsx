import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import type { Transmittal, TransmittalBody } from '#shared/generated/api-types.ts';
import { useIssueTransmittal } from '../api/issue-transmittal.ts';

type Props = {
  readonly one: Transmittal;
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly onIssued: (made: Transmittal) => void;
};

/** The same scope, as the register stands now, as the next revision. */
export function IssueAgainDialog({ one, open, onOpenChange, onIssued }: Props) {
  const issue = useIssueTransmittal();
  const form = useForm({ defaultValues: { title: one.title } });
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Issue ${one.number} again`}
      description={`The same scope, with the versions on record now, as its next revision. Revision ${one.revision} stays as it was issued.`}
    >
      <AppForm
        form={form}
        label="Issue again"
        onSubmit={async ({ title }) =>
          onIssued(
            await issue({
              // The scope goes back as it was given out.
              scope: one.scope as TransmittalBody['scope'],
              title: title.trim() || undefined,
              supersedes: one.id,
            }),
          )
        }
      >
        <TextField name="title" label="Title" optional maxLength={200} />
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Sending…'}>
            Issue the next revision
          </Button>
          <Button onClick={() => onOpenChange(false)}>Not now</Button>
        </div>
      </AppForm>
    </Dialog>
  );
}
