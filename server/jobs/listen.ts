import pg from 'pg';

/** `payload` is null after the connection was lost and made again: anything may have been missed, so look for yourself. */
export type NotificationHandler = (payload: string | null) => void;

export type Listener = {
  /** Returns what ends it. */
  on(channel: string, handler: NotificationHandler): () => void;
  /** Holds an advisory lock of this process's connection on `key` until it is let go or the process ends. False: another has it. */
  hold(key: string): Promise<boolean>;
  letGo(key: string): Promise<void>;
  close(): Promise<void>;
};

const CHANNEL = /^[a-z_]+$/;
const FIRST_PAUSE_MS = 250;
/** Shorter than the time between two looks for jobs of dead processes: a living one has its locks again by then. */
const LONGEST_PAUSE_MS = 2_000;

/** One LISTEN connection for the whole process, made again whenever it is lost; locks held are taken again. */
export function createListener(url: string, onError: (error: Error) => void = () => undefined): Listener {
  const handlers = new Map<string, Set<NotificationHandler>>();
  const held = new Set<string>();
  let client: pg.Client | null = null;
  let connecting: Promise<pg.Client> | null = null;
  let closed = false;
  let pause = FIRST_PAUSE_MS;
  let timer: NodeJS.Timeout | undefined;

  const lost = (which: pg.Client, error: Error | null): void => {
    if (client !== which) return;
    client = null;
    if (error !== null) onError(error);
    again();
  };

  const again = (): void => {
    if (closed || timer !== undefined) return;
    timer = setTimeout(() => {
      timer = undefined;
      connect().then(
        () => handlers.forEach((set) => set.forEach((handler) => handler(null))),
        (error: Error) => {
          onError(error);
          again();
        },
      );
    }, pause);
    pause = Math.min(pause * 2, LONGEST_PAUSE_MS);
  };

  const open = async (): Promise<pg.Client> => {
    const next = new pg.Client({
      connectionString: url,
      application_name: 'upstand-listen',
      keepAlive: true,
      connectionTimeoutMillis: 10_000,
    });
    next.on('error', (error) => lost(next, error));
    next.on('end', () => lost(next, null));
    next.on('notification', ({ channel, payload }) =>
      handlers.get(channel)?.forEach((handler) => handler(payload ?? '')),
    );
    await next.connect();
    try {
      for (const channel of handlers.keys()) await next.query(`listen ${channel}`);
      for (const key of held) await next.query('select pg_try_advisory_lock(hashtextextended($1, 0))', [key]);
    } catch (error) {
      await next.end().catch(() => undefined);
      throw error;
    }
    pause = FIRST_PAUSE_MS;
    client = next;
    return next;
  };

  const connect = (): Promise<pg.Client> => {
    if (closed) return Promise.reject(new Error('The listener is closed.'));
    if (client !== null) return Promise.resolve(client);
    connecting ??= open().finally(() => {
      connecting = null;
    });
    return connecting;
  };

  // One connection takes one statement at a time; those that come meanwhile wait their turn.
  let turn: Promise<unknown> = Promise.resolve();
  const inTurn = <T>(task: (connection: pg.Client) => Promise<T>): Promise<T> => {
    const mine = turn.then(connect).then(task);
    turn = mine.catch(() => undefined);
    return mine;
  };

  return {
    on(channel, handler) {
      if (!CHANNEL.test(channel)) throw new Error(`"${channel}" is not a name of a channel.`);
      const known = handlers.get(channel);
      const set = known ?? new Set();
      handlers.set(channel, set.add(handler));
      if (known === undefined) {
        inTurn((connection) => connection.query(`listen ${channel}`))
          .then(() => handler(null))
          .catch((error: Error) => {
            if (closed) return;
            onError(error);
            again();
          });
      }
      return () => void set.delete(handler);
    },
    async hold(key) {
      const { rows } = await inTurn((connection) =>
        connection.query<{ got: boolean }>('select pg_try_advisory_lock(hashtextextended($1, 0)) as got', [
          key,
        ]),
      );
      const got = rows[0]?.got === true;
      if (got) held.add(key);
      return got;
    },
    async letGo(key) {
      held.delete(key);
      // A connection that was lost has let go already.
      if (client === null) return;
      await inTurn((connection) =>
        connection.query('select pg_advisory_unlock(hashtextextended($1, 0))', [key]),
      ).catch(() => undefined);
    },
    async close() {
      closed = true;
      clearTimeout(timer);
      const last = client ?? (await connecting?.catch(() => null)) ?? null;
      client = null;
      await last?.end().catch(() => undefined);
    },
  };
}
