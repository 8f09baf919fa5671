import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { appRoleUrl } from '#server/db/app-role-url.ts';
import { createOrm } from '#server/db/orm.ts';
import { row, rows, run } from '#server/db/rows.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import { createOrganisation, createPerson } from '#tests/factories/people.ts';
import { createStandard } from '#tests/factories/standards.ts';
import { createDataHarness, type DataHarness } from '#tests/setup/data-harness.ts';

/** By hand from the table design: what is never changed or deleted once written. */
const APPEND_ONLY = [
  'answers',
  'concession_events',
  'concession_findings',
  'concessions',
  'decisions',
  'findings',
  'flags',
  'inputs',
  'lot_events',
  'outcomes',
  'photo_bands',
  'photo_facts',
  'photo_matches',
  'photos',
  'planned',
  'pours',
  'product_versions',
  'records',
  'refusals',
  'register_versions',
  'trail',
  'transmittal_items',
];

let data: DataHarness;
beforeAll(async () => {
  data = await createDataHarness();
});
afterAll(() => data.close());

describe('append-only tables', () => {
  it('are these', async () => {
    const found = await data.owner.query<{ name: string }>(
      `select c.relname as name from pg_trigger t join pg_class c on c.oid = t.tgrelid
       where t.tgname = 'append_only' and t.tgenabled = 'A' order by 1`,
    );
    expect(found.rows.map((each) => each.name)).toEqual(APPEND_ONLY);
  });

  it.each(APPEND_ONLY)('%s: neither the application nor the owner changes or empties it', async (table) => {
    const em = data.orm.em.fork();
    for (const statement of [`delete from ${table}`, `truncate ${table} cascade`]) {
      await expect(run(em, statement)).rejects.toMatchObject({ code: '42501' });
      await expect(data.owner.query(statement)).rejects.toMatchObject({ code: 'UP001' });
    }
    const [column] = (
      await data.owner.query<{ name: string }>(
        `select attname as name from pg_attribute where attrelid = $1::regclass and attnum > 0 and attidentity = '' order by attnum limit 1`,
        [table],
      )
    ).rows;
    const update = `update ${table} set ${column?.name} = ${column?.name}`;
    await expect(run(em, update)).rejects.toMatchObject({ code: '42501' });
    await expect(data.owner.query(update)).rejects.toMatchObject({ code: 'UP001' });
  });
});

describe('the role of the application', () => {
  it.each([
    'alter table trail disable trigger append_only',
    'alter table trail disable trigger all',
    'drop trigger append_only on decisions',
    'set session_replication_role = replica',
    'create table mine (id int)',
    'create or replace function refuse_change() returns trigger language plpgsql as $$ begin return new; end $$',
    'drop table decisions',
    `insert into trail values (99, now(), null, null, null, 'x', 'x', 'x', null, '{}', 'x', 'x')`,
    'update trail_head set seq = 0',
    'delete from trail_staged',
    'set role upstand',
  ])('is refused: %s', async (statement) => {
    await expect(run(data.orm.em.fork(), statement)).rejects.toMatchObject({ code: '42501' });
  });

  it('is taken on by the owner’s sign-in where it has none of its own', async () => {
    const orm = await createOrm(appRoleUrl(data.database.ownerUrl), { max: 1 });
    const em = orm.em.fork();
    expect(await row(em, 'select current_user as who')).toEqual({ who: 'upstand_app' });
    await expect(run(em, 'delete from trail')).rejects.toMatchObject({ code: '42501' });
    await orm.close(true);
  });

  it('adds to them', async () => {
    const em = data.orm.em.fork();
    expect(await run(em, `insert into refusals (action, code) values ('GET /', 'forbidden')`)).toBe(1);
    await em.transactional((tx) =>
      appendTrail(tx, { actor: null, action: 'a', subject: { type: 't', id: '1' } }),
    );
    expect(await rows(em, 'select action from trail')).toEqual([{ action: 'a' }]);
  });
});

describe('what is published', () => {
  it('stays as it is, and takes two engineers', async () => {
    const em = data.orm.em.fork();
    const owner = await createOrganisation(em, { kind: 'owner' });
    const author = await createPerson(em, { role: 'engineer', orgId: owner.id });
    const approver = await createPerson(em, { role: 'engineer', orgId: owner.id });
    const people = { authorId: author.id, approverId: approver.id };
    const { id } = await createStandard(em, { ...people, effectiveOn: '2026-01-01' });
    await expect(
      run(em, `update standard_versions set body = '{}' where id = $1`, [id]),
    ).rejects.toMatchObject({
      code: 'UP002',
    });
    await expect(run(em, 'delete from standard_versions where id = $1', [id])).rejects.toMatchObject({
      code: 'UP002',
    });
    await expect(createStandard(em, { ...people, effectiveOn: '2026-01-01' })).rejects.toMatchObject({
      code: '23505',
    });
    await expect(
      createStandard(em, { authorId: author.id, approverId: author.id, effectiveOn: '2027-01-01' }),
    ).rejects.toMatchObject({ code: '23514' });
  });

  it('keeps contractors and the owner’s people apart', async () => {
    const em = data.orm.em.fork();
    const contractor = await createOrganisation(em, { kind: 'contractor' });
    await expect(createPerson(em, { role: 'inspector', orgId: contractor.id })).rejects.toMatchObject({
      code: '23503',
    });
    const person = await createPerson(em, { role: 'contractor', orgId: contractor.id });
    expect(await row(em, 'select org_kind from users where id = $1', [person.id])).toEqual({
      org_kind: 'contractor',
    });
  });
});
