import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { setPassword } from '#src/features/session/api/password-reset.ts';

type Props = { readonly token: string; readonly email: string; readonly onDone: () => void };

export function NewPasswordForm({ token, email, onDone }: Props) {
  const form = useForm({ defaultValues: { email, password: '', again: '' } });
  return (
    <AppForm
      form={form}
      label="New password"
      onSubmit={async ({ password }) => {
        await setPassword({ token, password });
        onDone();
      }}
    >
      {/* Shown so that a password manager keeps the new password with the right account. */}
      <TextField name="email" label="Account" type="email" autoComplete="username" readOnly />
      <TextField
        name="password"
        label="New password"
        hint="At least 12 characters; a few words in a row are good."
        type="password"
        autoComplete="new-password"
        autoFocus
        rules={{
          required: 'Enter a new password',
          minLength: { value: 12, message: 'The password is shorter than 12 characters: make it longer' },
        }}
      />
      <TextField
        name="again"
        label="New password, once more"
        type="password"
        autoComplete="new-password"
        rules={{
          validate: (value, values) =>
            value === values.password || 'The two passwords differ: type them again',
        }}
      />
      <div>
        <Button
          type="submit"
          kind="primary"
          size="large"
          wide
          busy={form.formState.isSubmitting && 'Saving…'}
        >
          Set the password
        </Button>
      </div>
    </AppForm>
  );
}
