import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { requestReset } from '#src/features/session/api/password-reset.ts';
import { Entrance } from '#src/features/session/components/entrance.tsx';

export function Component() {
  const form = useForm({ defaultValues: { email: '' } });
  const [sentTo, setSentTo] = useState<string | null>(null);
  return (
    <Entrance title="Reset the password">
      {sentTo ? (
        <div role="status">
          <Callout tone="conform" title="A letter is on its way">
            If {sentTo} has an account here, a link to set a new password reaches it within minutes. The link
            works once and for a limited time.
          </Callout>
        </div>
      ) : (
        <AppForm
          form={form}
          label="Reset the password"
          onSubmit={async (values) => {
            await requestReset(values);
            setSentTo(values.email);
          }}
        >
          <TextField
            name="email"
            label="E-mail address"
            hint="A link to set a new password is sent to it."
            type="email"
            autoComplete="username"
            autoFocus
            rules={{ required: 'Enter the e-mail address of your account' }}
          />
          <div>
            <Button
              type="submit"
              kind="primary"
              size="large"
              wide
              busy={form.formState.isSubmitting && 'Sending…'}
            >
              Send the link
            </Button>
          </div>
        </AppForm>
      )}
      <p className="mt-4 text-table">
        <TextLink to={paths.signIn.to()}>Back to sign in</TextLink>
      </p>
    </Entrance>
  );
}
