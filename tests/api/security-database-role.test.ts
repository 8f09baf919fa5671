import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { rows, run } from '#server/db/rows.ts';
import { createDataHarness, type DataHarness } from '#tests/setup/data-harness.ts';

/** What the account of the application may do, asked of PostgreSQL's own catalogues and tried. */

let data: DataHarness;
beforeAll(async () => {
  data = await createDataHarness();
});
afterAll(() => data?.close());

const ask = <T extends object>(sql: string) => rows<T>(data.orm.em.fork(), sql);
const guarded = async () =>
  (
    await ask<{ name: string }>(
      `select c.relname as name from pg_trigger t join pg_class c on c.oid = t.tgrelid where t.tgname = 'append_only' order by 1`,
    )
  ).map(({ name }) => name);

describe('the application’s account', () => {
  it('is nobody of power, and belongs to nobody', async () => {
    expect(
      await ask(`select rolsuper, rolcreaterole, rolcreatedb, rolbypassrls, rolreplication,
        (select count(*)::int from pg_auth_members where member = r.oid) as groups
        from pg_roles r where rolname = current_user`),
    ).toEqual([
      {
        rolsuper: false,
        rolcreaterole: false,
        rolcreatedb: false,
        rolbypassrls: false,
        rolreplication: false,
        groups: 0,
      },
    ]);
  });

  it('owns nothing', async () => {
    expect(
      await ask(`select relname from pg_class where relowner = current_user::regrole
        union all select proname from pg_proc where proowner = current_user::regrole
        union all select nspname from pg_namespace where nspowner = current_user::regrole`),
    ).toEqual([]);
  });

  it('makes nothing in any schema of ours', async () => {
    expect(
      await ask(
        `select nspname from pg_namespace where nspname in ('public', 'pgboss') and has_schema_privilege(oid, 'create')`,
      ),
    ).toEqual([]);
  });

  it('has no right to change, empty, refer to or guard any append-only table, column by column too', async () => {
    expect((await guarded()).length).toBe(22);
    expect(
      await ask(`select c.relname, p.privilege from pg_trigger t join pg_class c on c.oid = t.tgrelid,
        unnest(array['update', 'delete', 'truncate', 'references', 'trigger']) p (privilege)
        where t.tgname = 'append_only' and (has_table_privilege(c.oid, p.privilege)
          or (p.privilege in ('update', 'references') and has_any_column_privilege(c.oid, p.privilege)))`),
    ).toEqual([]);
  });

  it('has no right to write to the trail, its end, or the list of migrations', async () => {
    expect(
      await ask(`select t.name, p.privilege from unnest(array['trail', 'trail_head', 'mikro_orm_migrations']) t (name),
        unnest(array['insert', 'update', 'delete', 'truncate', 'trigger']) p (privilege)
        where has_table_privilege(t.name, p.privilege)`),
    ).toEqual([]);
  });

  it('is refused each way round a guard, on every such table', async () => {
    const allowed: string[] = [];
    for (const table of await guarded()) {
      for (const statement of [
        `alter table ${table} disable trigger append_only`,
        `alter table ${table} disable trigger all`,
        `alter table ${table} rename to gone`,
        `alter table ${table} add column extra int`,
        `alter table ${table} owner to current_user`,
        `drop trigger append_only on ${table}`,
        `create rule nothing as on insert to ${table} do instead nothing`,
        `create trigger mine before insert on ${table} for each row execute function refuse_change()`,
        `drop table ${table} cascade`,
      ]) {
        const code = await run(data.orm.em.fork(), statement).then(
          () => 'done',
          (error: { code?: string }) => error.code,
        );
        if (code !== '42501') allowed.push(`${statement}: ${code}`);
      }
    }
    expect(allowed).toEqual([]);
  });
});

describe('functions that run as the owner', () => {
  it('are these, and look names up in a path of their own', async () => {
    expect(
      await ask(`select proname as name, proconfig as settings from pg_proc
        where prosecdef and pronamespace = 'public'::regnamespace order by 1`),
    ).toEqual([{ name: 'trail_chain', settings: ['search_path=public, pg_temp'] }]);
  });
});
