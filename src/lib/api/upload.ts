import { problemFrom, unreachable } from '#src/lib/api/api-problem.ts';
import { csrfToken } from '#src/lib/api/csrf-token.ts';
import { newIdempotencyKey } from '#src/lib/api/client.ts';
import { waitForSignIn } from '#src/lib/session/session-expiry.ts';

export type UploadRequest = {
  readonly path: string;
  readonly method: 'POST' | 'PUT';
  /** Name of the multipart field: `workbook`, `photos`. */
  readonly field: string;
  readonly files: readonly File[];
  /** The same for each attempt at the same files: an answer that was lost on the way is given again. */
  readonly idempotencyKey?: string;
  /** Bytes sent of bytes. */
  readonly onProgress?: (sent: number, total: number) => void;
  readonly signal?: AbortSignal;
};

/** Sends files with progress (fetch cannot tell how much has left). Throws ApiProblem, or AbortError when cancelled. */
export async function upload<T>(request: UploadRequest): Promise<T> {
  const key = request.idempotencyKey ?? newIdempotencyKey();
  const first = await send(request, key);
  if (first.status !== 401 || !(await waitForSignIn())) return read(first) as T;
  return read(await send(request, key)) as T;
}

type Answer = { readonly status: number; readonly text: string };

function send(request: UploadRequest, idempotencyKey: string): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const xhr = new XMLHttpRequest();
    xhr.open(request.method, request.path);
    xhr.setRequestHeader('accept', 'application/json');
    xhr.setRequestHeader('idempotency-key', idempotencyKey);
    const token = csrfToken();
    if (token) xhr.setRequestHeader('x-csrf-token', token);
    xhr.upload.addEventListener('progress', (event) => request.onProgress?.(event.loaded, event.total));
    xhr.addEventListener('load', () => resolve({ status: xhr.status, text: xhr.responseText }));
    xhr.addEventListener('error', () => reject(unreachable()));
    xhr.addEventListener('abort', () => reject(new DOMException('Cancelled', 'AbortError')));
    request.signal?.addEventListener('abort', () => xhr.abort(), { once: true });
    const form = new FormData();
    for (const file of request.files) form.append(request.field, file, file.name);
    xhr.send(form);
  });
}

function read(answer: Answer): unknown {
  if (answer.status < 200 || answer.status > 299) throw problemFrom(answer.status, answer.text);
  return JSON.parse(answer.text);
}
