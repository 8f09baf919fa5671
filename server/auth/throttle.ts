import type { Pool } from 'pg';

/** Attempts under one key within a fixed window, counted in the database: any number of processes count as one. */
export type Throttle = { key: string; limit: number; windowMinutes: number };

/** Counts an attempt before it is made, so that many at once cannot slip past; says how long to wait when over. */
export async function countAttempt(
  pool: Pool,
  { key, limit, windowMinutes }: Throttle,
): Promise<{ count: number; waitSeconds: number | null }> {
  const counted = await pool.query<{ n: number; ends_in: number }>(
    `insert into throttles (key, window_start, n)
     values ($1, date_bin(make_interval(mins => $2), now(), 'epoch'::timestamptz), 1)
     on conflict (key, window_start) do update set n = throttles.n + 1
     returning n, ceil(extract(epoch from window_start + make_interval(mins => $2) - now()))::int as ends_in`,
    [key, windowMinutes],
  );
  const { n, ends_in: endsIn } = counted.rows[0] ?? { n: 0, ends_in: 0 };
  return { count: n, waitSeconds: n > limit ? Math.max(1, endsIn) : null };
}

/** Takes back an attempt that turned out right, so that only wrong ones count. */
export async function forgiveAttempt(pool: Pool, { key, windowMinutes }: Throttle): Promise<void> {
  await pool.query(
    `update throttles set n = greatest(n - 1, 0)
     where key = $1 and window_start = date_bin(make_interval(mins => $2), now(), 'epoch'::timestamptz)`,
    [key, windowMinutes],
  );
}

/** Sets a key back to none, after a right password. */
export async function clearAttempts(pool: Pool, key: string): Promise<void> {
  await pool.query('delete from throttles where key = $1', [key]);
}
