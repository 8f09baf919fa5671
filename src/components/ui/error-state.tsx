import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { Button } from '#src/components/ui/button.tsx';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';

type Props = {
  readonly error: unknown;
  /** What the person was about to see or do: "The batch". */
  readonly what?: string;
  readonly onRetry?: () => void;
  /** Of a list: its filters stand in the address, and an address may be out of date. */
  readonly onClear?: () => void;
};

/** What happened, what it means, what to do. */
export function ErrorState({ error, what, onRetry, onClear }: Props) {
  const problem = error instanceof ApiProblem ? error : null;
  // The sentence often says the one thing that is wrong already.
  const further = (problem?.errors ?? []).filter(({ detail }) => !problem?.message.includes(detail));
  return (
    <div role="alert" className="flex max-w-prose gap-3 px-gutter py-6">
      <Glyph name="triangle" className="mt-0.5" />
      <div>
        <p className="font-semibold">{title(problem, what)}</p>
        <p className="mt-1 text-ink-2">
          {problem?.message ??
            'Something in this page failed. What you sent before is kept. Load the page again; if it fails again, tell the administrator.'}
        </p>
        {further.length > 0 ? (
          <ul className="mt-2 list-disc pl-5 text-ink-2">
            {further.map((entry) => (
              <li key={`${entry.pointer} ${entry.code} ${entry.detail}`}>{entry.detail}</li>
            ))}
          </ul>
        ) : null}
        {problem?.status === 404 || problem?.status === 403 ? (
          <p className="mt-3">
            <TextLink to={paths.home.to()}>What waits for you</TextLink>
          </p>
        ) : problem?.status === 400 && onClear ? (
          <Button className="mt-4" onClick={onClear}>
            Clear the filters
          </Button>
        ) : onRetry ? (
          <Button className="mt-4" onClick={onRetry}>
            Try again
          </Button>
        ) : null}
      </div>
    </div>
  );
}

function title(problem: ApiProblem | null, what = 'This'): string {
  if (problem?.status === 404) return `${what} was not found`;
  if (problem?.status === 403) return `${what} is not open to your role`;
  return problem?.title ?? `${what} could not be shown`;
}
