import { PassThrough } from 'node:stream';
import { buffer } from 'node:stream/consumers';
import { writeWorkbook, type WorkbookInput } from '#server/workbook/write-workbook.ts';

/** The bytes of a filled-in workbook. */
export async function workbookFile(input: Partial<WorkbookInput> & { workOrder: string }): Promise<Buffer> {
  const stream = new PassThrough();
  const bytes = buffer(stream);
  await writeWorkbook(stream, { contractor: 'A contractor', foreman: 'A foreman', ...input });
  return bytes;
}
