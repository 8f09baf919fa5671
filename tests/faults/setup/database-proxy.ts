import { connect, createServer, type AddressInfo, type Socket } from 'node:net';
import { makeHold, type Hold } from './hold.ts';

type Rule = {
  readonly sent: RegExp;
  readonly when: 'sent' | 'committed';
  readonly stand: () => Promise<void>;
};

export type DatabaseProxy = {
  /** The same database by way of the proxy. */
  through(url: string): string;
  /** Holds the next statement that looks so before PostgreSQL sees it. */
  holdStatement(sent: RegExp): Hold;
  /** Holds PostgreSQL's word that the next transaction with such a statement is committed. */
  holdCommitted(sent: RegExp): Hold;
  close(): Promise<void>;
};

/** Characters of what went before that are looked at with a chunk: a statement may come in two. */
const OVERLAP = 200;

/** Passes a process's connections on to PostgreSQL, and sees what is said on each. */
export async function startDatabaseProxy(port: number): Promise<DatabaseProxy> {
  const rules: Rule[] = [];
  const sockets = new Set<Socket>();
  const server = createServer((client) => {
    const upstream = connect(port, '127.0.0.1');
    for (const socket of [client, upstream]) sockets.add(socket);
    pass(client, upstream, rules);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const own = (server.address() as AddressInfo).port;
  const add = (sent: RegExp, when: Rule['when']): Hold => {
    const { hold, stand } = makeHold();
    rules.push({ sent, when, stand });
    return hold;
  };
  return {
    through: (url) => Object.assign(new URL(url), { port: String(own) }).href,
    holdStatement: (sent) => add(sent, 'sent'),
    holdCommitted: (sent) => add(sent, 'committed'),
    close: () => {
      for (const socket of sockets) socket.destroy();
      return new Promise((resolve) => server.close(() => resolve()));
    },
  };
}

function pass(client: Socket, upstream: Socket, rules: Rule[]): void {
  let before = '';
  let committing: Rule | null = null;
  let answer: Rule | null = null;
  const take = (text: string, when: Rule['when']): Rule | null => {
    const at = rules.findIndex((rule) => rule.when === when && rule.sent.test(text));
    return at < 0 ? null : (rules.splice(at, 1)[0] ?? null);
  };
  client.on('data', (chunk: Buffer) => {
    const text = before + chunk.toString('latin1');
    before = text.slice(-OVERLAP);
    committing ??= take(text, 'committed');
    if (committing && /commit/i.test(chunk.toString('latin1'))) answer = committing;
    const rule = take(text, 'sent');
    if (!rule) return void upstream.write(chunk);
    client.pause();
    return void rule.stand().then(() => {
      upstream.write(chunk);
      client.resume();
    });
  });
  upstream.on('data', (chunk: Buffer) => {
    const rule = answer;
    if (!rule) return void client.write(chunk);
    answer = committing = null;
    upstream.pause();
    return void rule.stand().then(() => {
      client.write(chunk);
      upstream.resume();
    });
  });
  joinEnds(client, upstream);
}

/** A connection that ends on one side ends on the other. */
function joinEnds(client: Socket, upstream: Socket): void {
  for (const [one, other] of [
    [client, upstream],
    [upstream, client],
  ] as const) {
    one.on('error', () => undefined);
    one.on('close', () => other.destroy());
  }
}
