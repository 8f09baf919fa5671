import { useRouteError } from 'react-router-dom';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { ErrorState } from '#src/components/ui/error-state.tsx';

/** A page that failed while it was drawn, or whose code could not be fetched after a new version was put up. */
export function ErrorPage() {
  return (
    <main>
      <ErrorInShell />
    </main>
  );
}

/** The same inside the shell, which is the page's main part already. */
export function ErrorInShell() {
  const error = useRouteError();
  return (
    <>
      <h1 className="sr-only">This page failed</h1>
      <ErrorState
        error={isNotFetched(error) ? NOT_FETCHED : error}
        what="The page"
        onRetry={() => globalThis.location.reload()}
      />
    </>
  );
}

const NOT_FETCHED = new ApiProblem({
  status: 0,
  code: 'page.not-fetched',
  title: 'The page could not be fetched',
  detail:
    'The server does not answer, or it was renewed since you opened Upstand. What you sent before is kept. Try again; if it stays so, check the connection.',
});

/** A page's own code that did not come: browsers differ in the words, not in the kind of error. */
function isNotFetched(error: unknown): boolean {
  return error instanceof TypeError && /dynamically imported module|importing a module/iu.test(error.message);
}
