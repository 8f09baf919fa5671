import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { counted } from '#src/lib/formats.ts';
import type { RegisterCandidate, RegisterEntriesReply } from '#shared/generated/api-types.ts';
import { useEnterRecords } from '../api/enter-records.ts';

type Props = {
  readonly chosen: readonly RegisterCandidate[];
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly onEntered: (reply: RegisterEntriesReply) => void;
};

/** Says first what entering does; asks why where something on record is superseded. */
export function EnterDialog({ chosen, open, onOpenChange, onEntered }: Props) {
  const form = useForm({ defaultValues: { reason: '' } });
  const enter = useEnterRecords();
  const superseding = chosen.filter((row) => row.supersedes !== null);
  const names = superseding.map((row) => `${row.structureNumber} (${row.supersedes})`);
  const shown = names.slice(0, 6).join(', ') + (names.length > 6 ? ` and ${names.length - 6} more` : '');
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Enter ${counted(chosen.length, 'line')} on the register`}
      description="All of them or none. What is entered stays for good: a later correction supersedes it, nothing overwrites it."
    >
      <AppForm
        form={form}
        label="Enter on the register"
        draftKey="register enter"
        onSubmit={async ({ reason }) => {
          onEntered(
            await enter({ recordIds: chosen.map((row) => row.recordId), reason: reason.trim() || null }),
          );
          form.reset({ reason: '' });
        }}
      >
        {superseding.length > 0 ? (
          <>
            <p className="text-ink-2">
              <b className="text-ink">{counted(superseding.length, 'line')}</b> of them stand on record
              already and will get a further version: {shown}.
            </p>
            <TextArea
              name="reason"
              label="Why the new versions supersede the old ones"
              rows={3}
              rules={{ required: 'Say why a new version supersedes the old one.' }}
            />
          </>
        ) : (
          <p className="text-ink-2">Each gets a record number of its own.</p>
        )}
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Entering…'}>
            Enter {counted(chosen.length, 'line')}
          </Button>
          <Button onClick={() => onOpenChange(false)}>Not now</Button>
        </div>
      </AppForm>
    </Dialog>
  );
}
