import { randomUUID } from 'node:crypto';
import { Ajv2020 } from 'ajv/dist/2020.js';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness?.close());

const ask = () => supertest(harness.app);

async function query<T>(sql: string, values: unknown[] = []): Promise<T[]> {
  return (await harness.services.pool.query(sql, values)).rows as T[];
}

describe('security headers', () => {
  it('stand on every answer', async () => {
    for (const path of ['/api/app', '/', '/healthz', '/api/nothing']) {
      const { headers } = await ask().get(path);
      const policy = String(headers['content-security-policy']);
      expect(policy).toContain("script-src 'self';");
      expect(policy).toContain("base-uri 'none'");
      expect(policy).toContain("frame-ancestors 'none'");
      expect(policy).toContain("object-src 'none'");
      expect(policy).toContain("img-src 'self' blob: data:");
      expect(policy).not.toContain('unsafe-eval');
      expect(headers['x-content-type-options']).toBe('nosniff');
      expect(headers['x-frame-options']).toBe('DENY');
      expect(headers['x-powered-by']).toBeUndefined();
      expect(headers['strict-transport-security']).toBeUndefined();
    }
  });

  it('keep API answers out of every cache', async () => {
    expect((await ask().get('/api/app')).headers['cache-control']).toBe('no-store');
    expect((await ask().get('/api/session')).headers['cache-control']).toBe('no-store');
  });
});

describe('Host', () => {
  it.each(['127.0.0.1:4600', 'localhost', '[::1]:9'])('%s is answered', async (host) => {
    expect((await ask().get('/api/app').set('Host', host)).status).toBe(200);
  });

  it.each(['evil.example', '127.0.0.1.evil.example', 'evil.example/127.0.0.1', '127.0.0.1@evil.example'])(
    '%s is refused, for pages too',
    async (host) => {
      for (const path of ['/', '/api/app']) {
        const reply = await ask().get(path).set('Host', host);
        expect([reply.status, reply.body.code]).toEqual([421, 'host.foreign']);
      }
    },
  );

  it('is not asked about for health', async () => {
    expect((await ask().get('/healthz').set('Host', '10.0.0.7')).body).toEqual({ status: 'ok' });
    expect((await ask().get('/readyz').set('Host', '10.0.0.7')).body).toEqual({ status: 'ready' });
  });
});

describe('Origin', () => {
  it.each(['http://evil.example', 'http://127.0.0.1:9999', 'null'])(
    '%s is refused and kept',
    async (origin) => {
      const agent = await harness.signIn('administrator');
      const reply = await agent
        .post('/api/organisations')
        .set('Origin', origin)
        .send({ name: `From ${origin}` });
      expect([reply.status, reply.body.code]).toEqual([403, 'origin.foreign']);
      expect(await query('select 1 from organisations where name = $1', [`From ${origin}`])).toEqual([]);
      expect(await query('select code from refusals where subject = $1', [origin])).toEqual([
        { code: 'origin.foreign' },
      ]);
    },
  );

  it('of our own is taken, and so is none', async () => {
    const agent = await harness.signIn('administrator');
    const own = await agent
      .post('/api/organisations')
      .set('Origin', 'http://127.0.0.1:4600')
      .send({ name: 'Own origin' });
    expect(own.status).toBe(201);
    expect((await agent.post('/api/organisations').send({ name: 'No origin' })).status).toBe(201);
  });
});

describe('CSRF token', () => {
  it.each([[''], ['x'.repeat(43)]])('%j is refused and kept', async (token) => {
    const person = await harness.person('administrator');
    const agent = await harness.signIn(person);
    const reply = await agent
      .post('/api/organisations')
      .set('X-CSRF-Token', token)
      .send({ name: `Token ${token}` });
    expect([reply.status, reply.body.code]).toEqual([403, 'csrf.missing']);
    expect(await query('select action, code from refusals where user_id = $1', [person.id])).toEqual([
      { action: 'POST /api/organisations', code: 'csrf.missing' },
    ]);
  });

  it('of another session is refused', async () => {
    const other = await harness.signIn('administrator');
    const { csrfToken } = (await other.get('/api/session')).body as { csrfToken: string };
    const agent = await harness.signIn('administrator');
    const reply = await agent
      .post('/api/organisations')
      .set('X-CSRF-Token', csrfToken)
      .send({ name: 'Other token' });
    expect(reply.status).toBe(403);
  });
});

describe('who may', () => {
  it('answers 401 before all else', async () => {
    const reply = await ask().post('/api/people').set('Content-Type', 'text/plain').send('{"broken');
    expect([reply.status, reply.body.code]).toEqual([401, 'session.none']);
  });

  it('answers 403 before reading the body, and keeps the refusal', async () => {
    const person = await harness.person('clerk');
    const agent = await harness.signIn(person);
    const reply = await agent.post('/api/people').set('Content-Type', 'application/json').send('{"broken');
    expect([reply.status, reply.body.code]).toEqual([403, 'forbidden']);
    expect(await query('select action, code from refusals where user_id = $1', [person.id])).toEqual([
      { action: 'POST /api/people', code: 'forbidden' },
    ]);
  });
});

