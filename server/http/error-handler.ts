import { randomUUID } from 'node:crypto';
import type { ErrorRequestHandler } from 'express';
import type { Logger } from 'pino';
import { Problem, problem } from '#server/http/problem.ts';

/** Turns what was thrown into a problem reply. What is not known is answered with an id and nothing of its own. */
export function errorHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, req, res, _next) => {
    const known = problemOf(error);
    if (res.headersSent) {
      // A stream that broke off: the only honest sign left is a connection that ends too early. Where the reader went
      // away (a picture scrolled past) it is no fault of ours.
      const left = (error as Coded | null)?.code === 'ERR_STREAM_PREMATURE_CLOSE' && req.destroyed;
      if (!left) log.error({ err: error, url: req.path }, 'an answer broke off');
      res.destroy();
      return;
    }
    const found = known ?? unexpected(log, error);
    res
      .status(found.status)
      .set(found.headers)
      .set('Cache-Control', 'no-store')
      .type('application/problem+json')
      .send(JSON.stringify(found.toBody()));
  };
}

function unexpected(log: Logger, error: unknown): Problem {
  const id = randomUUID();
  log.error({ err: error, id }, 'unexpected fault');
  return problem(
    500,
    'unexpected',
    `Something went wrong on the server and nothing was changed by this request. Try again; if it goes on, tell the administrator the number ${id}.`,
    { extra: { id } },
  );
}

/** Null for what is not known. */
export function problemOf(error: unknown): Problem | null {
  if (error instanceof Problem) return error;
  return fromBodyReader(error) ?? fromDatabase(error);
}

type Coded = { type?: unknown; status?: unknown; code?: unknown; message?: unknown; cause?: unknown };

/** Faults of Express and its body reader carry `type` and a status below 500. */
function fromBodyReader(error: unknown): Problem | null {
  const { type, status } = (error ?? {}) as Coded;
  if (error instanceof URIError) {
    return problem(400, 'address.unreadable', 'The address cannot be read.');
  }
  if (typeof type !== 'string' || typeof status !== 'number' || status >= 500) return null;
  switch (type) {
    case 'entity.parse.failed':
      return problem(400, 'body.unreadable', 'The body is not JSON that can be read.');
    case 'entity.too.large':
      return problem(413, 'body.too-large', 'The body is larger than this accepts (1 MB).');
    case 'encoding.unsupported':
    case 'charset.unsupported':
      return problem(415, 'body.encoding', 'The body is in an encoding that is not read here. Send UTF-8.');
    default:
      return problem(400, 'body.broken', 'The body broke off or is not as long as it said. Send it again.');
  }
}

const UNREACHABLE = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'EPIPE',
  'ENOTFOUND',
  'ETIMEDOUT',
  '57P01',
  '57P02',
  '57P03',
  '08000',
  '08003',
  '08006',
  '53300',
]);

/** A database or a blob store that is away: the request may be sent again as it is. */
function fromDatabase(error: unknown, depth = 0): Problem | null {
  if (!(error instanceof Error) || depth > 4) return null;
  const { code, cause } = error as Coded;
  const lost =
    /connection terminated|timeout exceeded when trying to connect|client has encountered a connection error/i;
  if ((typeof code === 'string' && UNREACHABLE.has(code)) || lost.test(error.message)) {
    return problem(
      503,
      'storage.unreachable',
      'The store behind this site cannot be reached just now. Nothing is lost; try again in a moment.',
      { headers: { 'Retry-After': '5' } },
    );
  }
  return fromDatabase(cause, depth + 1);
}
