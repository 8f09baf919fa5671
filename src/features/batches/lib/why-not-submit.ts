import { isIncomplete, type BatchView } from './line-view.ts';
import type { Batch } from '#shared/generated/api-types.ts';

export type Hindrance = {
  readonly code: 'checking' | 'empty' | 'incomplete' | 'uploads';
  readonly text: string;
};

/** What would keep the batch from being taken, before anybody asks the server. */
export function whyNotSubmit(
  batch: Pick<Batch, 'status' | 'counts'>,
  view: BatchView,
  uploads: { readonly busy: boolean; readonly failed: number },
): Hindrance[] {
  const found: Hindrance[] = [];
  if (uploads.busy) {
    found.push({ code: 'uploads', text: 'Photographs are still being sent. Wait until all are stored.' });
  } else if (uploads.failed > 0) {
    found.push({
      code: 'uploads',
      text: `${uploads.failed} of the chosen photographs could not be stored. Try them again, or clear the list.`,
    });
  }
  if (batch.status === 'checking') {
    found.push({ code: 'checking', text: 'The newest upload is still being checked. Wait for the result.' });
    return found;
  }
  if (batch.status === 'draft' || batch.counts.lines === 0) {
    found.push({ code: 'empty', text: 'There are no lines to submit. Hand in a filled workbook first.' });
    return found;
  }
  const incomplete = [...view.loose, ...view.lines.flatMap((line) => line.findings)].filter(
    isIncomplete,
  ).length;
  if (incomplete > 0) {
    const many = incomplete === 1 ? 'One value is' : `${incomplete} values are`;
    found.push({
      code: 'incomplete',
      text: `${many} missing or cannot be read. Correct the workbook and hand it in again.`,
    });
  }
  return found;
}
