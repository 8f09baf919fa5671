/** Speaks to the running server as one of the demo's people, as their browser would. */
export type ApiClient = {
  get: <T>(path: string) => Promise<T>;
  post: <T>(path: string, body?: object) => Promise<T>;
  put: <T>(path: string, body: object, version?: number) => Promise<T>;
  upload: <T>(
    path: string,
    options: { method: 'PUT' | 'POST'; field: string; files: readonly UploadFile[] },
  ) => Promise<T>;
};

export type UploadFile = { readonly name: string; readonly type: string; readonly bytes: Buffer };

/** Signs in. @throws with the server's own words when it refuses */
export async function signIn(
  baseUrl: string,
  account: { email: string; password: string },
): Promise<ApiClient> {
  const reply = await fetch(`${baseUrl}/api/session`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify(account),
  });
  const session = await readReply<{ csrfToken: string }>(reply, `sign in as ${account.email}`);
  const cookie = reply.headers
    .getSetCookie()
    .map((each) => each.split(';')[0])
    .join('; ');
  const headers = { Cookie: cookie, 'X-CSRF-Token': session.csrfToken };

  async function call<T>(
    method: string,
    path: string,
    options: { body?: BodyInit; headers?: Record<string, string> } = {},
  ): Promise<T> {
    const { body = null, headers: more } = options;
    return readReply<T>(
      await fetch(baseUrl + path, { method, headers: { ...headers, ...more }, body }),
      `${method} ${path}`,
    );
  }
  const json = (body: object | undefined) =>
    body === undefined ? {} : { body: JSON.stringify(body), headers: { 'Content-Type': 'application/json' } };

  return {
    get: (path) => call('GET', path),
    post: (path, body) => call('POST', path, json(body)),
    put: (path, body, version) => {
      const match: Record<string, string> = version === undefined ? {} : { 'If-Match': `"${version}"` };
      return call('PUT', path, {
        body: JSON.stringify(body),
        headers: { 'Content-Type': 'application/json', ...match },
      });
    },
    upload: (path, { method, field, files }) => {
      const form = new FormData();
      for (const { name, type, bytes } of files)
        form.append(field, new Blob([new Uint8Array(bytes)], { type }), name);
      return call(method, path, { body: form });
    },
  };
}

async function readReply<T>(reply: Response, what: string): Promise<T> {
  const text = await reply.text();
  if (!reply.ok) throw new Error(`${what} was answered with ${reply.status}: ${text.slice(0, 600)}`);
  return (text === '' ? null : JSON.parse(text)) as T;
}
