import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useAnswerFinding } from '../api/answer-finding.ts';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Moment } from '#src/components/ui/moment.tsx';
import { readDraft } from '#src/lib/session/drafts.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

type Props = { readonly finding: FindingRow; readonly batchId: string };

/** The contractor's answer in writing: what stands, and the form to give or change it. What is typed is kept until it is sent. */
export function AnswerBox({ finding, batchId }: Props) {
  const draftKey = `answer.${finding.id}`;
  const mayAnswer = finding.can.includes('answer');
  const [writing, setWriting] = useState(() => mayAnswer && readDraft(draftKey) !== null);
  const { answer } = finding;
  return (
    <div className={answer || writing ? 'w-full' : undefined}>
      {answer && !writing ? (
        <blockquote className="border-l-[3px] border-hairline pl-3 text-table">
          <p className="whitespace-pre-wrap text-ink">{answer.text}</p>
          <p className="text-small text-muted">
            Answer by {answer.by}, <Moment at={answer.at} />
          </p>
        </blockquote>
      ) : null}
      {mayAnswer && !writing ? (
        <Button kind="quiet" size="small" onClick={() => setWriting(true)}>
          {answer ? 'Change the answer' : 'Answer in writing'}
          <span className="sr-only">
            : {finding.structureNumber} {finding.title}
          </span>
        </Button>
      ) : null}
      {writing ? (
        <AnswerForm
          finding={finding}
          batchId={batchId}
          draftKey={draftKey}
          onDone={() => setWriting(false)}
        />
      ) : null}
    </div>
  );
}

type FormProps = Props & { readonly draftKey: string; readonly onDone: () => void };

function AnswerForm({ finding, batchId, draftKey, onDone }: FormProps) {
  const send = useAnswerFinding(batchId);
  const form = useForm({ defaultValues: { text: finding.answer?.text ?? '' } });
  return (
    <AppForm
      form={form}
      draftKey={draftKey}
      label={`Answer to ${finding.title}`}
      onSubmit={async ({ text }) => {
        await send.mutateAsync({ findingId: finding.id, text });
        onDone();
      }}
    >
      <TextArea
        name="text"
        label="Your answer"
        hint="Kept as it is written, and shown to inspector and auditor."
        autoFocus
        rules={{
          required: 'Write an answer, or close this.',
          maxLength: { value: 4000, message: 'At most 4,000 characters.' },
        }}
      />
      <div className="flex gap-3">
        <Button type="submit" busy={send.isPending ? 'Sending' : false}>
          Keep this answer
        </Button>
        <Button kind="quiet" onClick={onDone}>
          Close
        </Button>
      </div>
    </AppForm>
  );
}
