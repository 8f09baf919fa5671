import { AbilityProvider } from '@casl/react';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { Navigate, useLocation } from 'react-router-dom';
import { Layout } from '#src/app/layout.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { paths } from '#src/config/paths.ts';
import { actorOf, sessionQuery, type SessionUser } from '#src/lib/session/session.ts';
import { defineAbilityFor } from '#shared/permissions/ability.ts';

/** Lets through whoever is signed in; anyone else signs in first and comes back to the same address. */
export function SessionGate() {
  const session = useQuery(sessionQuery);
  const location = useLocation();
  if (session.isPending) return <Skeleton />;
  if (session.data === undefined) {
    return <ErrorState error={session.error} what="Your session" onRetry={() => void session.refetch()} />;
  }
  if (session.data === null) {
    return <Navigate to={paths.signIn.to(location.pathname + location.search + location.hash)} replace />;
  }
  return <SignedIn user={session.data.user} />;
}

function SignedIn({ user }: { user: SessionUser }) {
  const ability = useMemo(() => defineAbilityFor(actorOf(user)), [user]);
  return (
    <AbilityProvider value={ability}>
      <Layout user={user} />
    </AbilityProvider>
  );
}
