import { ApiProblem, problemFrom, unreachable } from '#src/lib/api/api-problem.ts';
import { csrfToken, setCsrfToken } from '#src/lib/api/csrf-token.ts';
import { waitForSignIn } from '#src/lib/session/session-expiry.ts';

type QueryValue = string | number | boolean | null | undefined;

export type ApiOptions = {
  readonly method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  readonly body?: unknown;
  /** Blank and absent values are left out; lists repeat the name. */
  readonly query?: Readonly<Record<string, QueryValue | readonly QueryValue[]>>;
  /** The version that the person saw; the server refuses the write when it has moved on. */
  readonly ifMatch?: number;
  /** Makes a repeated creating post answer like the first. `newIdempotencyKey()` once per intent, not per attempt. */
  readonly idempotencyKey?: string;
  readonly signal?: AbortSignal;
  /** The session's own requests answer 401 to the caller instead of opening the sign-in dialog. */
  readonly withoutSession?: boolean;
};

export function newIdempotencyKey(): string {
  return crypto.randomUUID();
}

export function withQuery(path: string, query: ApiOptions['query']): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query ?? {})) {
    for (const one of Array.isArray(value) ? value : [value]) {
      if (one !== null && one !== undefined && one !== '') search.append(name, String(one));
    }
  }
  const text = search.toString();
  return text ? `${path}?${text}` : path;
}

/** Calls the API and gives the reply's body. Throws ApiProblem; an aborted call throws the signal's AbortError. */
export async function api<T>(path: string, options: ApiOptions = {}): Promise<T> {
  const reply = await send(path, options);
  if (reply.ok) return read<T>(reply);
  const problem = problemFrom(reply.status, await reply.text());
  if (options.withoutSession) throw problem;

  if (problem.status === 401 && (await waitForSignIn())) return retry<T>(path, options);
  // Another tab signed in anew: this page's token belongs to the session before.
  if (problem.status === 403 && problem.code.includes('csrf') && (await renewToken())) {
    return retry<T>(path, options);
  }
  throw problem;
}

async function retry<T>(path: string, options: ApiOptions): Promise<T> {
  const reply = await send(path, options);
  if (reply.ok) return read<T>(reply);
  throw problemFrom(reply.status, await reply.text());
}

async function send(path: string, options: ApiOptions): Promise<Response> {
  const method = options.method ?? 'GET';
  const headers = new Headers({ accept: 'application/json' });
  if (options.body !== undefined) headers.set('content-type', 'application/json');
  if (options.ifMatch !== undefined) headers.set('if-match', `"${options.ifMatch}"`);
  if (options.idempotencyKey) headers.set('idempotency-key', options.idempotencyKey);
  const token = csrfToken();
  if (method !== 'GET' && token) headers.set('x-csrf-token', token);
  try {
    return await fetch(withQuery(path, options.query), {
      method,
      headers,
      credentials: 'same-origin',
      body: options.body === undefined ? undefined : JSON.stringify(options.body),
      signal: options.signal,
    });
  } catch (error) {
    if (options.signal?.aborted) throw error;
    throw unreachable();
  }
}

async function read<T>(reply: Response): Promise<T> {
  const text = await reply.text();
  if (text === '') return undefined as T;
  try {
    return JSON.parse(text) as T;
  } catch {
    throw problemFrom(reply.status, '');
  }
}

async function renewToken(): Promise<boolean> {
  const reply = await fetch('/api/session', { credentials: 'same-origin' });
  if (!reply.ok) return false;
  const session = (await reply.json()) as { csrfToken?: string };
  setCsrfToken(session.csrfToken ?? null);
  return true;
}

export function isProblemCode(error: unknown, ...codes: string[]): error is ApiProblem {
  return error instanceof ApiProblem && codes.includes(error.code);
}
