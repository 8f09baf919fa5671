import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows as queryRows, run } from '#server/db/rows.ts';
import { badQuery } from '#server/http/page.ts';
import { conflict, notFound, problem } from '#server/http/problem.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import { setProgress } from '#server/jobs/progress.ts';
import {
  REGISTER_FILTER_QUERY,
  registerConditions,
  type RegisterFilter,
} from '#server/modules/register/register-filter.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { TransmittalBody } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { issueTransmittalJob } from './issue-transmittal.job.ts';

type Scope = TransmittalBody['scope'];
type Before = { id: string; number: string; state: string; superseded: boolean; latest: number };

/**
 * Fixes what an as-built is issued of (the versions on record now) and queues the writing of it.
 * @returns its id
 * @throws Problem 404 for an unknown work order or transmittal; 409 when a revision was already superseded; 422 when the
 * scope holds nothing or names an unknown record
 */
export async function requestTransmittal(
  em: EntityManager,
  options: { body: TransmittalBody; actor: Actor },
): Promise<string> {
  const { body, actor } = options;
  return em.transactional(async (tx) => {
    const before = body.supersedes ? await lockBefore(tx, body.supersedes) : null;
    const title = body.title?.trim() || (await titleOf(tx, body.scope));
    const made = await row<{ id: string; number: string; revision: number }>(
      tx,
      `insert into transmittals (number, revision, supersedes_id, scope, title, requested_by)
       values (coalesce($1, human_number('T', nextval('transmittal_numbers'), 4)), $2, $3, $4, $5, $6)
       returning id, number, revision`,
      [
        before?.number ?? null,
        before ? before.latest + 1 : 0,
        before?.id ?? null,
        JSON.stringify(body.scope),
        title,
        actor.id,
      ],
    );
    if (!made) throw new Error('The new transmittal has no id.');
    const rows = await fixItems(tx, made.id, body.scope);
    await appendTrail(tx, {
      actor,
      action: 'transmittal.requested',
      subject: { type: 'transmittal', id: made.id, label: `${made.number} rev ${made.revision}` },
      payload: { scope: body.scope, rows },
    });
    await setProgress(tx, { subject: `transmittal:${made.id}`, state: 'queued', done: 0, total: rows });
    await enqueue(tx, issueTransmittalJob, { transmittalId: made.id });
    return made.id;
  });
}

async function lockBefore(em: EntityManager, id: string): Promise<Before> {
  const before = await row<Before>(
    em,
    `select t.id, t.number, t.state,
       -- a revision that failed keeps its number
       (select max(each.revision) from transmittals each where each.number = t.number) as latest,
       exists (select 1 from transmittals later where later.supersedes_id = t.id and later.state <> 'failed') as superseded
     from transmittals t where t.id = $1 for update of t`,
    [id],
  );
  if (!before) throw notFound();
  if (before.state !== 'issued')
    throw conflict('transmittal.not-issued', 'Only an issued transmittal is issued again.');
  if (before.superseded)
    throw conflict(
      'transmittal.superseded',
      'A later revision of this transmittal exists. Issue that one again.',
    );
  return before;
}

async function titleOf(em: EntityManager, scope: Scope): Promise<string> {
  if ('recordNumbers' in scope)
    return scope.recordNumbers.length === 1 ? 'One record' : `${scope.recordNumbers.length} records`;
  if ('filter' in scope) return 'Filtered register';
  const order = await row<{ title: string }>(
    em,
    `select 'Work order ' || number || ', ' || title as title from work_orders where id = $1`,
    [scope.workOrder],
  );
  if (!order) throw notFound();
  return order.title;
}

/** Writes down which versions go in, in the order of their structure numbers. What is registered later is not in it. */
async function fixItems(em: EntityManager, transmittalId: string, scope: Scope): Promise<number> {
  const where =
    'recordNumbers' in scope
      ? {
          sql: 'c.version_id is not null and v.record_number = any($2::text[])',
          values: [scope.recordNumbers],
        }
      : registerConditions('workOrder' in scope ? { workOrder: scope.workOrder } : readFilter(scope.filter), {
          contractorId: null,
          first: 2,
        });
  const rows = await run(
    em,
    `insert into transmittal_items (transmittal_id, version_id, ordinal)
     select $1, v.id, row_number() over (order by v.structure_number, v.kind, v.record_number, v.n)
     from register_versions v left join register_current c on c.version_id = v.id where ${where.sql}`,
    [transmittalId, ...where.values],
  );
  if ('recordNumbers' in scope) await refuseUnknown(em, scope.recordNumbers);
  if (rows === 0)
    throw problem(
      422,
      'transmittal.empty',
      'Nothing on the register falls in this scope. Enter approved lines first, or widen the scope.',
      {
        errors: [{ pointer: '/scope', code: 'scope.empty', detail: 'Nothing on the register falls in it.' }],
      },
    );
  return rows;
}

/** Names what is not on the register: a number mistyped among thousands is not found by looking. */
async function refuseUnknown(em: EntityManager, recordNumbers: readonly string[]): Promise<void> {
  const unknown = await queryRows<{ number: string }>(
    em,
    `select number from unnest($1::text[]) number
     where not exists (select 1 from register_current c where c.record_number = number) limit 6`,
    [recordNumbers],
  );
  if (unknown.length === 0) return;
  const named = unknown.slice(0, 5).map((one) => one.number);
  const detail = `Not on the register: ${named.join(', ')}${unknown.length > 5 ? ' and more' : ''}.`;
  throw problem(422, 'transmittal.unknown-record', detail, {
    errors: [{ pointer: '/scope/recordNumbers', code: 'recordNumbers.unknown', detail }],
  });
}

function readFilter(filter: Readonly<Record<string, string>>): RegisterFilter {
  for (const name of Object.keys(filter))
    if (!Object.hasOwn(REGISTER_FILTER_QUERY, name)) throw badQuery(name, 'the register has no such filter.');
  return filter;
}
