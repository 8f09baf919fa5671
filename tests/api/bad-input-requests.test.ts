import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { JsonSchema, Route } from '#server/http/define-route.ts';
import { ROUTES } from '#server/http/routes.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';
import { REQUESTS } from './authorisation/requests.ts';
import { buildWorld, type Caller, type World } from './authorisation/world.ts';

let harness: Harness;
let world: World;
beforeAll(async () => {
  harness = await createHarness();
  world = await buildWorld(harness);
}, 120_000);
afterAll(() => harness?.close());

const CALLERS: readonly Caller[] = ['first', 'auditor', 'clerk', 'engineer', 'administrator'];
const queried = ROUTES.filter((route) => route.method === 'get' && Object.keys(route.query ?? {}).length > 0);
const paged = queried.filter((route) => route.query?.['cursor']);
const nameOf = (route: Route): string => `GET ${route.path}`;

function pathOf(route: Route): string {
  if (!route.path.includes(':')) return route.path;
  const spec = REQUESTS[nameOf(route)]?.({ own: world.of.first, shared: world.shared, email: '' });
  if (!spec) throw new Error(`The table of requests has no row for ${nameOf(route)}.`);
  return spec.path.split('?', 1)[0] ?? '';
}

/** Somebody whose role may ask for it: of a refused request no parameter is looked at. */
async function ask(route: Route, query: string): Promise<{ status: number; body: Refused; text: string }> {
  for (const caller of CALLERS) {
    const reply = await (world.agents[caller] as Agent).get(`${pathOf(route)}?${query}`);
    if (reply.status !== 403) return { status: reply.status, body: reply.body, text: reply.text };
  }
  throw new Error(`Nobody may ask for ${nameOf(route)}.`);
}
type Refused = { code?: string; detail?: string; errors?: { pointer: string; detail: string }[] };

/** Texts that are no value of this parameter, each for a reason of its own. */
function nonsenseFor(schema: JsonSchema): string[] {
  const kinds = JSON.stringify(schema);
  const numbers = kinds.includes('"integer"') ? ['many', '-1', '1e99', '12345678901234567890'] : [];
  const days = kinds.includes('"date"') ? ['yesterday', '2026-02-30', '0000-00-00'] : [];
  const ids = kinds.includes('"uuid"') ? ['not-an-id', "' or 1=1 --", '%00'] : [];
  const flags = kinds.includes('"boolean"') ? ['perhaps'] : [];
  const words = kinds.includes('"enum"') ? ['no-such-word', '%00'] : [];
  const texts = kinds.includes('"string"') ? ['%00', '%F0%9F%92%A9'.repeat(400)] : [];
  return [...new Set([...numbers, ...days, ...ids, ...flags, ...words, ...texts])];
}

/** What a reader of lists might hand back that no list gave out: cut, turned, emptied, of another list, of other types. */
const CURSORS: readonly string[] = [
  'nonsense',
  '%00',
  '....',
  ...['', '[]', '{}', 'null', '"x"', '[[1]]', '["\\u0000"]', '[1,2,3,4,5,6,7]', '[{"$ne":1}]', '["x"]'].map(
    (text) => Buffer.from(text).toString('base64url') || '%20',
  ),
];

describe.each(queried.map((route) => [nameOf(route), route] as const))('%s', (_name, route) => {
  it('refuses each parameter that is nonsense, naming it', async () => {
    const faults: string[] = [];
    for (const [name, schema] of Object.entries(route.query ?? {})) {
      if (name === 'cursor') continue;
      for (const value of nonsenseFor(schema)) {
        const reply = await ask(route, `${name}=${value}`);
        const pointer = `#/query/${name}`;
        const named = reply.body.errors?.some(
          (one) => (one.pointer === pointer || one.pointer.startsWith(`${pointer}/`)) && one.detail !== '',
        );
        if (reply.status !== 400 || !named || !reply.body.detail?.includes(name))
          faults.push(`${name}=${value.slice(0, 30)}: ${reply.status} ${reply.text.slice(0, 200)}`);
      }
    }
    expect(faults).toEqual([]);
  });

  it('refuses a parameter that it does not know, naming it', async () => {
    const { status, body } = await ask(route, 'colour=blue');
    expect([status, body.errors?.map((one) => one.pointer)]).toEqual([400, ['#/query/colour']]);
    expect(body.detail).toContain('colour');
  });
});

describe.each(paged.map((route) => [nameOf(route), route] as const))('the cursor of %s', (_name, route) => {
  it('is one that the list gave out, or refused by name', async () => {
    const faults: string[] = [];
    for (const cursor of CURSORS) {
      const reply = await ask(route, `cursor=${cursor}`);
      if (reply.status !== 400 || reply.body.errors?.[0]?.pointer !== '#/query/cursor')
        faults.push(`${cursor}: ${reply.status} ${reply.text.slice(0, 200)}`);
    }
    expect(faults).toEqual([]);
  });

  it('that was given out and then changed is refused or reads a page, and never breaks', async () => {
    const first = await ask(route, 'limit=1');
    expect(first.status).toBe(200);
    const given = (first.body as { nextCursor?: string | null }).nextCursor;
    if (!given) return;
    expect((await ask(route, `limit=1&cursor=${given}`)).status).toBe(200);
    const parts = JSON.parse(Buffer.from(given, 'base64url').toString('utf8')) as unknown[];
    const remade = (changed: unknown) => Buffer.from(JSON.stringify(changed)).toString('base64url');
    const refused = [
      given.slice(0, -3),
      remade(parts.slice(1)),
      remade([...parts, 'more']),
      remade(parts.map(() => ({}))),
      remade(parts.map(() => true)),
      remade(parts.map((part) => (typeof part === 'number' ? 'x' : 7))),
    ];
    const answers: [string, number][] = [];
    for (const cursor of refused) answers.push([cursor, (await ask(route, `cursor=${cursor}`)).status]);
    expect(answers.filter(([, status]) => status !== 400)).toEqual([]);
    for (const far of [1e300, 0.5, -1, Number.MAX_SAFE_INTEGER, 2 ** 31]) {
      const cursor = remade(parts.map((part) => (typeof part === 'number' ? far : part)));
      expect([far, [200, 400].includes((await ask(route, `cursor=${cursor}`)).status)]).toEqual([far, true]);
    }
  });
});

it('walks every list that there is', () => {
  // Counted by hand in the modules' routes: each list that gives out a cursor.
  expect(paged.map(nameOf).toSorted()).toEqual([
    'GET /api/batches',
    'GET /api/batches/:id/findings',
    'GET /api/batches/:id/records',
    'GET /api/concessions',
    'GET /api/lots',
    'GET /api/mail',
    'GET /api/nonconformities',
    'GET /api/organisations',
    'GET /api/people',
    'GET /api/register',
    'GET /api/register/candidates',
    'GET /api/trail',
    'GET /api/transmittals',
    'GET /api/work-orders',
  ]);
});

describe('a text with what cannot be kept', () => {
  it.each([
    ['a null character', 'Line\\u0000work'],
    ['half of a character', 'Line\\ud800work'],
  ])('is refused by name, not by the database: %s', async (_what, name) => {
    const reply = await world.agents.administrator
      .post('/api/organisations')
      .set('Content-Type', 'application/json')
      .send(`{"name":"${name}"}`);
    expect([reply.status, reply.body.errors]).toEqual([
      400,
      [{ pointer: '/name', code: 'text', detail: expect.stringContaining('cannot be kept') }],
    ]);
  });
});
