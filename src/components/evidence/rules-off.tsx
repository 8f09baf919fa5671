import { useQuery } from '@tanstack/react-query';
import { batchRevisionsQuery } from '#src/lib/api/batch-revisions.ts';
import { rulesOffWords } from './rules-off-words.ts';

type Props = { readonly batchId: string; readonly revision: number };

/** What was not looked at because the owner's standard has it off: a clean line says nothing of it. */
export function RulesOff({ batchId, revision }: Props) {
  const revisions = useQuery(batchRevisionsQuery(batchId));
  const off = revisions.data?.find(({ number }) => number === revision)?.rulesOff ?? [];
  if (off.length === 0) return null;
  return (
    <p className="-mt-px shrink-0 border-y border-hairline px-gutter py-2.5 text-table text-muted">
      Not looked at, being off in the owner’s standard:{' '}
      <span className="text-ink-2">{rulesOffWords(off)}</span>
    </p>
  );
}
