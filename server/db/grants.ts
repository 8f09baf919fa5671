import type pg from 'pg';

export const APP_ROLE = 'upstand_app';

/** Reads and writes rows, adds to append-only tables, and cannot change the shape of anything. Repeatable; tables made by a later migration are covered by running it again. */
const GRANTS = `
do $$
declare
  name text;
begin
  execute format('grant connect on database %I to ${APP_ROLE}', current_database());
  revoke create on schema public from public;
  grant usage on schema public, pgboss to ${APP_ROLE};
  grant select, insert, update, delete on all tables in schema public, pgboss to ${APP_ROLE};
  grant usage, select on all sequences in schema public, pgboss to ${APP_ROLE};
  grant execute on all functions in schema public to ${APP_ROLE};
  for name in select c.relname from pg_trigger t join pg_class c on c.oid = t.tgrelid where t.tgname = 'append_only' loop
    execute format('revoke update, delete, truncate on %I from ${APP_ROLE}', name);
  end loop;
  -- The trail is written by its own function alone.
  revoke insert, update, delete, truncate on trail, trail_head from ${APP_ROLE};
  revoke select, update, delete, truncate on trail_staged from ${APP_ROLE};
  revoke insert, update, delete, truncate on mikro_orm_migrations from ${APP_ROLE};
end $$;
`;

/** Two databases of one cluster may be prepared at once, and roles belong to the cluster: the loser of that race finds the role made. */
const ROLE = `
do $$
begin
  if not exists (select from pg_roles where rolname = '${APP_ROLE}') then
    create role ${APP_ROLE} login;
  end if;
exception when duplicate_object or unique_violation then null;
end $$;
`;

/** So that the owner's own sign-in may take the role on, where the application has none of its own. An administrator who made the role may have to say this. */
const MEMBER = `
do $$
begin
  if not pg_has_role(current_user, '${APP_ROLE}', 'MEMBER') then
    execute format('grant ${APP_ROLE} to %I', current_user);
  end if;
exception when insufficient_privilege then null;
end $$;
`;

/** Makes the application's role if it is missing, sets its password when one is given, and gives it what it needs and no more. */
export async function grantToApp(client: pg.Client, appPassword?: string): Promise<void> {
  try {
    await client.query(ROLE);
  } catch (error) {
    if ((error as { code?: string }).code !== '42501') throw error;
    throw new Error(
      `The account in DATABASE_URL may not make roles. Let an administrator of the server run: create role ${APP_ROLE} login password '…'; then start again.`,
      { cause: error },
    );
  }
  if (appPassword !== undefined) {
    await client.query(`alter role ${APP_ROLE} login password ${client.escapeLiteral(appPassword)}`);
  }
  await client.query(GRANTS);
  await client.query(MEMBER);
}
