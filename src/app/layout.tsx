import { lazy, Suspense, useSyncExternalStore } from 'react';
import { Outlet, ScrollRestoration, useNavigation } from 'react-router-dom';
import { Header } from '#src/app/header.tsx';
import { isWaiting, subscribeExpiry } from '#src/lib/session/session-expiry.ts';
import type { SessionUser } from '#src/lib/session/session.ts';

const SignInAgain = lazy(() =>
  import('#src/features/session/components/sign-in-again.tsx').then((module) => ({
    default: module.SignInAgain,
  })),
);

export function Layout({ user }: { user: SessionUser }) {
  const navigation = useNavigation();
  const expired = useSyncExternalStore(subscribeExpiry, isWaiting, isWaiting);
  return (
    <div className="flex min-h-dvh flex-col">
      <a
        href="#page"
        className="absolute -top-20 left-2 z-30 border border-ink bg-sheet px-3 py-2 font-semibold focus:top-1"
      >
        Skip to the page
      </a>
      <Header user={user} />
      <main
        id="page"
        tabIndex={-1}
        aria-busy={navigation.state !== 'idle'}
        className="flex min-h-0 flex-1 flex-col outline-none"
      >
        <Outlet />
      </main>
      <ScrollRestoration />
      {expired ? (
        <Suspense>
          <SignInAgain user={user} />
        </Suspense>
      ) : null}
    </div>
  );
}
