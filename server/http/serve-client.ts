import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import express, { type RequestHandler, Router } from 'express';
import { problem } from '#server/http/problem.ts';

const DIST = fileURLToPath(new URL('../../dist/', import.meta.url));

/**
 * The built client. Files under `assets/` carry a hash of their content in their name and may be kept for ever; the
 * page itself is asked for each time. Any other address is the page, which has its own router.
 */
export function serveClient(folder: string = DIST): Router {
  const router = Router();
  router.use(
    '/assets',
    express.static(join(folder, 'assets'), {
      immutable: true,
      maxAge: '365d',
      index: false,
      redirect: false,
    }),
    (() => {
      throw problem(404, 'not-found', 'This file is not part of the present version. Reload the page.');
    }) satisfies RequestHandler,
  );
  router.use(express.static(folder, { index: false, maxAge: '1h', redirect: false }));
  router.get('/{*path}', (_req, res) => {
    const page = join(folder, 'index.html');
    if (!existsSync(page)) {
      throw problem(
        503,
        'client.not-built',
        'The pages have not been built yet. Run npm run build, or npm start.',
      );
    }
    res.set('Cache-Control', 'no-cache');
    res.sendFile(page);
  });
  return router;
}
