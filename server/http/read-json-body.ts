import express, { type Request, type Response } from 'express';
import { problem } from '#server/http/problem.ts';

const LIMIT_BYTES = 1024 * 1024;
const sizes = new WeakMap<object, number>();

const parse = express.json({
  limit: LIMIT_BYTES,
  strict: false,
  type: 'application/json',
  verify: (req, _res, bytes) => void sizes.set(req, bytes.length),
});

/**
 * Reads a JSON body. It runs after the permission check, so that a stranger's body is never parsed.
 * @throws Problem 415 for another media type, 400 for what is not JSON, 413 above the limit
 */
export async function readJsonBody(req: Request, res: Response): Promise<{ body: unknown; bytes: number }> {
  if (!req.is('application/json')) {
    throw problem(415, 'body.not-json', 'Send the body as JSON, with Content-Type: application/json.');
  }
  await new Promise<void>((resolve, reject) => {
    parse(req, res, (error?: unknown) => (error ? reject(error as Error) : resolve()));
  });
  return { body: req.body as unknown, bytes: sizes.get(req) ?? 0 };
}
