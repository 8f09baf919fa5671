import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { CheckboxField } from '#src/components/form/checkbox-field.tsx';
import { RadioField } from '#src/components/form/radio-field.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { useUser } from '#src/lib/session/session.ts';
import type { Person } from '#shared/generated/api-types.ts';
import { personQuery, useChangePerson } from '../api/people.ts';
import { InviteAgain } from './invite-again.tsx';
import { roleOptions } from './role-options.ts';

type Props = { readonly person: Person; readonly onClose: () => void };

/** Name, role, and whether the account is open. */
export function PersonDialog({ person: opened, onClose }: Props) {
  const client = useQueryClient();
  const user = useUser();
  const change = useChangePerson();
  const [person, setPerson] = useState(opened);
  const [newer, setNewer] = useState(false);
  const own = person.id === user.id;
  const form = useForm({ defaultValues: { name: person.name, role: person.role, active: person.active } });

  async function save(values: { name: string; role: Person['role']; active: boolean }): Promise<void> {
    try {
      await change(person, { ...values, name: values.name.trim() });
      onClose();
    } catch (error) {
      if (!(error instanceof ApiProblem) || error.status !== 412) throw error;
      // What was typed stays; sending it again goes on top of the newer state, which is shown.
      setPerson(await client.fetchQuery({ ...personQuery(person.id), staleTime: 0 }));
      setNewer(true);
    }
  }

  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={person.name}
      description={`${person.email}, ${person.organisation.name}`}
    >
      <AppForm form={form} label={`Change ${person.name}`} onSubmit={save}>
        {newer ? (
          <Callout tone="query" title="Somebody changed this person meanwhile">
            It now reads {person.name}, {person.role}, {person.active ? 'open' : 'closed'}. Save again to put
            yours in its place, or leave it.
          </Callout>
        ) : null}
        <TextField name="name" label="Name" rules={{ required: 'Write the name.' }} autoComplete="off" />
        {own ? (
          <p className="text-ink-2">
            Your own role and account are changed by another administrator, so that nobody shuts themselves
            out.
          </p>
        ) : (
          <>
            <RadioField
              name="role"
              label="Role"
              hint="A change signs them out everywhere."
              options={roleOptions(person.organisation.kind)}
            />
            <CheckboxField
              name="active"
              label="The account is open"
              hint="Closed, they can no longer sign in. What they did stays under their name."
            />
          </>
        )}
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Saving…'}>
            Save
          </Button>
          <Button onClick={onClose}>Leave it as it is</Button>
        </div>
      </AppForm>
      {person.can.includes('invite') ? <InviteAgain person={person} /> : null}
    </Dialog>
  );
}
