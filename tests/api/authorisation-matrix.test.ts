import type { IncomingMessage } from 'node:http';
import { buffer } from 'node:stream/consumers';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROUTES } from '#server/http/routes.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';
import { CALLERS, EXPECTED } from './authorisation/expected.ts';
import { REQUESTS, type RequestSpec } from './authorisation/requests.ts';
import { buildWorld, type World } from './authorisation/world.ts';

type Column = (typeof CALLERS)[number];
type Side = 'first' | 'second';

let harness: Harness;
let world: World;
beforeAll(async () => {
  harness = await createHarness();
  world = await buildWorld(harness);
}, 180_000);
afterAll(() => harness?.close());

const OTHER = { first: 'second', second: 'first' } as const;
// A row is `METHOD /path (variant)`.
const routeOf = (row: string): string => row.replace(/ \(.*\)$/, '');
const cellsOf = (outcomes = ''): string[] => outcomes.trim().split(/\s+/);

/** Asks as one column would, for an object of `side`. */
async function ask(row: string, column: Column, side: Side): Promise<{ cell: string; code: string | null }> {
  const who = column === 'own' ? side : column === 'foreign' ? OTHER[side] : column;
  const person = who === 'nobody' ? null : world.people[who];
  const spec = REQUESTS[row]?.({
    own: world.of[side],
    shared: world.shared,
    email: (person ?? world.people.auditor).email,
  });
  if (!spec) throw new Error(`Nothing says how to ask ${row}.`);
  const agent = who === 'nobody' ? supertest.agent(harness.app) : await agentFor(who, spec);
  const reply = await send(agent, row.split(' ')[0] ?? '', spec);
  const inside = reply.status >= 200 && reply.status < 300;
  return { cell: inside ? 'ok' : String(reply.status), code: inside ? null : String(reply.body.code) };
}

async function agentFor(who: Exclude<keyof World['agents'], never>, spec: RequestSpec): Promise<Agent> {
  return spec.fresh ? harness.signIn(world.people[who]) : world.agents[who];
}

function send(agent: Agent, method: string, spec: RequestSpec): supertest.Test {
  const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  const request = agent[verb](spec.path);
  if (spec.ifMatch !== undefined) request.set('If-Match', `"${spec.ifMatch}"`);
  if (spec.stream) request.buffer(true).parse(firstWord);
  if (spec.form) return request.field('note', 'a form without a file');
  return spec.body ? request.send(spec.body) : request;
}

/** Reads no more than that it was let in: the stream would go on as long as the session. */
function firstWord(res: supertest.Response, done: (error: Error | null, body: unknown) => void): void {
  if (res.statusCode === 200) {
    done(null, null);
    (res as unknown as IncomingMessage).destroy();
    return;
  }
  buffer(res as unknown as IncomingMessage).then(
    (bytes) => done(null, JSON.parse(bytes.toString('utf8'))),
    (error: Error) => done(error, null),
  );
}

/** What a refusal at the wall says; any other refusal comes from behind it. */
const WALL: Readonly<Record<string, string>> = { 401: 'session.none', 403: 'forbidden', 404: 'not-found' };

describe('the table', () => {
  it('has a row for every route, and no row without a route', () => {
    const routes = ROUTES.map((route) => `${route.method.toUpperCase()} ${route.path}`);
    expect([...new Set(EXPECTED.map(([, row]) => routeOf(row)))].sort()).toEqual(routes.sort());
    expect(EXPECTED.map(([, row]) => row).sort()).toEqual(Object.keys(REQUESTS).sort());
  });

  it('has a cell for everybody', () => {
    const wrong = EXPECTED.filter(([outcomes]) => cellsOf(outcomes).length !== CALLERS.length);
    expect(wrong).toEqual([]);
  });
});

describe('what stands behind the wall', () => {
  it.each(['first', 'second'] as const)('is there for the %s contractor, whose it is', async (side) => {
    const own = world.of[side];
    const agent = world.agents[side];
    for (const batch of [own.draft, own.queued, own.open, own.done]) {
      expect((await agent.get(`/api/batches/${batch.id}`)).body).toMatchObject({ number: batch.number });
      const sheet = await agent.get(`/api/records/${batch.recordId}`);
      expect(sheet.body.record).toMatchObject({ id: batch.recordId, lineId: batch.lineId });
      const findings = await agent.get(`/api/batches/${batch.id}/findings`);
      expect(findings.body.items.map((one: { id: string }) => one.id)).toContain(batch.findingId);
      const photo = await agent.get(`/api/photos/${batch.photoId}/file?size=original`);
      expect([photo.status, photo.headers['content-type']]).toEqual([200, 'image/jpeg']);
    }
    expect((await agent.get(`/api/work-orders/${own.orderId}`)).body.number).toBe(own.orderNumber);
    expect((await agent.get(`/api/concessions/${own.concessionGranted}`)).body.state).toBe('granted');
    expect((await agent.get(`/api/concessions/${own.concessionAsked}`)).status).toBe(200);
    expect((await agent.get(`/api/register/${own.recordNumber}`)).body.items).toHaveLength(1);
  });
});

describe('who may', () => {
  it.each(EXPECTED.map(([outcomes, row, behind = '']) => ({ row, outcomes, behind })))(
    '$row',
    async ({ row, outcomes, behind }) => {
      const found: string[] = [];
      const codes = new Set<string>();
      for (const column of CALLERS) {
        const { cell, code } = await ask(row, column, 'first');
        found.push(cell);
        if (code !== null && code !== WALL[cell]) codes.add(code);
      }
      const expected = cellsOf(outcomes);
      expect(found).toEqual(expected);
      // A refusal at the wall with another code than the wall's own would stand among these.
      expect([...codes].join(' ')).toBe(behind);
      // The wall has two sides: the same from the other contractor's.
      const [own, foreign] = [await ask(row, 'own', 'second'), await ask(row, 'foreign', 'second')];
      expect([own.cell, foreign.cell]).toEqual(expected.slice(1, 3));
    },
  );
});
