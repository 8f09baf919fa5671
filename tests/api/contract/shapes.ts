import type { Shape } from './shape.ts';

/** The shapes that programs outside the project rely on, written by hand from the published description of the API. */
const named = { id: 'uuid', name: 'string' };
const measure = 'number|string|null';

export const page = (item: Shape): Shape => ({ items: [item], nextCursor: 'string|null', total: 'int|null' });

export const session: Shape = {
  user: { id: 'uuid', email: 'string', name: 'string', role: 'string', organisation: named },
  abilities: 'list',
  csrfToken: 'string',
};
export const workOrder: Shape = {
  id: 'uuid',
  number: 'string',
  title: 'string',
  zone: 'string',
  contractor: named,
};
export const batch: Shape = {
  id: 'uuid',
  number: 'string',
  workOrder: { id: 'uuid', number: 'string' },
  contractor: named,
  status: 'draft|checking|checked|submitted|in-review|decided|on-record',
  revision: { id: 'uuid', number: 'int' },
  input: 'int',
  counts: { lines: 'int', nonconformity: 'int', query: 'int', note: 'int' },
  version: 'int',
  can: ['string'],
};
export const upload: Shape = {
  input: 'int',
  files: [{ id: 'uuid|null', fileName: 'string', sha256: 'sha256|null', error: 'object|null' }],
};
export const check: Shape = {
  input: 'int',
  state: 'queued|running|done|failed',
  done: 'int',
  total: 'int|null',
  problem: 'object|null',
};
export const record: Shape = {
  id: 'uuid',
  lineId: 'uuid',
  kind: 'set|straighten|relevel',
  structureNumber: 'string|null',
  sheet: 'string',
  row: 'int',
  state: 'undecided|approved|returned|held|on-record|abandoned',
  values: 'object',
  derived: {
    voidFt3: 'number|null',
    placedFt3: 'number|null',
    fillRatio: 'number|null',
    fillRatioU: 'number|null',
    dueFt: 'number|null',
    waterWithPoleIn: 'number|null',
  },
  photos: [{ id: 'uuid', view: 'string|null' }],
  version: 'int',
};
export const finding: Shape = {
  id: 'uuid',
  recordId: 'uuid|null',
  code: 'string',
  severity: 'nonconformity|query|note',
  structureNumber: 'string|null',
  sheet: 'string|null',
  row: 'int|null',
  cell: 'string|null',
  measured: measure,
  limit: measure,
  margin: 'number|null',
  unit: 'string|null',
  uncertainty: 'number|null',
  params: 'object',
  message: 'string',
  decision: 'object|null',
  version: 'int',
};
export const closed: Shape = {
  approved: ['uuid'],
  returned: ['uuid'],
  held: ['uuid'],
  nextRevision: 'int|null',
};
export const entries: Shape = {
  entries: [{ id: 'uuid', recordId: 'uuid', recordNumber: 'string', version: 'int' }],
};
export const nonconformity: Shape = {
  ...(finding as Record<string, Shape>),
  contractor: named,
  workOrder: { id: 'uuid', number: 'string' },
  installedOn: 'day|null',
  lots: 'list',
  state: 'string',
  grounds: 'string|null',
};
export const transmittal: Shape = {
  id: 'uuid',
  number: 'string',
  revision: 'int',
  state: 'queued|running|issued|failed',
  rows: 'int',
  sha256: 'sha256|null',
};
export const problem: Shape = {
  type: 'string',
  title: 'string',
  status: 'int',
  code: 'string',
  detail: 'string',
  errors: [{ pointer: 'string', code: 'string', detail: 'string' }],
};
