import { PASSWORD } from '#tests/factories/people.ts';
import type { OwnObjects } from './own-objects.ts';
import type { Shared } from './world.ts';

export type AskedOf = {
  /** The contractor's whose objects are asked for. */
  readonly own: OwnObjects;
  readonly shared: Shared;
  /** Address that signs in with the password of the tests. */
  readonly email: string;
};
export type RequestSpec = {
  readonly path: string;
  readonly body?: object;
  readonly ifMatch?: number;
  /** A form without a file. */
  readonly form?: boolean;
  /** On a session of its own, since it ends it. */
  readonly fresh?: boolean;
  /** An answer that does not end by itself. */
  readonly stream?: boolean;
};

const NOBODY_HAS_THIS = '00000000-0000-4000-8000-000000000000';
const TOKEN = 'a-token-that-was-never-sent-to-anybody';
/** No row of the world has been changed as often. */
const STALE = 999;
const reason = { reason: 'To see whether it is let in.' };
const evidence = { decision: 'approve', grounds: 'evidence', ...reason };

const events = (subject: string): RequestSpec => ({ path: `/api/events?subject=${subject}`, stream: true });

/** How each row is asked. Every request is complete, so that only the wall or the state behind it can refuse it. */
export const REQUESTS: Readonly<Record<string, (of: AskedOf) => RequestSpec>> = {
  'GET /healthz': () => ({ path: '/healthz' }),
  'GET /readyz': () => ({ path: '/readyz' }),
  'GET /api/openapi.json': () => ({ path: '/api/openapi.json' }),
  'GET /api/app': () => ({ path: '/api/app' }),
  'POST /api/session': ({ email }) => ({
    path: '/api/session',
    body: { email, password: PASSWORD },
    fresh: true,
  }),
  'GET /api/session': () => ({ path: '/api/session' }),
  'DELETE /api/session': () => ({ path: '/api/session', fresh: true }),
  'POST /api/password-resets': () => ({
    path: '/api/password-resets',
    body: { email: 'nobody@people.example' },
  }),
  'GET /api/password-resets/:token': () => ({ path: `/api/password-resets/${TOKEN}` }),
  'PUT /api/password-resets/:token': () => ({
    path: `/api/password-resets/${TOKEN}`,
    body: { password: 'gravel lantern otter 17' },
  }),
  'GET /api/home': () => ({ path: '/api/home' }),
  'GET /api/search': ({ own }) => ({ path: `/api/search?q=${own.queued.number}` }),

  'GET /api/people': () => ({ path: '/api/people' }),
  'GET /api/people/:id': ({ shared }) => ({ path: `/api/people/${shared.personId}` }),
  'POST /api/people': ({ shared }) => ({
    path: '/api/people',
    body: { email: shared.personEmail, name: 'Ada Rowe', role: 'clerk', organisationId: shared.ownerId },
  }),
  'PATCH /api/people/:id': ({ shared }) => ({
    path: `/api/people/${shared.personId}`,
    body: { name: 'Ada Rowe' },
    ifMatch: STALE,
  }),
  'POST /api/people/:id/invitation': ({ shared }) => ({ path: `/api/people/${shared.personId}/invitation` }),
  'GET /api/organisations': () => ({ path: '/api/organisations' }),
  'POST /api/organisations': ({ shared }) => ({
    path: '/api/organisations',
    body: { name: shared.organisationName },
  }),

  'GET /api/work-orders': () => ({ path: '/api/work-orders' }),
  'POST /api/work-orders': ({ own, shared }) => ({
    path: '/api/work-orders',
    body: {
      number: own.orderNumber,
      title: 'Line work',
      contractorId: shared.contractorOrgId,
      zone: 'America/Chicago',
      structures: [{ structureNumber: 'Z-1', kind: 'set', design: {} }],
    },
  }),
  'GET /api/work-orders/:id': ({ own }) => ({ path: `/api/work-orders/${own.orderId}` }),
  'GET /api/work-orders/:id/structures': ({ own }) => ({
    path: `/api/work-orders/${own.orderId}/structures`,
  }),
  'GET /api/work-orders/:id/check-context': ({ own }) => ({
    path: `/api/work-orders/${own.orderId}/check-context`,
  }),
  'GET /api/work-orders/:id/template.xlsx': ({ own }) => ({
    path: `/api/work-orders/${own.orderId}/template.xlsx`,
  }),

  'POST /api/work-orders/:id/batches': ({ own }) => ({ path: `/api/work-orders/${own.orderId}/batches` }),
  'GET /api/batches': () => ({ path: '/api/batches' }),
  'GET /api/batches/:id': ({ own }) => ({ path: `/api/batches/${own.queued.id}` }),
  'GET /api/batches/:id (draft)': ({ own }) => ({ path: `/api/batches/${own.draft.id}` }),
  'PUT /api/batches/:id/workbook': ({ own }) => ({
    path: `/api/batches/${own.draft.id}/workbook`,
    form: true,
  }),
  'POST /api/batches/:id/photos': ({ own }) => ({ path: `/api/batches/${own.draft.id}/photos`, form: true }),
  'GET /api/batches/:id/check': ({ own }) => ({ path: `/api/batches/${own.queued.id}/check` }),
  'POST /api/batches/:id/recheck': ({ own }) => ({ path: `/api/batches/${own.queued.id}/recheck` }),
  'GET /api/batches/:id/inputs': ({ own }) => ({ path: `/api/batches/${own.queued.id}/inputs` }),
  'GET /api/batches/:id/revisions': ({ own }) => ({ path: `/api/batches/${own.queued.id}/revisions` }),
  'GET /api/batches/:id/changes': ({ own }) => ({ path: `/api/batches/${own.queued.id}/changes` }),
  'GET /api/batches/:id/photos': ({ own }) => ({ path: `/api/batches/${own.queued.id}/photos` }),
  'GET /api/batches/:id/records': ({ own }) => ({ path: `/api/batches/${own.queued.id}/records` }),
  'GET /api/batches/:id/findings': ({ own }) => ({ path: `/api/batches/${own.queued.id}/findings` }),
  'POST /api/batches/:id/submit': ({ own }) => ({ path: `/api/batches/${own.queued.id}/submit` }),
  'POST /api/batches/:id/withdraw': ({ own }) => ({ path: `/api/batches/${own.draft.id}/withdraw` }),

  'GET /api/photos/:id/file': ({ own }) => ({ path: `/api/photos/${own.queued.photoId}/file?size=thumb` }),
  'GET /api/photos/:id/file (original)': ({ own }) => ({
    path: `/api/photos/${own.queued.photoId}/file?size=original`,
  }),
  'GET /api/photos/:id/file (draft)': ({ own }) => ({ path: `/api/photos/${own.draft.photoId}/file` }),
  'PUT /api/photos/:id/match': ({ own }) => ({
    path: `/api/photos/${own.draft.photoId}/match`,
    body: { lineId: NOBODY_HAS_THIS, view: 'kits' },
  }),
  'DELETE /api/photos/:id/match': ({ own }) => ({ path: `/api/photos/${own.queued.photoId}/match` }),
  'GET /api/records/:id': ({ own }) => ({ path: `/api/records/${own.queued.recordId}` }),
  'GET /api/records/:id (draft)': ({ own }) => ({ path: `/api/records/${own.draft.recordId}` }),
  'GET /api/records/:id/sheet.pdf': ({ own }) => ({ path: `/api/records/${own.queued.recordId}/sheet.pdf` }),
  'GET /api/records/:id/sheet.pdf (draft)': ({ own }) => ({
    path: `/api/records/${own.draft.recordId}/sheet.pdf`,
  }),
  'POST /api/batches/:id/sheets': ({ own }) => ({
    path: `/api/batches/${own.queued.id}/sheets`,
    body: { paper: 'letter' },
  }),
  'POST /api/batches/:id/sheets (draft)': ({ own }) => ({
    path: `/api/batches/${own.draft.id}/sheets`,
    body: { paper: 'a4' },
  }),
  'GET /api/sheets/:id': ({ own }) => ({ path: `/api/sheets/${own.sheetFileId}` }),
  'GET /api/sheets/:id/file': ({ own }) => ({ path: `/api/sheets/${own.sheetFileId}/file` }),
  'PUT /api/findings/:id/answer': ({ own }) => ({
    path: `/api/findings/${own.queued.findingId}/answer`,
    body: { text: 'Rock at 5.5 ft.' },
  }),

  'POST /api/batches/:id/take': ({ own }) => ({ path: `/api/batches/${own.open.id}/take` }),
  'POST /api/batches/:id/release': ({ own }) => ({ path: `/api/batches/${own.queued.id}/release` }),
  'POST /api/batches/:id/approve-clean': ({ own }) => ({
    path: `/api/batches/${own.queued.id}/approve-clean`,
  }),
  'POST /api/batches/:id/close-review': ({ own }) => ({ path: `/api/batches/${own.open.id}/close-review` }),
  'PUT /api/findings/:id/decision': ({ own }) => ({
    path: `/api/findings/${own.open.findingId}/decision`,
    body: evidence,
    ifMatch: STALE,
  }),
  'DELETE /api/findings/:id/decision': ({ own }) => ({
    path: `/api/findings/${own.open.findingId}/decision`,
    ifMatch: STALE,
  }),
  'PUT /api/records/:id/decision': ({ own }) => ({
    path: `/api/records/${own.open.recordId}/decision`,
    body: { decision: 'return', ...reason },
    ifMatch: STALE,
  }),
  'DELETE /api/records/:id/decision': ({ own }) => ({
    path: `/api/records/${own.open.recordId}/decision`,
    ifMatch: STALE,
  }),
  'POST /api/findings/:id/concession': ({ own }) => ({
    path: `/api/findings/${own.open.findingId}/concession`,
    body: reason,
    ifMatch: STALE,
  }),
  'POST /api/records/:id/reopen': ({ own }) => ({
    path: `/api/records/${own.done.recordId}/reopen`,
    body: reason,
  }),
  'POST /api/records/:id/refer-back': ({ own }) => ({
    path: `/api/records/${own.done.recordId}/refer-back`,
    body: reason,
  }),
  'POST /api/batches/:id/assign': ({ own }) => ({
    path: `/api/batches/${own.open.id}/assign`,
    body: { inspectorId: NOBODY_HAS_THIS, ...reason },
  }),
  'POST /api/records/:id/abandon': ({ own }) => ({
    path: `/api/records/${own.done.recordId}/abandon`,
    body: reason,
  }),

  'GET /api/concessions': () => ({ path: '/api/concessions' }),
  'GET /api/concessions/:id': ({ own }) => ({ path: `/api/concessions/${own.concessionGranted}` }),
  'PUT /api/concessions/:id/decision': ({ own }) => ({
    path: `/api/concessions/${own.concessionAsked}/decision`,
    body: { decision: 'grant', ...reason },
    ifMatch: STALE,
  }),

  'GET /api/register': () => ({ path: '/api/register' }),
  'GET /api/register/:recordNumber': ({ own }) => ({ path: `/api/register/${own.recordNumber}` }),
  'GET /api/register/candidates': () => ({ path: '/api/register/candidates' }),
  'GET /api/register/export.csv': () => ({ path: '/api/register/export.csv' }),
  'POST /api/register/entries': ({ own }) => ({
    path: '/api/register/entries',
    body: { recordIds: [own.done.recordId] },
  }),
  'GET /api/transmittals': () => ({ path: '/api/transmittals' }),
  'GET /api/transmittals/:id': ({ own }) => ({ path: `/api/transmittals/${own.transmittalId}` }),
  'GET /api/transmittals/:id/file': ({ own }) => ({ path: `/api/transmittals/${own.transmittalId}/file` }),
  'POST /api/transmittals': () => ({
    path: '/api/transmittals',
    body: { scope: { recordNumbers: ['R-999999'] } },
  }),

  'GET /api/events (check)': ({ own }) => events(`check:${own.queued.revisionId}`),
  'GET /api/events (batch)': ({ own }) => events(`batch:${own.queued.id}`),
  'GET /api/events (transmittal)': ({ own }) => events(`transmittal:${own.transmittalId}`),
  'GET /api/events (sheets)': ({ own }) => events(`sheets:${own.sheetFileId}`),

  'GET /api/nonconformities': () => ({ path: '/api/nonconformities' }),
  'GET /api/nonconformities/summary': () => ({ path: '/api/nonconformities/summary' }),
  'GET /api/nonconformities/export.csv': () => ({ path: '/api/nonconformities/export.csv' }),
  'GET /api/trail': () => ({ path: '/api/trail' }),
  'GET /api/trail/verify': () => ({ path: '/api/trail/verify' }),

  'GET /api/products': () => ({ path: '/api/products' }),
  'GET /api/products/:id': ({ shared }) => ({ path: `/api/products/${shared.productId}` }),
  'POST /api/products': () => ({ path: '/api/products', body: { effectiveOn: '2099-02-01', body: {} } }),
  'GET /api/planner/stock': () => ({ path: '/api/planner/stock' }),
  'GET /api/lots': () => ({ path: '/api/lots' }),
  'GET /api/lots/:id': ({ shared }) => ({ path: `/api/lots/${shared.lotId}` }),
  'POST /api/lots': ({ shared }) => ({
    path: '/api/lots',
    body: { productId: shared.productId, number: shared.lotNumber, expiresOn: '2035-12-31' },
  }),
  'POST /api/lots/:id/events': ({ shared }) => ({
    path: `/api/lots/${shared.lotId}/events`,
    body: { type: 'released', ...reason },
  }),
  'GET /api/standard/versions': () => ({ path: '/api/standard/versions' }),
  'GET /api/standard/versions/:n': () => ({ path: '/api/standard/versions/1' }),
  'GET /api/standard/versions/:n (draft)': ({ shared }) => ({
    path: `/api/standard/versions/${shared.draftStandard}`,
  }),
  'POST /api/standard/versions': () => ({
    path: '/api/standard/versions',
    body: { effectiveOn: '2099-02-01', body: {} },
  }),
  'POST /api/standard/versions/:n/publish': ({ shared }) => ({
    path: `/api/standard/versions/${shared.draftStandard}/publish`,
    ifMatch: STALE,
  }),

  'GET /api/mail': () => ({ path: '/api/mail' }),
  'GET /api/mail/:id': ({ shared }) => ({ path: `/api/mail/${shared.mailId}` }),
  'GET /api/jobs/parked': () => ({ path: '/api/jobs/parked' }),
  'POST /api/jobs/parked/:id/retry': () => ({ path: `/api/jobs/parked/${NOBODY_HAS_THIS}/retry` }),
};
