import { useRouteError } from 'react-router-dom';
import { ErrorState } from '#src/components/ui/error-state.tsx';

/** A page that failed while it was drawn, or whose code could not be fetched after a new version was put up. */
export function ErrorPage() {
  const error = useRouteError();
  return (
    <main>
      <h1 className="sr-only">This page failed</h1>
      <ErrorState error={error} what="The page" onRetry={() => globalThis.location.reload()} />
    </main>
  );
}
