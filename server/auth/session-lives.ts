import type pg from 'pg';
import { findActiveActor } from '#server/auth/find-actor.ts';
import type { Actor } from '#shared/permissions/ability.ts';

type Asked = { readonly sessionId: string; readonly actor: Actor; readonly absoluteHours: number };

/** Whether what was opened under a session may go on: it is not over, and still this active person's in this role. Moves no expiry. */
export async function sessionLives(
  pool: pg.Pool,
  { sessionId, actor, absoluteHours }: Asked,
): Promise<boolean> {
  const { rowCount } = await pool.query(
    `select 1 from sessions
     where sid = $1 and expire > now() and sess #>> '{passport,user}' = $2
       and to_timestamp((sess ->> 'signedInAt')::float8 / 1000) > now() - make_interval(hours => $3)`,
    [sessionId, actor.id, absoluteHours],
  );
  if (rowCount !== 1) return false;
  const now = await findActiveActor(pool, actor.id);
  return now !== null && now.role === actor.role && now.orgId === actor.orgId;
}
