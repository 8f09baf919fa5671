import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useParams } from 'react-router-dom';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button, ButtonLink } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { paths } from '#src/config/paths.ts';
import { setPassword } from '#src/features/session/api/password-reset.ts';
import { Entrance } from '#src/features/session/components/entrance.tsx';

export function Component() {
  const { token = '' } = useParams();
  const form = useForm({ defaultValues: { password: '', again: '' } });
  const [done, setDone] = useState(false);
  return (
    <Entrance title="Set a new password">
      {done ? (
        <div role="status" className="grid gap-4">
          <Callout tone="conform" title="The new password is set">
            Every session of this account has ended. Sign in with the new password.
          </Callout>
          <ButtonLink kind="primary" size="large" wide to={paths.signIn.to()}>
            Sign in
          </ButtonLink>
        </div>
      ) : (
        <AppForm
          form={form}
          label="Set a new password"
          onSubmit={async ({ password }) => {
            await setPassword({ token, password });
            setDone(true);
          }}
        >
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
      )}
    </Entrance>
  );
}
