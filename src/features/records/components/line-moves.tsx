import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { LINE_MOVES, useMoveLine, type LineMove } from '#src/features/records/api/move-line.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';

const WORDS: Record<LineMove, { readonly button: string; readonly title: string; readonly follows: string }> =
  {
    reopen: {
      button: 'Reopen…',
      title: 'Reopen the line',
      follows: 'It is undecided again and can be decided anew. What was decided before stays in its history.',
    },
    'refer-back': {
      button: 'Refer back…',
      title: 'Refer the line back to the inspectors',
      follows: 'It is undecided again and does not go on record until an inspector has decided it anew.',
    },
    abandon: {
      button: 'Abandon…',
      title: 'Abandon the line',
      follows:
        'It stays as not accepted, and its structure is open again on the work order. This cannot be taken back.',
    },
  };

/** What may still be done with a decided line, by the role of the reader. */
export function LineMoves({ record }: { record: RecordRow }) {
  const [open, setOpen] = useState<LineMove | null>(null);
  const moves = LINE_MOVES.filter((move) => record.can.includes(move));
  return (
    <>
      {moves.map((move) => (
        <Button key={move} size="small" onClick={() => setOpen(move)}>
          {WORDS[move].button}
        </Button>
      ))}
      <Dialog
        open={open !== null}
        onOpenChange={() => setOpen(null)}
        title={open ? `${WORDS[open].title}: ${record.structureNumber}` : ''}
        description={open ? WORDS[open].follows : null}
      >
        {open ? <MoveForm key={open} move={open} record={record} onDone={() => setOpen(null)} /> : null}
      </Dialog>
    </>
  );
}

function MoveForm({ move, record, onDone }: { move: LineMove; record: RecordRow; onDone: () => void }) {
  const form = useForm<{ reason: string }>({ defaultValues: { reason: '' } });
  const send = useMoveLine(record.id);
  return (
    <AppForm
      form={form}
      label={WORDS[move].title}
      draftKey={`${record.id}.${move}`}
      onSubmit={async ({ reason }) => {
        await send.mutateAsync({ move, reason: reason.trim() });
        onDone();
      }}
    >
      <TextArea
        name="reason"
        label="Reason"
        hint="It stands in the trail and in the history of the line."
        autoFocus
        rules={{ validate: (value: unknown) => String(value).trim() !== '' || 'Say why.' }}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" kind="primary" busy={send.isPending && 'Sending…'}>
          {WORDS[move].title}
        </Button>
        <Button kind="quiet" onClick={onDone}>
          Cancel
        </Button>
      </div>
    </AppForm>
  );
}
