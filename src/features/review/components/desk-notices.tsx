import { Button } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import type { DeskModel } from '#src/features/review/desk/use-desk.ts';

/** What was refused and has no form in sight to stand in. */
export function DeskNotices({ desk, moveError }: { desk: DeskModel; moveError: Error | null }) {
  const { notice, hand } = desk;
  const inForm =
    notice !== null && notice.line === desk.line && hand.saying !== null && hand.saying === notice.saying;
  const told = notice !== null && !inForm ? notice : null;
  return (
    <div role="alert" className="empty:hidden">
      {moveError ? (
        <Callout tone="nonconform" title="Not taken over">
          {moveError.message}
        </Callout>
      ) : null}
      {told ? (
        <Callout tone="nonconform" title="The decision was not kept">
          <p>{told.text}</p>
          <p className="mt-1 flex flex-wrap gap-3">
            {told.line !== desk.line || told.saying ? (
              <Button size="small" onClick={() => desk.goTo(told)}>
                Go back to it
              </Button>
            ) : null}
            <Button size="small" kind="quiet" onClick={() => desk.setNotice(null)}>
              Dismiss
            </Button>
          </p>
        </Callout>
      ) : null}
    </div>
  );
}
