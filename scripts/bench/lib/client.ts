import { PASSWORD } from '#tests/factories/people.ts';

type Sent = {
  readonly body?: unknown;
  readonly form?: FormData;
  readonly headers?: Readonly<Record<string, string>>;
};
export type Client = {
  /** The reply's body. @throws when the status is not 2xx */
  send<T>(method: string, path: string, sent?: Sent): Promise<T>;
  get<T>(path: string): Promise<T>;
  /** Milliseconds from the request to the last byte of its reply. */
  time(method: string, path: string, sent?: Sent): Promise<number>;
};

/** Signs a person of the bench in and keeps the session, as a browser does. */
export async function openClient(url: string, email: string): Promise<Client> {
  const signedIn = await fetch(`${url}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email, password: PASSWORD }),
  });
  if (!signedIn.ok) throw new Error(`${email} could not sign in: ${await signedIn.text()}`);
  const { csrfToken } = (await signedIn.json()) as { csrfToken: string };
  const cookie = signedIn.headers
    .getSetCookie()
    .map((each) => each.split(';')[0])
    .join('; ');
  const text = async (method: string, path: string, { body, form, headers }: Sent = {}): Promise<string> => {
    const reply = await fetch(`${url}${path}`, {
      method,
      headers: {
        cookie,
        'x-csrf-token': csrfToken,
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...headers,
      },
      body: form ?? (body === undefined ? null : JSON.stringify(body)),
    });
    const said = await reply.text();
    if (!reply.ok) throw new Error(`${method} ${path}: ${reply.status} ${said.slice(0, 400)}`);
    return said;
  };
  const client: Client = {
    send: async <T>(method: string, path: string, sent?: Sent) => {
      const said = await text(method, path, sent);
      return (said === '' ? null : JSON.parse(said)) as T;
    },
    get: <T>(path: string) => client.send<T>('GET', path),
    time: async (method, path, sent) => {
      const began = performance.now();
      await text(method, path, sent);
      return performance.now() - began;
    },
  };
  return client;
}
