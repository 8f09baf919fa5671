import http from 'node:http';
import type { AddressInfo } from 'node:net';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { startAzurite } from '#scripts/lib/azurite.mjs';
import { INCOMING } from '#server/storage/blob-store.ts';
import { photograph } from '#tests/factories/photograph.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { startBatch, type HandedIn } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let workmate: Agent;
let batch: HandedIn;
let server: http.Server;
/** A store of this file's own: what lies in it is counted. */
let azurite: Awaited<ReturnType<typeof startAzurite>>;
// Of this file's own: what others leave in the common folder meanwhile is not ours.
const folder = mkdtempSync(path.join(tmpdir(), 'upstand-test-'));
process.env['TMPDIR'] = folder;

beforeAll(async () => {
  azurite = await startAzurite({ dir: path.join(folder, 'upstand-data-blobs') });
  harness = await createHarness({ settings: { AZURE_STORAGE_CONNECTION_STRING: azurite.connectionString } });
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2'] });
  contractor = await harness.signIn(site.contractor);
  workmate = await harness.signIn(await harness.person('contractor', { orgId: site.contractor.orgId }));
  server = http.createServer(harness.app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
});
afterAll(async () => {
  server.closeAllConnections();
  await new Promise((resolve) => server.close(resolve));
  await harness.close();
  await azurite.stop();
  rmSync(folder, { recursive: true, force: true });
});
beforeEach(async () => {
  batch = await startBatch(contractor, site);
});

const book = (values = {}) =>
  workbookFile({
    workOrder: site.order.number,
    set: [setRow('L-1', values)],
    pours: pourRows('L-1', site.lot.number),
  });
const put = (bytes: Buffer, { agent = contractor, key = '', match = '', name = 'batch.xlsx' } = {}) => {
  const request = agent.put(`${batch.path}/workbook`);
  if (key) request.set('Idempotency-Key', key);
  if (match) request.set('If-Match', match);
  return request.attach('workbook', bytes, name);
};
const post = (files: readonly (readonly [string, Buffer])[], { agent = contractor, key = '' } = {}) => {
  const request = agent.post(`${batch.path}/photos`);
  if (key) request.set('Idempotency-Key', key);
  for (const [name, bytes] of files) request.attach('photos', bytes, name);
  return request;
};
/** All but the settings of the server under test. */
const leftovers = () => readdirSync(folder).filter((name) => !name.startsWith('upstand-data-'));
const inputs = async (): Promise<string[]> =>
  (await contractor.get(`${batch.path}/inputs`)).body.items.map((one: { kind: string }) => one.kind);
const photos = async (): Promise<string[]> =>
  (await contractor.get(`${batch.path}/photos`)).body.items.map((one: { fileName: string }) => one.fileName);

describe('an upload cut in the middle', () => {
  it.each([
    ['workbook', 'PUT', 'workbook', 'a.xlsx'],
    ['photos', 'POST', 'photos', 'a.jpg'],
  ])('of %s leaves nothing anywhere, and the next one works', async (part, method, field, name) => {
    const blobs = await blobNames();
    await cut({ method, path: `${batch.path}/${part}`, field, name, head: Buffer.from([0xff, 0xd8, 0xff]) });
    await expect.poll(staged).toEqual([]);
    expect((await contractor.get(batch.path)).body).toMatchObject({ input: 0, status: 'draft' });
    expect([await inputs(), await photos(), await blobNames(), leftovers()]).toEqual([[], [], blobs, []]);
    expect((await put(await book())).status).toBe(202);
    expect((await post([['L-1 kits.jpg', await photograph()]])).body.files).toMatchObject([{ error: null }]);
    await harness.drain();
    expect((await contractor.get(batch.path)).body).toMatchObject({ input: 2, status: 'checked' });
    expect(leftovers()).toEqual([]);
  });

  it('after whole photographs of the same request keeps none of them: the answer never came', async () => {
    const whole = await photograph();
    await cut({
      method: 'POST',
      path: `${batch.path}/photos`,
      field: 'photos',
      name: 'b.jpg',
      head: Buffer.from([0xff, 0xd8, 0xff]),
      before: [['a.jpg', whole]],
    });
    await expect.poll(staged).toEqual([]);
    expect([await inputs(), await photos()]).toEqual([[], []]);
    const again = await post([['a.jpg', whole]]);
    expect(again.body).toMatchObject({
      input: 1,
      files: [{ fileName: 'a.jpg', already: null, error: null }],
    });
  });
});

describe('Idempotency-Key on an upload', () => {
  it('gives the first answer again, though the batch went on meanwhile', async () => {
    const [a, b] = [await book(), await book({ foreman: 'Another' })];
    const first = await put(a, { key: 'workbook-1' });
    await put(b);
    const again = await put(a, { key: 'workbook-1' });
    expect([again.status, again.body, again.headers['idempotency-replayed']]).toEqual([
      202,
      first.body,
      'true',
    ]);
    expect(await inputs()).toEqual(['workbook', 'workbook']);
    const bare = await put(a);
    expect(bare.body.input).toBe(3);
  });

  it('answers though the batch takes nothing more, and lets nothing new in', async () => {
    const picture = await photograph();
    await put(await book());
    const first = await post([['L-1 kits.jpg', picture]], { key: 'kits' });
    await harness.drain();
    expect((await contractor.post(`${batch.path}/submit`)).status).toBe(200);
    const again = await post([['L-1 kits.jpg', picture]], { key: 'kits' });
    expect([again.status, again.body]).toEqual([202, first.body]);
    const other = await post([['L-1 water.jpg', await photograph()]], { key: 'kits' });
    expect([other.status, other.body.code]).toEqual([422, 'idempotency.reused']);
    expect((await post([['L-1 kits.jpg', picture]])).body.code).toBe('revision.frozen');
    expect(await photos()).toEqual(['L-1 kits.jpg']);
  });

  it('makes one thing of five sent at once', async () => {
    const picture = await photograph();
    const replies = await Promise.all(
      Array.from({ length: 5 }, () => post([['L-1 kits.jpg', picture]], { key: 'five' })),
    );
    expect(replies.map(({ status }) => status)).toEqual([202, 202, 202, 202, 202]);
    for (const reply of replies) expect(reply.body).toEqual(replies[0]?.body);
    expect([await inputs(), await photos()]).toEqual([['photo'], ['L-1 kits.jpg']]);
  });

  it('is one person’s, and of one batch', async () => {
    const bytes = await book();
    expect((await put(bytes, { key: 'mine' })).status).toBe(202);
    const theirs = await put(bytes, { key: 'mine', agent: workmate });
    expect([theirs.status, theirs.headers['idempotency-replayed']]).toEqual([202, undefined]);
    const was = batch;
    batch = await startBatch(contractor, site);
    const elsewhere = await put(bytes, { key: 'mine' });
    expect([elsewhere.status, elsewhere.body.code]).toEqual([422, 'idempotency.reused']);
    expect(await inputs()).toEqual([]);
    batch = was;
    expect(await inputs()).toEqual(['workbook']);
  });

  it('that cannot be kept is refused by name', async () => {
    const reply = await put(await book(), { key: 'x'.repeat(201) });
    expect([reply.status, reply.body.code]).toEqual([400, 'idempotency.unreadable']);
    expect(await inputs()).toEqual([]);
  });
});

describe('two people at one draft', () => {
  it('replacing it at once: each is told the number of their own, both files are kept, the newer counts', async () => {
    const [a, b] = [await book({ foreman: 'Ada' }), await book({ foreman: 'Bo' })];
    const replies = await Promise.all([
      put(a, { name: 'ada.xlsx' }),
      put(b, { name: 'bo.xlsx', agent: workmate }),
    ]);
    expect(replies.map(({ status }) => status)).toEqual([202, 202]);
    const numbers = replies.map(({ body }) => body.input as number);
    expect(numbers.toSorted((one, other) => one - other)).toEqual([1, 2]);
    await harness.drain();
    const newest = numbers[0] === 2 ? ['ada.xlsx', 'Ada'] : ['bo.xlsx', 'Bo'];
    const { body } = await contractor.get(batch.path);
    expect([body.status, body.input, body.workbook.fileName]).toEqual(['checked', 2, newest[0]]);
    const records = await contractor.get(`${batch.path}/records`);
    expect(records.body.items[0].values.foreman).toBe(newest[1]);
    // Who looked at the first alone does not hand in the second.
    const unseen = await contractor.post(`${batch.path}/submit?input=1`);
    expect([unseen.status, unseen.body.code]).toEqual([409, 'revision.newer-input']);
  });

  it('with the version they saw: the second is told what stands now, and loses nothing', async () => {
    const seen = `"${(await contractor.get(batch.path)).body.version}"`;
    expect((await put(await book(), { match: seen })).status).toBe(202);
    const late = await put(await book({ foreman: 'Bo' }), { match: seen, agent: workmate, name: 'bo.xlsx' });
    expect([late.status, late.body.code]).toEqual([412, 'version.stale']);
    expect(late.body.current).toMatchObject({ id: batch.id, input: 1, workbook: { fileName: 'batch.xlsx' } });
    expect(await inputs()).toEqual(['workbook']);
    const match = `"${late.body.current.version}"`;
    expect((await put(await book({ foreman: 'Bo' }), { match, agent: workmate })).status).toBe(202);
    const nonsense = await put(await book(), { match: 'newest' });
    expect([nonsense.status, nonsense.body.code]).toEqual([400, 'version.unreadable']);
  });
});

describe('a session that ends in the middle', () => {
  it('lets the upload that began go to its end, and says so to the next', async () => {
    const person = await harness.person('contractor', { orgId: site.contractor.orgId });
    const agent = await harness.signIn(person);
    await cut({
      method: 'PUT',
      path: `${batch.path}/workbook`,
      field: 'workbook',
      name: 'a.xlsx',
      head: Buffer.from('PK'),
      agent,
      meanwhile: () =>
        harness.services.pool.query(`delete from sessions where sess #>> '{passport,user}' = $1`, [
          person.id,
        ]),
    });
    const bytes = await book();
    const reply = await put(bytes, { agent, key: 'after-sign-in' });
    expect([reply.status, reply.body.code]).toEqual([401, 'session.none']);
    expect(reply.body.detail).toMatch(/Sign in/u);
    expect([await inputs(), await staged()]).toEqual([[], []]);
    // The same person signs in and sends the same file under the same key: it is taken, once.
    const anew = await harness.signIn(person);
    expect((await put(bytes, { agent: anew, key: 'after-sign-in' })).body.input).toBe(1);
    expect((await put(bytes, { agent: anew, key: 'after-sign-in' })).body.input).toBe(1);
    expect(await inputs()).toEqual(['workbook']);
  });
});

async function staged(): Promise<string[]> {
  const names: string[] = [];
  for await (const blob of harness.services.blobs.container.listBlobsFlat({ prefix: INCOMING }))
    names.push(blob.name);
  return names;
}

async function blobNames(): Promise<string[]> {
  const names: string[] = [];
  for await (const blob of harness.services.blobs.container.listBlobsFlat()) names.push(blob.name);
  return names.toSorted();
}

async function signedIn(agent: Agent): Promise<Record<string, string>> {
  const { body } = await agent.get('/api/session');
  const { jar } = agent as unknown as { jar: { getCookies(access: object): { toValueString(): string } } };
  const access = { path: '/', domain: '127.0.0.1', secure: false, script: false };
  return { 'X-CSRF-Token': body.csrfToken, Cookie: jar.getCookies(access).toValueString() };
}

/** Sends half a file over a socket of its own, waits until the server has begun to store it, and destroys the socket. */
async function cut(upload: {
  method: string;
  path: string;
  field: string;
  name: string;
  head: Buffer;
  before?: readonly (readonly [string, Buffer])[];
  agent?: Agent;
  meanwhile?: () => Promise<unknown>;
}): Promise<void> {
  const { method, field, name, head, before = [], agent = contractor } = upload;
  const headers = {
    ...(await signedIn(agent)),
    'Content-Type': 'multipart/form-data; boundary=cut',
    'Content-Length': 30_000_000,
  };
  const { port } = server.address() as AddressInfo;
  const request = http.request({ host: '127.0.0.1', port, method, path: upload.path, headers });
  request.on('error', () => undefined);
  const closed = new Promise((resolve) => request.on('close', resolve));
  const part = (file: string) =>
    `--cut\r\nContent-Disposition: form-data; name="${field}"; filename="${file}"\r\n\r\n`;
  for (const [file, bytes] of before) {
    request.write(part(file));
    request.write(bytes);
    request.write('\r\n');
  }
  request.write(part(name));
  request.write(head);
  // More than the store's client holds back, so that something is on its way there.
  await new Promise((resolve) => request.write(Buffer.alloc(12_000_000, 'x'), resolve));
  await upload.meanwhile?.();
  request.destroy();
  await closed;
}
