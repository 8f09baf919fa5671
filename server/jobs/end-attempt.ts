import type { Services } from '#server/container.ts';
import { row, rows, run } from '#server/db/rows.ts';

export type Attempt = { readonly name: string; readonly id: string; readonly retryCount: number };
export type AttemptEnd =
  | { readonly state: 'done' }
  /** `hopeless`: parked at once, whatever attempts are left. */
  | { readonly state: 'failed'; readonly reason: string; readonly hopeless?: boolean };

/**
 * Writes down how an attempt ended, unless it was taken for dead meanwhile and the job is another attempt's by now.
 * False: it was.
 */
export function endAttempt(services: Services, attempt: Attempt, end: AttemptEnd): Promise<boolean> {
  const { name, id, retryCount } = attempt;
  const { boss } = services.queue;
  return services.orm.em.fork().transactional(async (tx) => {
    const mine = await row(
      tx,
      `select 1 from pgboss.job where name = $1 and id = $2 and state = 'active' and retry_count = $3 for update`,
      [name, id, retryCount],
    );
    if (mine === null) return false;
    const db = {
      executeSql: async (text: string, values: unknown[]) => ({ rows: await rows(tx, text, values) }),
    };
    if (end.state === 'done') {
      await boss.complete(name, id, {}, { db });
      return true;
    }
    if (end.hopeless === true)
      await run(tx, 'update pgboss.job set retry_limit = retry_count where name = $1 and id = $2', [
        name,
        id,
      ]);
    await boss.fail(name, id, { message: end.reason }, { db });
    return true;
  });
}
