import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import express from 'express';
import { pino } from 'pino';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { errorHandler } from '#server/http/error-handler.ts';
import { serveClient } from '#server/http/serve-client.ts';

let folder = '';
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'upstand-client-'));
  mkdirSync(join(folder, 'assets'));
  writeFileSync(join(folder, 'index.html'), '<title>page</title>');
  writeFileSync(join(folder, 'assets', 'main-abc123.js'), 'let x;');
});
afterAll(() => rmSync(folder, { recursive: true }));

const app = () =>
  supertest(
    express()
      .use(serveClient(folder))
      .use(errorHandler(pino({ level: 'silent' }))),
  );

describe('serveClient', () => {
  it('lets hashed files be kept for ever', async () => {
    const reply = await app().get('/assets/main-abc123.js');
    expect(reply.headers['cache-control']).toBe('public, max-age=31536000, immutable');
  });

  it('answers the page for its own addresses, to be asked for each time', async () => {
    for (const path of ['/', '/batches/1', '/index']) {
      const reply = await app().get(path);
      expect([reply.text, reply.headers['cache-control']]).toEqual(['<title>page</title>', 'no-cache']);
    }
  });

  it('never answers the page for a missing file of an older version', async () => {
    expect((await app().get('/assets/main-old.js')).status).toBe(404);
  });

  it('says what to do when nothing was built', async () => {
    const empty = express()
      .use(serveClient(join(folder, 'none')))
      .use(errorHandler(pino({ level: 'silent' })));
    const reply = await supertest(empty).get('/');
    expect([reply.status, reply.body.code]).toEqual([503, 'client.not-built']);
  });
});
