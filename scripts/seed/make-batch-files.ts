import { Writable } from 'node:stream';
import { writeWorkbook } from '#server/workbook/write-workbook.ts';
import type { UploadFile } from './api-client.ts';
import { drawPhotograph } from './draw-photograph.ts';
import type { BatchRows, StoryPhotograph } from './story/build-batch-rows.ts';

/** The workbook that the story's rows make. */
export async function makeWorkbook(rows: BatchRows, name: string): Promise<UploadFile> {
  const chunks: Buffer[] = [];
  const target = new Writable({
    write(chunk: Buffer, _encoding, done) {
      chunks.push(Buffer.from(chunk));
      done();
    },
  });
  const { set, straighten, relevel, pours, events, photos, workOrder, contractor, foreman, notes } = rows;
  await writeWorkbook(target, {
    workOrder,
    contractor,
    foreman,
    ...(notes ? { notes } : {}),
    set,
    straighten,
    relevel,
    pours,
    events,
    photos,
  });
  return {
    name,
    type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
    bytes: Buffer.concat(chunks),
  };
}

/** Draws them one after another: each uses all cores for itself. */
export async function drawAll(photographs: readonly StoryPhotograph[]): Promise<UploadFile[]> {
  const files: UploadFile[] = [];
  for (const { fileName, subject, capture } of photographs) {
    files.push({ name: fileName, type: 'image/jpeg', bytes: await drawPhotograph(subject, capture) });
  }
  return files;
}
