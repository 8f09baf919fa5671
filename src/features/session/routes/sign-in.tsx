import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { appInfoQuery } from '#src/features/session/api/app-info.ts';
import { DemoAccounts } from '#src/features/session/components/demo-accounts.tsx';
import { Entrance } from '#src/features/session/components/entrance.tsx';
import { SignInForm } from '#src/features/session/components/sign-in-form.tsx';
import { sessionQuery } from '#src/lib/session/session.ts';
import { safeNext } from '#src/lib/session/safe-next.ts';

export function Component() {
  const [search] = useSearchParams();
  const next = safeNext(search.get('next'));
  const session = useQuery(sessionQuery);
  const app = useQuery(appInfoQuery);
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const [filled, setFilled] = useState<{ email: string; password: string } | null>(null);
  if (session.data) return <Navigate to={next} replace />;
  const demo = app.data?.demo;
  return (
    <Entrance title="Sign in">
      <SignInForm
        filled={filled}
        onSignedIn={(signedIn) => {
          queryClient.setQueryData(sessionQuery.queryKey, signedIn);
          void navigate(next, { replace: true });
        }}
      />
      <p className="mt-4 text-table">
        <TextLink to={paths.requestReset.to()}>Forgotten the password?</TextLink>
      </p>
      {demo ? (
        <DemoAccounts
          demo={demo}
          onPick={(account) => setFilled({ email: account.email, password: demo.password })}
        />
      ) : null}
    </Entrance>
  );
}
