import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { api, withQuery } from '#src/lib/api/client.ts';
import { setCsrfToken } from '#src/lib/api/csrf-token.ts';
import { endWaiting, isWaiting } from '#src/lib/session/session-expiry.ts';

function reply(status: number, body?: unknown): Response {
  const text = body === undefined ? null : JSON.stringify(body);
  return new Response(text, { status, headers: { 'content-type': 'application/json' } });
}

const NOT_SIGNED_IN = {
  title: 'Not signed in',
  status: 401,
  code: 'not-signed-in',
  detail: 'Sign in first.',
};

let answers: (Response | Error)[] = [];
const fetchStub = vi.fn<(url: string, init: RequestInit) => Promise<Response>>(async () => {
  const next = answers.shift();
  if (next === undefined || next instanceof Error) throw next ?? new TypeError('no answer prepared');
  return next;
});

function headersOf(call: number): Headers {
  return new Headers(fetchStub.mock.calls[call]?.[1].headers);
}

beforeEach(() => {
  fetchStub.mockClear();
  vi.stubGlobal('fetch', fetchStub);
  setCsrfToken('token-1');
});
afterEach(() => {
  vi.unstubAllGlobals();
  endWaiting(false);
});

describe('api', () => {
  it('sends the version seen, the key of the intent and the token with a write', async () => {
    answers = [reply(200, { version: 4 })];
    await api('/api/findings/1/decision', {
      method: 'PUT',
      body: { decision: 'approve' },
      ifMatch: 3,
      idempotencyKey: 'k1',
    });
    expect(headersOf(0).get('if-match')).toBe('"3"');
    expect(headersOf(0).get('idempotency-key')).toBe('k1');
    expect(headersOf(0).get('x-csrf-token')).toBe('token-1');
    expect(fetchStub.mock.calls[0]?.[1].body).toBe('{"decision":"approve"}');
  });

  it('sends no token with a read', async () => {
    answers = [reply(200, { items: [] })];
    await api('/api/batches');
    expect(headersOf(0).has('x-csrf-token')).toBe(false);
  });

  it('throws the problem with its code, sentence and pointers', async () => {
    const errors = [{ pointer: '/reason', code: 'required', detail: 'Give a reason.' }];
    answers = [
      reply(422, { title: 'Not accepted', status: 422, code: 'invalid', detail: 'A reason is due.', errors }),
    ];
    const error = await api('/api/x', { method: 'POST', body: {} }).catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(ApiProblem);
    expect(error).toMatchObject({ status: 422, code: 'invalid', message: 'A reason is due.', errors });
  });

  it('says in plain words that no answer came', async () => {
    answers = [new TypeError('Failed to fetch')];
    await expect(api('/api/x')).rejects.toMatchObject({ status: 0, code: 'unreachable' });
  });

  it('waits for the sign-in when the session has ended, then sends the same again with the new token', async () => {
    answers = [reply(401, NOT_SIGNED_IN), reply(201, { id: 'b1' })];
    const pending = api<{ id: string }>('/api/work-orders/1/batches', {
      method: 'POST',
      body: {},
      idempotencyKey: 'k2',
    });
    await vi.waitFor(() => expect(isWaiting()).toBe(true));
    setCsrfToken('token-2');
    endWaiting(true);
    await expect(pending).resolves.toEqual({ id: 'b1' });
    expect(headersOf(1).get('x-csrf-token')).toBe('token-2');
    expect(headersOf(1).get('idempotency-key')).toBe('k2');
  });

  it('gives the refusal to the caller when the person leaves instead', async () => {
    answers = [reply(401, NOT_SIGNED_IN)];
    const pending = api('/api/batches');
    await vi.waitFor(() => expect(isWaiting()).toBe(true));
    endWaiting(false);
    await expect(pending).rejects.toMatchObject({ status: 401 });
  });

  it('fetches the token anew when another tab signed in, and sends once more', async () => {
    answers = [
      reply(403, { title: 'Refused', status: 403, code: 'csrf-token', detail: 'The page is out of date.' }),
      reply(200, { csrfToken: 'token-3' }),
      reply(204),
    ];
    await api('/api/batches/1/take', { method: 'POST' });
    expect(fetchStub.mock.calls[1]?.[0]).toBe('/api/session');
    expect(headersOf(2).get('x-csrf-token')).toBe('token-3');
  });

  it('leaves blank filters out of the address and repeats lists', () => {
    expect(withQuery('/api/x', { a: '', b: null, c: undefined, d: 0, e: ['1', '2'] })).toBe(
      '/api/x?d=0&e=1&e=2',
    );
  });
});
