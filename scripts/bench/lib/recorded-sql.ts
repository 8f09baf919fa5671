import pg from 'pg';

export type Statement = { readonly text: string; readonly values: readonly unknown[] };

/** The statements that a task runs, in their order: what is sent through `pg` by whatever lies above it. */
export async function recordedSql(task: () => Promise<unknown>): Promise<Statement[]> {
  const statements: Statement[] = [];
  const prototype = pg.Client.prototype as { query: (...args: unknown[]) => unknown };
  const { query } = prototype;
  prototype.query = function record(this: pg.Client, ...args: unknown[]): unknown {
    const [first] = args;
    if (typeof first === 'object' && first !== null && 'text' in first) {
      const { text, values = [] } = first as { text: string; values?: unknown[] };
      statements.push({ text, values });
    }
    return query.apply(this, args);
  };
  try {
    await task();
  } finally {
    prototype.query = query;
  }
  return statements;
}
