import { useState } from 'react';
import { Button } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { formatDay } from '#src/lib/formats.ts';
import type { StandardVersion } from '#shared/generated/api-types.ts';
import { usePublishStandard } from '../api/standard.ts';

/** A draft waits for another engineer; that one publishes it here, told first what it does. */
export function PublishPanel({ one }: { one: StandardVersion }) {
  const publish = usePublishStandard();
  const [asking, setAsking] = useState(false);
  const day = one.effectiveOn ? formatDay(one.effectiveOn) : 'its day';
  return (
    <div className="max-w-3xl px-gutter py-4">
      <Callout tone="query" title={`A draft by ${one.author}; it checks nothing yet`}>
        <p>
          {one.can.includes('publish')
            ? `Compare it below with the version before. Published, it holds for work from ${day} on.`
            : one.can.includes('change')
              ? 'Another engineer publishes it. To change it, draft a further version from it.'
              : 'An engineer other than its author publishes it.'}
        </p>
        {one.can.includes('publish') ? (
          <Button kind="primary" size="small" className="mt-3" onClick={() => setAsking(true)}>
            Publish…
          </Button>
        ) : null}
      </Callout>
      <Dialog
        open={asking}
        onOpenChange={setAsking}
        title={`Publish version ${one.n}`}
        description={`From ${day} on, work is checked on it. It cannot be changed or taken back afterwards, only followed by a further version. What was submitted before keeps its own version.`}
      >
        {publish.error ? <ErrorState error={publish.error} what="The draft" /> : null}
        <div className="flex flex-wrap gap-3">
          <Button
            kind="primary"
            busy={publish.isPending && 'Publishing…'}
            onClick={() => publish.mutate(one, { onSuccess: () => setAsking(false) })}
          >
            Publish version {one.n}
          </Button>
          <Button onClick={() => setAsking(false)}>Not yet</Button>
        </div>
      </Dialog>
    </div>
  );
}
