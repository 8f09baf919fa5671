import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { ButtonLink } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { resetLinkQuery } from '#src/features/session/api/password-reset.ts';
import { Entrance } from '#src/features/session/components/entrance.tsx';
import { NewPasswordForm } from '#src/features/session/components/new-password-form.tsx';

export function Component() {
  const { token = '' } = useParams();
  const link = useQuery(resetLinkQuery(token));
  const [done, setDone] = useState(false);
  const title = link.data?.purpose === 'invitation' ? 'Choose a password' : 'Set a new password';
  if (done) {
    return (
      <Entrance title={title}>
        <div role="status" className="grid gap-4">
          <Callout tone="conform" title="The password is set">
            Every session of this account has ended. Sign in with the new password.
          </Callout>
          <ButtonLink kind="primary" size="large" wide to={paths.signIn.to()}>
            Sign in
          </ButtonLink>
        </div>
      </Entrance>
    );
  }
  return (
    <Entrance title={title}>
      {link.isPending ? <Skeleton lines={3} /> : null}
      {link.isError ? (
        <>
          <ErrorState error={link.error} what="This link" />
          <TextLink to={paths.requestReset.to()}>Ask for a new link</TextLink>
        </>
      ) : null}
      {link.data ? (
        <NewPasswordForm token={token} email={link.data.email} onDone={() => setDone(true)} />
      ) : null}
    </Entrance>
  );
}
