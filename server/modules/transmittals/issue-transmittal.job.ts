import { defineJob } from '#server/jobs/define-job.ts';

export type IssueTransmittalPayload = { readonly transmittalId: string };

/** Writes an as-built workbook and issues it. */
export const issueTransmittalJob = defineJob<IssueTransmittalPayload>({
  name: 'issue-transmittal',
  payload: {
    type: 'object',
    required: ['transmittalId'],
    additionalProperties: false,
    properties: { transmittalId: { type: 'string', format: 'uuid' } },
  },
  retryLimit: 4,
  expireSeconds: 900,
  loadParked: () => import('./park-transmittal.ts').then((module) => ({ parked: module.parkTransmittal })),
  load: () => import('./issue-transmittal.ts').then((module) => ({ handler: module.issueTransmittal })),
});
