import http from 'node:http';
import type { AddressInfo } from 'node:net';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { rows } from '#server/db/rows.ts';
import { photograph } from '#tests/factories/photograph.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { startBatch, uploadWorkbook, type HandedIn } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let foreign: Agent;
let inspector: Agent;
let batch: HandedIn;
// Of this file's own: what others leave in the common folder meanwhile is not ours.
const folder = mkdtempSync(path.join(tmpdir(), 'upstand-test-'));
process.env['TMPDIR'] = folder;

beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2'] });
  contractor = await harness.signIn(site.contractor);
  foreign = await harness.signIn('contractor');
  inspector = await harness.signIn('inspector');
});
afterAll(async () => {
  await harness.close();
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
const put = (bytes: Buffer, name = 'batch.xlsx', agent = contractor) =>
  agent.put(`${batch.path}/workbook`).attach('workbook', bytes, name);
const leftovers = () => readdirSync(folder).filter((name) => /^upstand-(check|photos)-/u.test(name));

describe('a workbook', () => {
  it('of the same bytes makes no new input; A, then B, then A again are three', async () => {
    const [a, b] = [await book(), await book({ foreman: 'Another' })];
    const inputs: number[] = [];
    for (const bytes of [a, a, b, a, a]) inputs.push((await put(bytes)).body.input);
    expect(inputs).toEqual([1, 1, 2, 3, 3]);
    const { body } = await contractor.get(`${batch.path}/inputs`);
    expect(body.items.map((one: { n: number; kind: string }) => [one.n, one.kind])).toEqual([
      [3, 'workbook'],
      [2, 'workbook'],
      [1, 'workbook'],
    ]);
  });

  it('is superseded by a newer one: only the newest is what counts', async () => {
    await put(await book());
    await put(await book({ embedmentFt: 5 }));
    await harness.drain();
    const { body } = await contractor.get(`${batch.path}/findings?code=embedment-short`);
    expect(body.items).toMatchObject([{ measured: 5, limit: 6, margin: -1 }]);
    expect((await contractor.get(`${batch.path}/check`)).body).toMatchObject({ input: 2, state: 'done' });
  });

  it.each([
    [
      'workbook.not-a-workbook',
      Buffer.from('this is a text, whatever its name says'),
      /not an Excel workbook/u,
    ],
    ['workbook.zip-damaged', Buffer.from('PK\u0003\u0004 and then nothing'), /damaged/u],
  ])('that cannot be read fails its check with what to do: %s', async (code, bytes, sentence) => {
    expect((await put(bytes)).status).toBe(202);
    await harness.drain();
    const { body } = await contractor.get(`${batch.path}/check`);
    expect(body).toMatchObject({
      input: 1,
      state: 'failed',
      problem: { code, detail: expect.stringMatching(sentence) },
    });
    expect((await contractor.get(batch.path)).body).toMatchObject({ status: 'draft', can: ['upload'] });
    expect((await contractor.post(`${batch.path}/submit`)).body).toMatchObject({
      status: 409,
      code: 'revision.empty',
    });
    await put(await book());
    await harness.drain();
    expect((await contractor.get(batch.path)).body.status).toBe('checked');
    expect(leftovers()).toEqual([]);
  });

  it('that is empty, missing or in another field is refused with the place', async () => {
    expect((await put(Buffer.alloc(0))).body).toMatchObject({ status: 422, code: 'upload.empty' });
    const other = await contractor.put(`${batch.path}/workbook`).attach('file', await book(), 'batch.xlsx');
    expect(other.body).toMatchObject({ status: 400, code: 'upload.field' });
    const json = await contractor.put(`${batch.path}/workbook`).send({ workbook: 'no' });
    expect(json.body).toMatchObject({ status: 415, code: 'upload.not-multipart' });
    const field = await contractor.put(`${batch.path}/workbook`).field('workbook', 'no file');
    expect(field.status).toBe(400);
    expect((await contractor.get(batch.path)).body.input).toBe(0);
  });

  it('over 50 MB is refused and not stored', async () => {
    const reply = await put(Buffer.alloc(50_000_001, 'x'));
    expect(reply.body).toMatchObject({ status: 413, code: 'upload.too-large' });
    expect((await contractor.get(batch.path)).body.input).toBe(0);
  });

  it.each([
    ['../../etc/batch.xlsx', 'batch.xlsx'],
    ['名前 17.xlsx', '名前 17.xlsx'],
  ])('named %s is kept as %s', async (name, kept) => {
    expect((await put(await book(), name)).body.files).toMatchObject([{ fileName: kept, error: null }]);
  });

  it('of another contractor’s batch is a wall, and the owner’s people hand nothing in', async () => {
    expect((await put(await book(), 'batch.xlsx', foreign)).status).toBe(404);
    expect((await put(await book(), 'batch.xlsx', inspector)).status).toBe(403);
    expect((await contractor.get(batch.path)).body.input).toBe(0);
  });

  it('cut in the middle changes nothing, and the next one is taken', async () => {
    const server = http.createServer(harness.app);
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    try {
      await cutUpload(server, await signedInHeaders());
      expect((await contractor.get(batch.path)).body).toMatchObject({ input: 0, status: 'draft' });
      expect((await put(await book())).status).toBe(202);
    } finally {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
    }
  });
});

describe('photographs', () => {
  const post = (files: [string, Buffer][]) => {
    const upload = contractor.post(`${batch.path}/photos`);
    for (const [name, bytes] of files) upload.attach('photos', bytes, name);
    return upload;
  };

  it('are taken or refused one by one, by content', async () => {
    const good = await photograph();
    const reply = await post([
      ['L-1 kits.jpg', good],
      ['notes.jpg', Buffer.from('a text file')],
      ['drawing.png', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>')],
      ['IMG_1.HEIC', Buffer.from('\0\0\0\u0018ftypheic\0\0\0\0mif1heic', 'latin1')],
      ['empty.jpg', Buffer.alloc(0)],
      ['again.jpg', good],
    ]);
    expect(reply.status).toBe(202);
    expect(
      reply.body.files.map((file: { error: { code: string } | null }) => file.error?.code ?? null),
    ).toEqual([null, 'photo.not-a-picture', 'photo.svg', 'photo.heic', 'photo.empty', null]);
    expect(reply.body.files[5].id).toBe(reply.body.files[0].id);
    const { body } = await contractor.get(`${batch.path}/photos`);
    expect(body.items).toMatchObject([{ fileName: 'L-1 kits.jpg', state: 'stored', lineId: null }]);
  });

  it('that are there already make no new input', async () => {
    const picture = await photograph();
    expect((await post([['L-1 kits.jpg', picture]])).body.input).toBe(1);
    expect((await post([['L-1 kits.jpg', picture]])).body.input).toBe(1);
  });

  it('that are damaged are told so, and the others go on', async () => {
    await post([
      ['L-1 kits.jpg', await photograph()],
      ['L-1 plumb.jpg', (await photograph({ width: 800, height: 600 })).subarray(0, 900)],
    ]);
    await harness.drain();
    const { body } = await contractor.get(`${batch.path}/photos`);
    expect(body.items).toMatchObject([
      { fileName: 'L-1 kits.jpg', state: 'ready', problem: null, width: 1000, height: 750 },
      { fileName: 'L-1 plumb.jpg', state: 'unreadable', problem: expect.stringMatching(/damaged/u) },
    ]);
    // Photographs before the first workbook: nothing is checked yet, and nothing is wrong.
    expect((await contractor.get(`${batch.path}/check`)).body).toMatchObject({
      input: 1,
      state: 'done',
      total: 0,
    });
    expect((await contractor.get(batch.path)).body.status).toBe('draft');
    expect(leftovers()).toEqual([]);
  });
});

describe('the blob store', () => {
  it('keeps what was uploaded byte for byte, and the original is given back', async () => {
    const picture = await photograph();
    const reply = await contractor.post(`${batch.path}/photos`).attach('photos', picture, 'L-1 kits.jpg');
    await uploadWorkbook(harness, contractor, { batch, site, workbook: { set: [setRow('L-1')] } });
    const file = `/api/photos/${reply.body.files[0].id}/file`;
    const original = await contractor.get(`${file}?size=original`).responseType('blob');
    expect((original.body as Buffer).equals(picture)).toBe(true);
    expect(original.headers).toMatchObject({
      'content-type': 'image/jpeg',
      'cache-control': 'private, no-cache',
      'content-disposition': 'attachment; filename="L-1 kits.jpg"',
    });
    const thumb = await contractor.get(`${file}?size=thumb`);
    expect(thumb.status).toBe(200);
    const again = await contractor
      .get(`${file}?size=thumb`)
      .set('If-None-Match', thumb.headers['etag'] ?? '');
    expect(again.status).toBe(304);
    expect((await foreign.get(file)).status).toBe(404);
    // A draft is the contractor's own.
    expect((await inspector.get(file)).status).toBe(404);
    expect((await contractor.get(`${file}?size=huge`)).status).toBe(400);
    const kept = await rows(harness.em(), 'select 1 from blobs where type is null or size > 0');
    expect(kept.length).toBeGreaterThan(2);
  });
});

async function signedInHeaders(): Promise<Record<string, string>> {
  const { body } = await contractor.get('/api/session');
  const jar = (contractor as unknown as { jar: { getCookies(access: object): { toValueString(): string } } })
    .jar;
  const access = { path: '/', domain: '127.0.0.1', secure: false, script: false };
  return { 'X-CSRF-Token': body.csrfToken, Cookie: jar.getCookies(access).toValueString() };
}

/** Sends half a file and hangs up. */
function cutUpload(server: http.Server, headers: Record<string, string>): Promise<void> {
  const { port } = server.address() as AddressInfo;
  return new Promise((resolve) => {
    const request = http.request({
      host: '127.0.0.1',
      port,
      method: 'PUT',
      path: `${batch.path}/workbook`,
      headers: {
        ...headers,
        'Content-Type': 'multipart/form-data; boundary=cut',
        'Content-Length': 5_000_000,
      },
    });
    request.on('error', () => undefined);
    request.on('close', () => setTimeout(resolve, 300));
    request.write('--cut\r\nContent-Disposition: form-data; name="workbook"; filename="a.xlsx"\r\n\r\nPK');
    request.write(Buffer.alloc(200_000, 'x'), () => setTimeout(() => request.destroy(), 200));
  });
}
