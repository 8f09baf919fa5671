import { structureKey } from '#shared/records/structure-key.ts';
import type { SourceBatch } from '#shared/records/types.ts';
import { notice } from '#shared/workbook/notices.ts';

/** Says so when the workbook was made for another work order; case and spaces aside. */
export function nameOtherOrder(source: SourceBatch, order: string): SourceBatch {
  const written = source.batch.values['workOrder'];
  if (typeof written !== 'string' || structureKey(written) === structureKey(order)) return source;
  const address = source.batch.cells['workOrder']?.address ?? null;
  return {
    ...source,
    notices: [
      ...source.notices,
      notice('workbook-other-order', { sheet: 'Batch', address }, { written, order }),
    ],
  };
}
