/**
 * Who may do what, written by hand from the description of the people and of the wall between contractors. Nothing here
 * is taken from the route table or from the ability: where they disagree with this table, the test fails.
 *
 * One row a route, and further rows where the state of the object matters. The columns are who asks:
 * nobody signed in; the contractor whose object it is; another contractor; the inspector who holds the review; another
 * inspector; engineer; clerk; auditor; administrator. On a list `own` and `foreign` are two contractors asking for theirs.
 *
 * `ok` is any 2xx. A number is that status. 400, 409, 412 and 422 are answers from behind the wall: the request was let
 * in and is refused for a stated reason (the last column names the code), so that it changes nothing for later rows.
 */
export const CALLERS = [
  'nobody',
  'own',
  'foreign',
  'inspector',
  'colleague',
  'engineer',
  'clerk',
  'auditor',
  'administrator',
] as const;

type Row = readonly [outcomes: string, row: string, behindTheWall?: string];

export const EXPECTED: readonly Row[] = [
  // nob own for  ins col eng cle aud adm
  ['ok  ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /healthz'],
  ['ok  ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /readyz'],
  ['ok  ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/openapi.json'],
  ['ok  ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/app'],

  ['ok  ok  ok   ok  ok  ok  ok  ok  ok ', 'POST /api/session'],
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/session'],
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'DELETE /api/session'],
  ['ok  ok  ok   ok  ok  ok  ok  ok  ok ', 'POST /api/password-resets'],
  ['410 410 410  410 410 410 410 410 410', 'GET /api/password-resets/:token', 'token.unusable'],
  ['410 410 410  410 410 410 410 410 410', 'PUT /api/password-resets/:token', 'token.unusable'],
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/home'],
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/search'],

  // People and organisations: the administrator's; the auditor reads who is who.
  ['401 403 403  403 403 403 403 ok  ok ', 'GET /api/people'],
  ['401 403 403  403 403 403 403 ok  ok ', 'GET /api/people/:id'],
  ['401 403 403  403 403 403 403 403 409', 'POST /api/people', 'person.email-taken'],
  ['401 403 403  403 403 403 403 403 412', 'PATCH /api/people/:id', 'version.stale'],
  ['401 403 403  403 403 403 403 403 409', 'POST /api/people/:id/invitation', 'person.not-invited'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/organisations'],
  ['401 403 403  403 403 403 403 403 409', 'POST /api/organisations', 'organisation.name-taken'],

  // Work orders: a contractor's own, all of the owner's people; made by the administrator.
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/work-orders'],
  ['401 403 403  403 403 403 403 403 409', 'POST /api/work-orders', 'work-order.number-taken'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/work-orders/:id'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/work-orders/:id/structures'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/work-orders/:id/template.xlsx'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/work-orders/:id/check-context'],

  // Batches: handed in by their contractor alone.
  ['401 ok  404  403 403 403 403 403 403', 'POST /api/work-orders/:id/batches'],
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/batches'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/batches/:id'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/batches/:id (draft)'],
  ['401 400 404  403 403 403 403 403 403', 'PUT /api/batches/:id/workbook', 'upload.broken'],
  ['401 400 404  403 403 403 403 403 403', 'POST /api/batches/:id/photos', 'upload.broken'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/batches/:id/check'],
  ['401 409 404  403 403 403 403 403 403', 'POST /api/batches/:id/recheck', 'revision.frozen'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/batches/:id/inputs'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/batches/:id/revisions'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/batches/:id/changes'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/batches/:id/photos'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/batches/:id/records'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/batches/:id/findings'],
  ['401 409 404  403 403 403 403 403 403', 'POST /api/batches/:id/submit', 'revision.frozen'],
  ['401 409 404  403 403 403 403 403 403', 'POST /api/batches/:id/withdraw', 'revision.not-submitted'],

  // Photographs and lines: what is still a draft is its contractor's alone.
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/photos/:id/file'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/photos/:id/file (original)'],
  ['401 ok  404  404 404 404 404 404 404', 'GET /api/photos/:id/file (draft)'],
  ['401 422 404  403 403 403 403 403 403', 'PUT /api/photos/:id/match', 'photo.line'],
  ['401 409 404  403 403 403 403 403 403', 'DELETE /api/photos/:id/match', 'revision.frozen'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/records/:id'],
  ['401 ok  404  404 404 404 404 404 404', 'GET /api/records/:id (draft)'],

  // Sheets on paper: whoever may see the lines; a file of many for the one who asked for it alone.
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/records/:id/sheet.pdf'],
  ['401 ok  404  404 404 404 404 404 404', 'GET /api/records/:id/sheet.pdf (draft)'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'POST /api/batches/:id/sheets'],
  ['401 ok  404  409 409 409 409 409 409', 'POST /api/batches/:id/sheets (draft)', 'sheets.none'],
  ['401 ok  404  404 404 404 404 404 404', 'GET /api/sheets/:id'],
  ['401 ok  404  404 404 404 404 404 404', 'GET /api/sheets/:id/file'],

  ['401 409 404  403 403 403 403 403 403', 'PUT /api/findings/:id/answer', 'revision.frozen'],

  // The review: inspectors alone, and a taken batch by the one who took it alone.
  ['401 403 403  ok  409 403 403 403 403', 'POST /api/batches/:id/take', 'revision.taken'],
  ['401 403 403  409 409 403 403 403 403', 'POST /api/batches/:id/release', 'revision.not-in-review'],
  ['401 403 403  409 409 403 403 403 403', 'POST /api/batches/:id/approve-clean', 'revision.not-taken'],
  [
    '401 403 403  409 409 403 403 403 403',
    'POST /api/batches/:id/close-review',
    'review.undecided revision.taken',
  ],
  ['401 403 403  412 409 403 403 403 403', 'PUT /api/findings/:id/decision', 'version.stale revision.taken'],
  [
    '401 403 403  412 409 403 403 403 403',
    'DELETE /api/findings/:id/decision',
    'version.stale revision.taken',
  ],
  ['401 403 403  412 409 403 403 403 403', 'PUT /api/records/:id/decision', 'version.stale revision.taken'],
  [
    '401 403 403  412 409 403 403 403 403',
    'DELETE /api/records/:id/decision',
    'version.stale revision.taken',
  ],
  [
    '401 403 403  412 409 403 403 403 403',
    'POST /api/findings/:id/concession',
    'version.stale revision.taken',
  ],
  ['401 403 403  409 409 403 403 403 403', 'POST /api/records/:id/reopen', 'line.not-approved'],
  ['401 403 403  403 403 403 409 403 403', 'POST /api/records/:id/refer-back', 'line.not-approved'],
  ['401 403 403  403 403 403 403 403 422', 'POST /api/batches/:id/assign', 'review.not-an-inspector'],
  ['401 403 403  403 403 403 403 403 409', 'POST /api/records/:id/abandon', 'line.not-returned'],

  // Concessions: seen by whom they concern, granted by an engineer alone.
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/concessions'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/concessions/:id'],
  ['401 403 403  403 403 412 403 403 403', 'PUT /api/concessions/:id/decision', 'version.stale'],

  // The register: a contractor sees what of theirs was accepted; entered and issued by the clerk alone.
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/register'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/register/:recordNumber'],
  ['401 403 403  403 403 403 ok  403 403', 'GET /api/register/candidates'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/register/export.csv'],
  ['401 403 403  403 403 403 409 403 403', 'POST /api/register/entries', 'register.not-approved'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/transmittals'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/transmittals/:id'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/transmittals/:id/file'],
  ['401 403 403  403 403 403 422 403 403', 'POST /api/transmittals', 'transmittal.unknown-record'],

  // Progress is followed by whom the thing itself is open to.
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/events (check)'],
  ['401 ok  404  ok  ok  ok  ok  ok  ok ', 'GET /api/events (batch)'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/events (transmittal)'],
  ['401 ok  404  404 404 404 404 404 404', 'GET /api/events (sheets)'],

  // What did not conform, and the trail: the owner's people; the chain is verified by auditor and administrator.
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/nonconformities'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/nonconformities/summary'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/nonconformities/export.csv'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/trail'],
  ['401 403 403  403 403 403 403 ok  ok ', 'GET /api/trail/verify'],

  // Foam and standard. Lots tell of every contractor's use; products and the published standard are for all.
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/products'],
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/products/:id'],
  ['401 403 403  403 403 403 403 403 422', 'POST /api/products', 'product.invalid'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/lots'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/lots/:id'],
  ['401 403 403  ok  ok  ok  ok  ok  ok ', 'GET /api/planner/stock'],
  ['401 403 403  403 403 403 403 403 409', 'POST /api/lots', 'lot.number-taken'],
  ['401 403 403  403 403 403 403 403 409', 'POST /api/lots/:id/events', 'lot.not-held'],
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/standard/versions'],
  ['401 ok  ok   ok  ok  ok  ok  ok  ok ', 'GET /api/standard/versions/:n'],
  ['401 404 404  ok  ok  ok  ok  ok  ok ', 'GET /api/standard/versions/:n (draft)'],
  ['401 403 403  403 403 422 403 403 403', 'POST /api/standard/versions', 'standard.invalid'],
  ['401 403 403  403 403 412 403 403 403', 'POST /api/standard/versions/:n/publish', 'version.stale'],

  // The installation: the administrator's. The mail capture holds reset links. There is no such parked job: 404 is its answer.
  ['401 403 403  403 403 403 403 403 ok ', 'GET /api/mail'],
  ['401 403 403  403 403 403 403 403 ok ', 'GET /api/mail/:id'],
  ['401 403 403  403 403 403 403 403 ok ', 'GET /api/jobs/parked'],
  ['401 403 403  403 403 403 403 403 404', 'POST /api/jobs/parked/:id/retry'],
];
