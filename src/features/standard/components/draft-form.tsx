import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { counted } from '#src/lib/formats.ts';
import type { StandardVersion } from '#shared/generated/api-types.ts';
import { useDraftStandard } from '../api/standard.ts';
import { ChangesView } from './changes-view.tsx';
import { draftBody, draftValues, type DraftValues } from './draft-values.ts';
import { ruleChanges } from './rule-changes.ts';
import { RuleFields } from './rule-fields.tsx';
import { ruleRows } from './rule-table.ts';

type Props = {
  readonly base: StandardVersion;
  readonly onDrafted: (made: StandardVersion) => void;
  readonly onLeave: () => void;
};

/** The next version, edited from an existing one: rules, their limits, the day it takes effect. */
export function DraftForm({ base, onDrafted, onLeave }: Props) {
  const send = useDraftStandard();
  const [rows] = useState(() => ruleRows(base.body));
  const form = useForm<DraftValues>({ defaultValues: draftValues(rows) });
  const values = useWatch({ control: form.control }) as DraftValues;
  const changes = ruleChanges(base.body, draftBody(base.body, values));
  return (
    <div className="[&_[role=alert]]:mx-gutter [&_[role=alert]]:mt-3">
      <AppForm
        form={form}
        label={`Draft from version ${base.n}`}
        draftKey={`standard from ${base.n}`}
        onSubmit={async (typed) => {
          onDrafted(
            await send({
              title: base.title,
              effectiveOn: typed.effectiveOn,
              note: typed.note.trim() || null,
              body: draftBody(base.body, typed),
            }),
          );
        }}
      >
        <div className="grid max-w-3xl gap-4 px-gutter pt-4 sm:grid-cols-2">
          <TextField
            name="effectiveOn"
            label="Takes effect on"
            type="date"
            hint="Work of this day and later is checked on it; never a day before it is published."
            rules={{ required: 'Choose the day from which it holds.' }}
          />
          <TextArea
            name="note"
            label="Why it changes"
            hint="The second engineer reads it."
            optional
            rows={2}
          />
        </div>
        <div>
          <SectionHead title="Rules" aside={`${counted(changes.length, 'change')} from version ${base.n}`} />
          {rows.map((row) => (
            <RuleFields key={row.code} row={row} />
          ))}
        </div>
        <ChangesView changes={changes} before={`version ${base.n}`} after="this draft" />
        <div className="flex flex-wrap gap-3 px-gutter pb-5">
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Saving…'}>
            Save the draft
          </Button>
          <Button onClick={onLeave}>Not now</Button>
        </div>
      </AppForm>
    </div>
  );
}
