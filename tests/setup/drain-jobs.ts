import type { Pool } from 'pg';

const POLL_MS = 40;

/** Waits until no job is due or under way. Jobs that rest before a repeat are left; a test's own limit ends a wait that is in vain. */
export async function drainJobs(pool: Pool): Promise<void> {
  for (;;) {
    const { rows } = await pool.query<{ open: number }>(
      `select count(*)::int as open from pgboss.job
       where state = 'active' or (state < 'active' and start_after <= now() and singleton_key is distinct from 'every')`,
    );
    if (rows[0]?.open === 0) return;
    await new Promise((resolve) => setTimeout(resolve, POLL_MS));
  }
}
