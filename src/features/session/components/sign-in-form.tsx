import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { postSession, type Session } from '#src/lib/session/session.ts';

type Props = {
  readonly email?: string;
  /** The session that ended was this person's: the address is fixed. */
  readonly fixedEmail?: boolean;
  readonly onSignedIn: (session: Session) => void;
  readonly filled?: { readonly email: string; readonly password: string } | null;
};

export function SignInForm({ email = '', fixedEmail, onSignedIn, filled }: Props) {
  const form = useForm({ defaultValues: { email, password: '' }, values: filled ?? undefined });
  return (
    <AppForm
      form={form}
      label="Sign in"
      onSubmit={async (values) => {
        const session = await postSession(values);
        onSignedIn(session);
      }}
    >
      <TextField
        name="email"
        label="E-mail address"
        type="email"
        autoComplete="username"
        readOnly={fixedEmail}
        autoFocus={!fixedEmail}
        rules={{ required: 'Enter your e-mail address, such as name@company.example' }}
      />
      <TextField
        name="password"
        label="Password"
        type="password"
        autoComplete="current-password"
        autoFocus={fixedEmail}
        rules={{ required: 'Enter your password' }}
      />
      <div>
        <Button
          type="submit"
          kind="primary"
          size="large"
          wide
          busy={form.formState.isSubmitting && 'Signing in…'}
        >
          Sign in
        </Button>
      </div>
    </AppForm>
  );
}
