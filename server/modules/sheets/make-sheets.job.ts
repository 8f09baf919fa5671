import { defineJob } from '#server/jobs/define-job.ts';

export type MakeSheetsPayload = { readonly sheetFileId: string };

/** Writes the record sheets of a batch as one PDF file. */
export const makeSheetsJob = defineJob<MakeSheetsPayload>({
  name: 'make-sheets',
  payload: {
    type: 'object',
    required: ['sheetFileId'],
    additionalProperties: false,
    properties: { sheetFileId: { type: 'string', format: 'uuid' } },
  },
  retryLimit: 3,
  expireSeconds: 1800,
  loadParked: () => import('./park-sheets.ts').then((module) => ({ parked: module.parkSheets })),
  load: () => import('./make-sheets.ts').then((module) => ({ handler: module.makeSheets })),
});
