import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import type { LotDetail } from '#shared/generated/api-types.ts';
import { useSendLot } from '../api/lot.ts';
import { effectsOf, type BlockingType } from './lot-effects.ts';

const WORDS: Record<BlockingType, { title: string; does: string; why: string }> = {
  held: { title: 'Hold', does: 'Hold the lot', why: 'Why it is held' },
  released: { title: 'Release', does: 'Release the lot', why: 'Why it is released' },
  recalled: { title: 'Recall', does: 'Recall the lot', why: 'Why it is recalled' },
};

type Props = { readonly lot: LotDetail; readonly type: BlockingType; readonly onDone: () => void };

/** Says what will happen, asks why, then does it. */
export function BlockLotDialog({ lot, type, onDone }: Props) {
  const send = useSendLot();
  const form = useForm({ defaultValues: { reason: '' } });
  const words = WORDS[type];
  return (
    <Dialog
      open
      onOpenChange={onDone}
      title={`${words.title} lot ${lot.number}`}
      description={
        <ul className="mt-1 grid list-disc gap-1 pl-5">
          {effectsOf(lot, type).map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      }
    >
      <AppForm
        form={form}
        label={words.does}
        draftKey={`lot ${type} ${lot.id}`}
        onSubmit={async ({ reason }) => {
          await send(`/api/lots/${lot.id}/events`, { type, reason: reason.trim() });
          onDone();
        }}
      >
        <TextArea
          name="reason"
          label={words.why}
          hint={type === 'released' ? undefined : 'The contractors read it.'}
          rows={3}
          rules={{ validate: (text: string) => text.trim() !== '' || 'Say why.' }}
        />
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Saving…'}>
            {words.does}
          </Button>
          <Button onClick={onDone}>Leave it as it is</Button>
        </div>
      </AppForm>
    </Dialog>
  );
}