describe('problems', () => {
  it('have one shape and their own media type', async () => {
    const reply = await ask().get('/api/nothing');
    expect(reply.status).toBe(404);
    expect(reply.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(reply.body).toEqual({
      type: 'tag:upstand.example,2026:not-found',
      title: 'Nothing here',
      status: 404,
      code: 'not-found',
      detail: 'There is nothing here, or it is not yours to see.',
      errors: [],
    });
  });

  it('name the methods of an address that has others', async () => {
    const reply = await ask().put('/api/session').send({});
    expect([reply.status, reply.body.code, reply.headers.allow]).toEqual([
      405,
      'method.unknown',
      'POST, GET, HEAD, DELETE',
    ]);
  });

  it.each([
    ['broken JSON', '{"name":', 'application/json', 400, 'body.unreadable'],
    ['a form', 'name=x', 'application/x-www-form-urlencoded', 415, 'body.not-json'],
    ['more than 1 MB', `{"name":"${'x'.repeat(1_100_000)}"}`, 'application/json', 413, 'body.too-large'],
    ['an unknown charset', '{"name":"x"}', 'application/json; charset=klingon', 415, 'body.encoding'],
    ['an empty name', '{"name":""}', 'application/json', 400, 'request.invalid'],
    ['a __proto__', '{"name":"x","__proto__":{"a":1}}', 'application/json', 400, 'request.invalid'],
    ['null', 'null', 'application/json', 400, 'request.invalid'],
  ])('for %s are named', async (_what, body, type, status, code) => {
    const agent = await harness.signIn('administrator');
    const reply = await agent.post('/api/organisations').set('Content-Type', type).send(body);
    expect([reply.status, reply.body.code]).toEqual([status, code]);
  });

  it('point at each fault of a body', async () => {
    const agent = await harness.signIn('administrator');
    const reply = await agent.post('/api/people').send({ email: 'no address', role: 'king', extra: 1 });
    const pointers = (reply.body.errors as { pointer: string }[]).map(({ pointer }) => pointer);
    expect(pointers.toSorted()).toEqual(['/email', '/extra', '/name', '/organisationId', '/role']);
  });

  it.each([
    ['limit=0', 'limit'],
    ['limit=201', 'limit'],
    ['limit=many', 'limit'],
    ['limit=1&limit=2', 'limit'],
    ['cursor=nonsense', 'cursor'],
    ['cursor=', 'cursor'],
    ['cursor=WzEsMl0', 'cursor'],
    ['role=king', 'role'],
    ['organisation=1', 'organisation'],
    ['active=perhaps', 'active'],
    ['colour=red', 'colour'],
    ['__proto__=1', '__proto__'],
  ])('for the parameter %s name %s', async (search, field) => {
    const agent = await harness.signIn('administrator');
    const reply = await agent.get(`/api/people?${search}`);
    expect(reply.status).toBe(400);
    expect(reply.body.errors[0].pointer).toBe(`#/query/${field}`);
  });

  it('for an impossible id are those of nothing', async () => {
    const agent = await harness.signIn('administrator');
    for (const id of ['1', "' or 1=1", randomUUID()]) {
      expect((await agent.get(`/api/people/${encodeURIComponent(id)}`)).status).toBe(404);
    }
    expect((await agent.get('/api/people/%E0%A4%A')).body.code).toBe('address.unreadable');
  });

  it('of the unexpected kind carry an id and nothing else', async () => {
    const agent = await harness.signIn('administrator');
    await withoutTable('organisations_kept_away', async () => {
      const reply = await agent.get('/api/home');
      expect(reply.status).toBe(500);
      expect(reply.body.code).toBe('unexpected');
      expect(reply.body.id).toMatch(/^[0-9a-f-]{36}$/);
      expect(reply.text).not.toMatch(/revisions|relation|select|node_modules/);
    });
  });
});

/** Takes a table away behind the server's back, which no handler foresees. */
async function withoutTable(away: string, work: () => Promise<void>): Promise<void> {
  const { default: pg } = await import('pg');
  const owner = new pg.Client({ connectionString: harness.database.ownerUrl });
  await owner.connect();
  try {
    await owner.query(`alter table revisions rename to ${away}`);
    await work();
  } finally {
    await owner.query(`alter table if exists ${away} rename to revisions`);
    await owner.end();
  }
}

describe('OpenAPI document', () => {
  it('is of version 3.1, refers to what it holds, and has schemas that compile', async () => {
    const { body: document } = await ask().get('/api/openapi.json');
    expect(document.openapi).toBe('3.1.0');
    expect(document.paths['/api/session'].post.requestBody.content['application/json'].schema).toEqual({
      $ref: '#/components/schemas/SignIn',
    });
    const references = JSON.stringify(document).match(/"\$ref":"[^"]+"/g) ?? [];
    for (const reference of new Set(references)) {
      const name = /#\/components\/schemas\/(\w+)"$/.exec(reference)?.[1] ?? reference;
      expect(document.components.schemas).toHaveProperty(name);
    }
    const ajv = new Ajv2020({ strict: false, validateFormats: false });
    ajv.addSchema(document, 'document');
    for (const name of Object.keys(document.components.schemas as object)) {
      ajv.compile({ $ref: `document#/components/schemas/${name}` });
    }
  });

  it('has one operation id each, and every parameter of its path', async () => {
    const { body: document } = await ask().get('/api/openapi.json');
    type Operation = { operationId: string; parameters: { name: string; in: string }[] };
    const paths = Object.entries(document.paths as Record<string, Record<string, Operation>>);
    const operations = paths.flatMap(([path, methods]) =>
      Object.values(methods).map((operation) => ({ path, operation })),
    );
    const ids = operations.map(({ operation }) => operation.operationId);
    expect(new Set(ids).size).toBe(ids.length);
    for (const { path, operation } of operations) {
      const inPath = operation.parameters.filter((one) => one.in === 'path').map(({ name }) => name);
      expect(inPath).toEqual([...path.matchAll(/\{(\w+)\}/g)].map((match) => match[1]));
    }
  });
});
