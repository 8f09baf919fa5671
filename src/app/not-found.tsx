import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { ButtonLink } from '#src/components/ui/button.tsx';
import { paths } from '#src/config/paths.ts';

export function NotFound() {
  return (
    <div className="max-w-prose px-gutter py-10">
      <DocumentTitle>Not found</DocumentTitle>
      <h1 className="text-title font-semibold">There is no such page</h1>
      <p className="mt-2 text-ink-2">
        The address may be mistyped, or what stood here was never open to your role. Nothing was changed.
      </p>
      <ButtonLink to={paths.home.to()} className="mt-5">
        Go to what waits for you
      </ButtonLink>
    </div>
  );
}
