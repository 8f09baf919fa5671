import { createServer, request, type IncomingMessage, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import { makeHold, type Hold } from './hold.ts';

/** Like `PUT /upstand/upstand/incoming/…`; a copy inside the store is said as `COPY`. */
type Rule = {
  readonly asked: RegExp;
  readonly when: 'request' | 'reply';
  readonly stand: () => Promise<void>;
};

export type BlobProxy = {
  /** The same store by way of the proxy. */
  through(connectionString: string): string;
  /** Holds the next such request before the store sees it. */
  holdRequest(asked: RegExp): Hold;
  /** Holds the store's answer to the next such request. */
  holdReply(asked: RegExp): Hold;
  /** Answers every such request with this status, until the returned function is called. */
  answer(asked: RegExp, status: number): () => void;
  close(): Promise<void>;
};

/** Passes a process's requests on to the blob store, and sees what is asked. */
export async function startBlobProxy(port: number): Promise<BlobProxy> {
  const rules: Rule[] = [];
  const answers = new Map<RegExp, number>();
  const server = createServer((req, res) => {
    handle({ req, res, port, rules, answers }).catch(() => res.destroy());
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const own = (server.address() as AddressInfo).port;
  const add = (asked: RegExp, when: Rule['when']): Hold => {
    const { hold, stand } = makeHold();
    rules.push({ asked, when, stand });
    return hold;
  };
  return {
    through: (text) => text.replace(`:${port}/`, `:${own}/`),
    holdRequest: (asked) => add(asked, 'request'),
    holdReply: (asked) => add(asked, 'reply'),
    answer: (asked, status) => {
      answers.set(asked, status);
      return () => void answers.delete(asked);
    },
    close: () => {
      server.closeAllConnections();
      return new Promise((resolve) => server.close(() => resolve()));
    },
  };
}

async function handle(options: {
  req: IncomingMessage;
  res: ServerResponse;
  port: number;
  rules: Rule[];
  answers: ReadonlyMap<RegExp, number>;
}): Promise<void> {
  const { req, res, port, rules, answers } = options;
  const asked = `${req.headers['x-ms-copy-source'] ? 'COPY' : req.method} ${req.url}`;
  for (const [pattern, status] of answers) {
    if (!pattern.test(asked)) continue;
    req.resume();
    res.writeHead(status, { 'x-ms-error-code': 'Refused', 'content-length': 0 }).end();
    return;
  }
  const take = (when: Rule['when']): Rule | undefined => {
    const at = rules.findIndex((rule) => rule.when === when && rule.asked.test(asked));
    return at < 0 ? undefined : rules.splice(at, 1)[0];
  };
  await take('request')?.stand();
  const answered = await forward(req, port);
  await take('reply')?.stand();
  res.writeHead(answered.statusCode ?? 502, answered.headers);
  answered.on('error', () => res.destroy());
  answered.pipe(res);
}

function forward(req: IncomingMessage, port: number): Promise<IncomingMessage> {
  return new Promise((resolve, reject) => {
    const { method, url: path, headers } = req;
    const upstream = request({ host: '127.0.0.1', port, method, path, headers }, resolve);
    upstream.on('error', reject);
    req.on('error', reject);
    req.on('close', () => req.complete || upstream.destroy());
    req.pipe(upstream);
  });
}
