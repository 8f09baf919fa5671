import type { Role } from '#shared/permissions/ability.ts';

/** One line of a home: what waits, as a count. `sql` may use `me(id, org)`. */
export type Waiting = {
  key: string;
  one: string;
  many: string;
  detail: string | null;
  to: string;
  sql: string;
};

const OPEN_DRAFT = `from revisions r join batches b on b.id = r.batch_id
  where b.contractor_id = (select org from me) and r.status in ('draft', 'checking', 'checked')`;
const IN_QUEUE = `select count(*) from revisions where status = 'submitted'`;

const CONTRACTOR: readonly Waiting[] = [
  {
    key: 'returned',
    one: 'Batch came back to be corrected',
    many: 'Batches came back to be corrected',
    detail: 'Only the lines that were sent back are in it.',
    to: '/batches',
    sql: `select count(*) ${OPEN_DRAFT} and r.n > 0`,
  },
  {
    key: 'drafts',
    one: 'Batch not yet submitted',
    many: 'Batches not yet submitted',
    detail: null,
    to: '/batches',
    sql: `select count(*) ${OPEN_DRAFT} and r.n = 0`,
  },
  {
    key: 'actions-due',
    one: 'Rework or repair due within 14 days',
    many: 'Reworks and repairs due within 14 days',
    detail: null,
    to: '/batches',
    sql: `select count(*) from actions where owner_org_id = (select org from me) and closed_at is null
      and due_on < current_date + 14`,
  },
  {
    key: 'work-orders',
    one: 'Work order open',
    many: 'Work orders open',
    detail: null,
    to: '/work-orders',
    sql: `select count(*) from work_orders where contractor_id = (select org from me) and state = 'open'`,
  },
];

const INSPECTOR: readonly Waiting[] = [
  {
    key: 'mine',
    one: 'Batch in your review',
    many: 'Batches in your review',
    detail: 'A batch that nobody works on goes back to the queue.',
    to: '/review',
    sql: `select count(*) from revisions where status = 'in-review' and inspector_id = (select id from me)`,
  },
  {
    key: 'queue',
    one: 'Batch waits for an inspector',
    many: 'Batches wait for an inspector',
    detail: null,
    to: '/review',
    sql: IN_QUEUE,
  },
];

const ENGINEER: readonly Waiting[] = [
  {
    key: 'concessions',
    one: 'Concession asked for',
    many: 'Concessions asked for',
    detail: 'The line is held until it is answered.',
    to: '/concessions?state=asked',
    sql: `select count(*) from concession_current where state = 'asked'`,
  },
  {
    key: 'after-acceptance',
    one: 'Finding on an accepted line',
    many: 'Findings on accepted lines',
    detail: 'Learnt after acceptance; the line is flagged until it is decided.',
    to: '/nonconformities?state=undecided',
    sql: `select count(*) from finding_states s join findings f on f.id = s.finding_id
      where s.state = 'open' and f.origin = 'after-acceptance'`,
  },
  {
    key: 'standard-drafts',
    one: 'Draft of the standard to publish',
    many: 'Drafts of the standard to publish',
    detail: 'Written by another engineer.',
    to: '/standard',
    sql: `select count(*) from standard_versions where state = 'draft' and author_id <> (select id from me)`,
  },
];

const CLERK: readonly Waiting[] = [
  {
    key: 'to-enter',
    one: 'Approved line not yet on record',
    many: 'Approved lines not yet on record',
    detail: null,
    to: '/register/enter',
    sql: `select count(*) from lines l join revisions v on v.id = l.revision_id
      where l.state = 'approved' and v.status in ('decided', 'on-record')`,
  },
  {
    key: 'transmittals-failed',
    one: 'Transmittal that could not be made',
    many: 'Transmittals that could not be made',
    detail: null,
    to: '/transmittals',
    sql: `select count(*) from transmittals where state = 'failed'`,
  },
];

const AUDITOR: readonly Waiting[] = [
  {
    key: 'undecided',
    one: 'Nonconformity undecided',
    many: 'Nonconformities undecided',
    detail: null,
    to: '/nonconformities?severity=nonconformity&state=undecided',
    sql: `select count(*) from finding_states where state = 'open' and severity = 'nonconformity'`,
  },
  {
    key: 'overdue',
    one: 'Correction, rework or repair overdue',
    many: 'Corrections, reworks and repairs overdue',
    detail: null,
    to: '/nonconformities?state=rejected',
    sql: `select count(*) from actions where closed_at is null and due_on < current_date`,
  },
  {
    key: 'conceded',
    one: 'Finding accepted by concession',
    many: 'Findings accepted by concession',
    detail: 'What is accepted by concession stays non-conforming on record.',
    to: '/nonconformities?grounds=concession',
    sql: `select count(*) from finding_states where grounds = 'concession' and state = 'approved'`,
  },
];

const ADMINISTRATOR: readonly Waiting[] = [
  {
    key: 'reviews-resting',
    one: 'Review that nobody has worked on for three days',
    many: 'Reviews that nobody has worked on for three days',
    detail: 'It can be given to another inspector.',
    to: '/review',
    sql: `select count(*) from revisions
      where status = 'in-review' and coalesce(worked_at, taken_at) < now() - interval '3 days'`,
  },
  {
    key: 'jobs-parked',
    one: 'Job parked after its last attempt',
    many: 'Jobs parked after their last attempt',
    detail: 'Each can be tried again.',
    to: '/jobs',
    sql: `select count(*) from pgboss.job where state = 'failed'`,
  },
  {
    key: 'invited',
    one: 'Invitation not taken up',
    many: 'Invitations not taken up',
    detail: null,
    to: '/people',
    sql: `select count(*) from users where active and password_hash is null`,
  },
];

export const WAITING_BY_ROLE: Readonly<Record<Role, readonly Waiting[]>> = {
  contractor: CONTRACTOR,
  inspector: INSPECTOR,
  engineer: ENGINEER,
  clerk: CLERK,
  auditor: AUDITOR,
  administrator: ADMINISTRATOR,
};
