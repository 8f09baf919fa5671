import { useQuery } from '@tanstack/react-query';
import { Fact } from '#src/components/ui/page-band.tsx';
import { batchRevisionsQuery } from '#src/lib/api/batch-revisions.ts';
import type { BatchRevision } from '#shared/generated/api-types.ts';
import { rulesOffWords } from './rules-off-words.ts';

type Props = { readonly batchId: string; readonly revision: number };

const useRulesOff = ({ batchId, revision }: Props): BatchRevision['rulesOff'] => {
  const revisions = useQuery(batchRevisionsQuery(batchId));
  return revisions.data?.find(({ number }) => number === revision)?.rulesOff ?? [];
};

/** What was not looked at because the owner's standard has it off: a clean line says nothing of it. */
export function RulesOff(props: Props) {
  const off = useRulesOff(props);
  if (off.length === 0) return null;
  return (
    <p className="border-b border-hairline px-gutter py-2.5 text-table text-muted">
      Not looked at, being off in the owner’s standard:{' '}
      <span className="text-ink-2">{rulesOffWords(off, off.length)}</span>
    </p>
  );
}

/** The same as one of the circumstances of a batch under review. */
export function RulesOffFact(props: Props) {
  const off = useRulesOff(props);
  return off.length === 0 ? null : <Fact word="rules off">{rulesOffWords(off, 2)}</Fact>;
}
