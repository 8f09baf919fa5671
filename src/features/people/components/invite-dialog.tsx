import { useForm, useWatch } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { RadioField } from '#src/components/form/radio-field.tsx';
import { SelectField } from '#src/components/form/select-field.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import type { Organisation, Person } from '#shared/generated/api-types.ts';
import type { Role } from '#shared/permissions/ability.ts';
import { useInvitePerson } from '../api/people.ts';
import { roleOptions } from './role-options.ts';

type Props = {
  readonly organisations: readonly Organisation[];
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly onInvited: (person: Person) => void;
};

export function InviteDialog({ organisations, open, onOpenChange, onInvited }: Props) {
  const invite = useInvitePerson();
  const form = useForm({ defaultValues: { name: '', email: '', organisationId: '', role: '' } });
  const organisationId = useWatch({ control: form.control, name: 'organisationId' });
  const kind = organisations.find((one) => one.id === organisationId)?.kind ?? null;
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title="Invite a person"
      description="They get an e-mail with a link by which they choose a password. Until then the account cannot be used."
    >
      <AppForm
        form={form}
        label="Invite a person"
        draftKey="person invite"
        onSubmit={async ({ name, email, role, ...rest }) => {
          onInvited(await invite({ ...rest, name: name.trim(), email: email.trim(), role: role as Role }));
          form.reset();
        }}
      >
        <TextField name="name" label="Name" rules={{ required: 'Write the name.' }} autoComplete="off" />
        <TextField
          name="email"
          label="E-mail"
          type="email"
          rules={{ required: 'Write the e-mail address.' }}
          autoComplete="off"
        />
        <SelectField
          name="organisationId"
          label="Organisation"
          rules={{ required: 'Choose the organisation.' }}
          options={organisations.map((one) => ({ value: one.id, label: one.name }))}
        />
        {kind ? (
          <RadioField
            name="role"
            label="Role"
            rules={{ required: 'Choose a role.' }}
            options={roleOptions(kind)}
          />
        ) : null}
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={form.formState.isSubmitting && 'Inviting…'}>
            Invite
          </Button>
          <Button onClick={() => onOpenChange(false)}>Not now</Button>
        </div>
      </AppForm>
    </Dialog>
  );
}
