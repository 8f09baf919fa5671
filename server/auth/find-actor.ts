import type { Pool } from 'pg';
import type { Actor, Role } from '#shared/permissions/ability.ts';

type ActorRow = {
  id: string;
  email: string;
  name: string;
  role: Role;
  org_id: string;
  org_kind: Actor['orgKind'];
  org_name: string;
  active: boolean;
  password_hash: string | null;
};
export type Account = { actor: Actor; active: boolean; passwordHash: string | null };

const SELECT = `
  select u.id, u.email, u.name, u.role, u.active, u.password_hash, o.id as org_id, o.kind as org_kind, o.name as org_name
  from users u join organisations o on o.id = u.org_id`;

function toAccount(row: ActorRow | undefined): Account | null {
  if (!row) return null;
  const { id, email, name, role, org_id: orgId, org_kind: orgKind, org_name: orgName } = row;
  const actor: Actor = { id, email, name, role, orgId, orgKind, orgName };
  return { actor, active: row.active, passwordHash: row.password_hash };
}

export async function findAccountByEmail(pool: Pool, email: string): Promise<Account | null> {
  const found = await pool.query<ActorRow>(`${SELECT} where lower(u.email) = lower($1)`, [email.trim()]);
  return toAccount(found.rows[0]);
}

/** Asked at every request, so that a role taken away or an account closed counts at once. Null: gone or inactive. */
export async function findActiveActor(pool: Pool, id: string): Promise<Actor | null> {
  const found = await pool.query<ActorRow>(`${SELECT} where u.id = $1 and u.active`, [id]);
  return toAccount(found.rows[0])?.actor ?? null;
}
