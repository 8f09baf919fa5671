import { lineWords } from '#src/components/evidence/line-words.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';

/** `40 ft cl 4, set`; a structure's second row in one workbook says which it is. */
export function describeLine(record: RecordRow, metric: boolean): string {
  const again = record.occurrence > 1 ? `, entry ${record.occurrence}` : '';
  return `${lineWords(record, metric)}${again}`;
}
