import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sessionLives } from '#server/auth/session-lives.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { closeEventStreams } from '#server/modules/events/send-events.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { startBatch, uploadWorkbook, type HandedIn } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { PASSWORD } from '#tests/factories/people.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';
import type { Actor } from '#shared/permissions/ability.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let batch: HandedIn;
let subject: string;
let server: Server;
let origin: string;

beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1'], number: '40' });
  contractor = await harness.signIn(site.contractor);
  batch = await startBatch(contractor, site);
  await uploadWorkbook(harness, contractor, { batch, site, workbook: { set: [setRow('L-1')] } });
  const { body } = await contractor.get(batch.path);
  subject = `check:${body.revision.id}`;
  server = createServer(harness.app);
  await new Promise<void>((resolve) => void server.listen(0, '127.0.0.1', resolve));
  origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
});
afterAll(async () => {
  server.closeAllConnections();
  await new Promise((resolve) => void server.close(resolve));
  await harness.close();
});

/** Signed in over the wire, since a stream is read while it is still open. */
async function cookieOf(actor: Actor): Promise<string> {
  const reply = await fetch(`${origin}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: actor.email, password: PASSWORD }),
  });
  return reply.headers.get('set-cookie')?.split(';')[0] ?? '';
}

async function follow(actor: Actor, what: string) {
  const abort = new AbortController();
  const reply = await fetch(`${origin}/api/events?subject=${what}`, {
    headers: { cookie: await cookieOf(actor), 'accept-encoding': 'gzip' },
    signal: abort.signal,
  });
  const reader = reply.body?.pipeThrough(new TextDecoderStream()).getReader();
  let text = '';
  /** The next event's data; null at the end of the stream. */
  async function next(): Promise<unknown> {
    for (;;) {
      const data = /^data: (.*)\n\n/m.exec(text);
      if (data) {
        text = text.slice(data.index + data[0].length);
        return JSON.parse(data[1] ?? '');
      }
      const part = await reader?.read();
      if (!part || part.done) return null;
      text += part.value;
    }
  }
  return { reply, next, stop: () => abort.abort() };
}

const report = (done: number, state: 'running' | 'done' = 'running') =>
  setProgress(harness.em(), { subject, state, done, total: 40 });

describe('progress followed by server-sent events', () => {
  it('tells where it stands at once, and every change', async () => {
    const stream = await follow(site.contractor, subject);
    expect(stream.reply.status).toBe(200);
    expect(stream.reply.headers.get('content-type')).toBe('text/event-stream; charset=utf-8');
    expect(stream.reply.headers.get('content-encoding')).toBeNull();
    expect(await stream.next()).toEqual({ state: 'done', done: 1, total: 1, problem: null });
    await report(12);
    expect(await stream.next()).toEqual({ state: 'running', done: 12, total: 40, problem: null });
    await report(40, 'done');
    expect(await stream.next()).toEqual({ state: 'done', done: 40, total: 40, problem: null });
    stream.stop();
  });

  it('follows a batch as the check of its newest revision', async () => {
    await report(40, 'done');
    const stream = await follow(site.contractor, `batch:${batch.id}`);
    expect(await stream.next()).toEqual({ state: 'done', done: 40, total: 40, problem: null });
    stream.stop();
  });

  it('ends when the process is about to stop', async () => {
    const stream = await follow(site.contractor, subject);
    expect(await stream.next()).toMatchObject({ state: 'done' });
    closeEventStreams(harness.services);
    expect(await stream.next()).toBeNull();
  });

  it('is nothing to another contractor, and to nobody', async () => {
    const other = await harness.signIn('contractor');
    expect((await other.get(`/api/events?subject=${subject}`)).status).toBe(404);
    expect((await other.get(`/api/events?subject=batch:${batch.id}`)).status).toBe(404);
    expect((await fetch(`${origin}/api/events?subject=${subject}`)).status).toBe(401);
  });

  it('keeps transmittals to the owner’s people', async () => {
    const id = '00000000-0000-4000-8000-000000000000';
    expect((await contractor.get(`/api/events?subject=transmittal:${id}`)).status).toBe(403);
    const clerk = await harness.signIn('clerk');
    expect((await clerk.get(`/api/events?subject=transmittal:${id}`)).status).toBe(404);
  });

  it.each(['', 'check:', 'check:1', 'constructor:00000000-0000-4000-8000-000000000000'])(
    'refuses the subject "%s"',
    async (text) => {
      expect((await contractor.get(`/api/events?subject=${text}`)).status).toBe(400);
    },
  );
});

describe('a session and what it opened', () => {
  const lives = (sessionId: string, actor: Actor) =>
    sessionLives(harness.services.pool, { sessionId, actor, absoluteHours: 12 });

  it('lives until it is signed out of', async () => {
    const actor = await harness.person('inspector');
    const cookie = await cookieOf(actor);
    const sid =
      decodeURIComponent(cookie.split('=')[1] ?? '')
        .slice(2)
        .split('.')[0] ?? '';
    expect(await lives(sid, actor)).toBe(true);
    expect(await lives(sid, { ...actor, role: 'engineer' })).toBe(false);
    await harness.services.pool.query('delete from sessions where sid = $1', [sid]);
    expect(await lives(sid, actor)).toBe(false);
  });
});

describe('a batch checked again', () => {
  it('makes a new input of the same files', async () => {
    const before = await contractor.get(batch.path);
    const again = await contractor.post(`${batch.path}/recheck`);
    expect(again.status).toBe(202);
    expect(again.body).toMatchObject({ status: 'checking', input: before.body.input + 1 });
    await harness.drain();
    const after = await contractor.get(batch.path);
    expect(after.body).toMatchObject({ status: 'checked', counts: { lines: 1 } });
  });

  it('is refused while there is nothing to check', async () => {
    const empty = await startBatch(contractor, site);
    const reply = await contractor.post(`${empty.path}/recheck`);
    expect([reply.status, reply.body.code]).toEqual([409, 'revision.empty']);
  });
});
