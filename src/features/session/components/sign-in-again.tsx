import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { Button } from '#src/components/ui/button.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { paths } from '#src/config/paths.ts';
import { SignInForm } from '#src/features/session/components/sign-in-form.tsx';
import { endWaiting } from '#src/lib/session/session-expiry.ts';
import { sessionQuery, type Session, type SessionUser } from '#src/lib/session/session.ts';
import { forgetSession } from '#src/lib/session/sign-out.ts';

/** Stands over the page when the session has ended: the page and what was typed stay, and the waiting requests go on. */
export function SignInAgain({ user }: { user: SessionUser }) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();

  function goOn(session: Session) {
    queryClient.setQueryData(sessionQuery.queryKey, session);
    endWaiting(true);
  }
  function leave() {
    endWaiting(false);
    forgetSession(queryClient);
    void navigate(paths.signIn.to(), { replace: true });
  }

  return (
    <Dialog
      open
      insistent
      onOpenChange={() => undefined}
      title="Your session has ended"
      description="The page behind this is as you left it. Sign in again and it goes on where it stopped."
    >
      <SignInForm email={user.email} fixedEmail onSignedIn={goOn} />
      <p className="mt-3">
        <Button kind="quiet" onClick={leave}>
          Leave this page and forget what was typed
        </Button>
      </p>
    </Dialog>
  );
}
