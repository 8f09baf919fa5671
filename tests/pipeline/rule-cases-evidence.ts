import type { Expected, Line } from './rule-case.ts';

/** What is seen only on photographs, on the register and on earlier checks; the rest of the work is a clean set pole's. */
export type EvidenceCase = { readonly code: string; readonly fails: Line & { readonly expected: Expected } };

export const BRAND_DAY = '2026-05-04';
const onBrandDay = {
  boredAt: `${BRAND_DAY}T09:00`,
  setAt: `${BRAND_DAY}T09:40`,
  letGoAt: `${BRAND_DAY}T10:05`,
  hardwareAt: `${BRAND_DAY}T11:00`,
  loadAt: '2026-05-05T08:00',
  locateFrom: '2026-05-01',
  locateTo: '2026-05-15',
};

/** What the changed line said at the earlier check: 9 min of 15 after the pour. */
export const CHANGED_FROM = { hardwareAt: '2026-04-14T10:09' };

export const EVIDENCE_CASES: readonly EvidenceCase[] = [
  { code: 'not-on-order', fails: { expected: { measured: 'F-40' } } },
  { code: 'already-on-record', fails: { expected: { measured: 'F-41' } } },
  {
    code: 'changed-to-pass',
    fails: { expected: { measured: '2026-04-14T11:00', severity: 'query', field: 'hardwareAt' } },
  },
  {
    // A 40 ft pole is branded 10 ft from the butt: 10 − 5.5 = 4.5 ft in the ground where 6 ft are written down:
    // 1.5 ft apart; 0.5 − 1.5 = −1.
    code: 'brand-differs',
    fails: {
      values: { ...onBrandDay, brandHeightFt: 5.5 },
      expected: { measured: 1.5, limit: 0.5, margin: -1, unit: 'ft', severity: 'query' },
    },
  },
  { code: 'photo-missing', fails: { expected: { limit: 'plumb' } } },
  { code: 'photo-reused', fails: { expected: { measured: 'F-45 finish.jpg' } } },
  { code: 'photo-alike', fails: { expected: { measured: 'F-46 finish.jpg', severity: 'query' } } },
  {
    // Bored at 09:00; half an hour before that is 08:30: 30 − 31 = −1.
    code: 'photo-elsewhen',
    fails: {
      expected: {
        measured: '2026-04-14T08:29',
        limit: '2026-04-14T09:00',
        margin: -1,
        unit: 'min',
        severity: 'query',
      },
    },
  },
  {
    // The place that the camera tells is 0.001° of latitude north of 41°, where 0.001° are 364.3501 ft (GeographicLib).
    code: 'photo-elsewhere',
    fails: {
      values: { latitude: 41, longitude: -98.4 },
      planned: { latitude: 41, longitude: -98.4 },
      expected: { measured: 364.3501, limit: 150, margin: -214.3501, unit: 'ft', severity: 'query' },
    },
  },
  { code: 'photo-undated', fails: { expected: { measured: 'F-49 finish.jpg', severity: 'note' } } },
  {
    code: 'photo-small',
    fails: { expected: { measured: 999, limit: 1000, margin: -1, unit: 'px', severity: 'note' } },
  },
  // Two lines where one may be: 1 − 2 = −1.
  { code: 'done-twice', fails: { expected: { measured: 2, limit: 1, margin: -1, unit: 'count' } } },
];
