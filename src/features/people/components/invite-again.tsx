import { useMutation } from '@tanstack/react-query';
import { Button } from '#src/components/ui/button.tsx';
import type { Person } from '#shared/generated/api-types.ts';
import { sendInvitationAgain } from '../api/people.ts';

/** For an invitation that was lost or ran out. */
export function InviteAgain({ person }: { person: Person }) {
  const send = useMutation({ mutationFn: () => sendInvitationAgain(person) });
  return (
    <div className="mt-5 border-t border-hairline pt-4">
      <p className="mb-2 text-ink-2">No password has been chosen yet.</p>
      <Button size="small" busy={send.isPending && 'Sending…'} onClick={() => send.mutate()}>
        Send the invitation again
      </Button>
      <p role="status" className="mt-2 text-table">
        {send.isSuccess ? `Sent to ${person.email}. The link sent before no longer works.` : ''}
        {send.isError ? send.error.message : ''}
      </p>
    </div>
  );
}
