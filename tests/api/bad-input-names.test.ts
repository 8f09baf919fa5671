import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { photograph } from '#tests/factories/photograph.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { startBatch, uploadWorkbook, type HandedIn } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let batch: HandedIn;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'Опора-7'] });
  contractor = await harness.signIn(site.contractor);
  batch = await startBatch(contractor, site);
});
afterAll(() => harness?.close());

/** As browsers send a name: UTF-8 bytes, quotes and line ends escaped (WHATWG HTML, multipart/form-data). */
function form(field: string, name: string, bytes: Buffer): { type: string; body: Buffer } {
  const head = `--b\r\nContent-Disposition: form-data; name="${field}"; filename="${name}"\r\nContent-Type: application/octet-stream\r\n\r\n`;
  return {
    type: 'multipart/form-data; boundary=b',
    body: Buffer.concat([Buffer.from(head, 'utf8'), bytes, Buffer.from('\r\n--b--\r\n')]),
  };
}
async function named(name: string): Promise<{ status: number; fileName: string; id: string }> {
  const { type, body } = form('photos', name, await photograph());
  const reply = await contractor.post(`${batch.path}/photos`).set('Content-Type', type).send(body);
  return { status: reply.status, ...reply.body.files?.[0] };
}

describe('a photograph named', () => {
  it.each([
    ['in Cyrillic', 'опора 7 глубина.jpg', 'опора 7 глубина.jpg'],
    ['in Japanese', '電柱17 深さ.jpg', '電柱17 深さ.jpg'],
    ['in Arabic', 'عمود ٧.jpg', 'عمود ٧.jpg'],
    ['with an accent of two characters', 'Pose\u0301 7.jpg', 'Posé 7.jpg'],
    ['with a face', 'kits 🙂.jpg', 'kits 🙂.jpg'],
    ['with a path', '../../etc/L-1 kits.jpg', 'L-1 kits.jpg'],
    ['with a drive', 'C:\\crew\\L-1 water.jpg', 'L-1 water.jpg'],
    ['with escaped line ends', 'L-1%0D%0ASet-Cookie: a.jpg', 'L-1Set-Cookie: a.jpg'],
    ['with marks that are not seen', 'L-1\u200B\u2066\u0085 kits.jpg', 'L-1 kits.jpg'],
    ['to be read backwards', 'L-1 \u202Egpj.exe', 'L-1 gpj.exe'],
    ['as a folder above', '..', 'unnamed'],
    ['as a page', '<img src=x onerror=alert(1)>.jpg', '<img src=x onerror=alert(1)>.jpg'],
  ])('%s is kept for people and given back without harm', async (_what, name, kept) => {
    const { status, fileName, id } = await named(name);
    expect([status, fileName]).toEqual([202, kept]);
    const { body } = await contractor.get(`${batch.path}/photos`);
    expect(body.items.find((one: { id: string }) => one.id === id)?.fileName).toBe(kept);
    const file = await contractor.get(`/api/photos/${id}/file?size=original`);
    expect(file.status).toBe(200);
    const header = String(file.headers['content-disposition']);
    // One line of ASCII (RFC 6266): the full name, where it is not ASCII, stands in filename*.
    expect(header).toMatch(
      /^attachment; filename=("[\x20-\x7e]*"|[\w.-]+)(; filename\*=UTF-8''[\x21-\x7e]+)?$/u,
    );
    const whole = /filename\*=UTF-8''(.+)$/u.exec(header)?.[1];
    expect(decodeURIComponent(whole ?? encodeURIComponent(kept))).toBe(kept);
    expect(file.headers['set-cookie']).toBeUndefined();
  });

  it.each(['L-1\u0001 kits.jpg', 'L-1\u0000 kits.jpg', 'L-1\u007f\u001b kits.jpg'])(
    'with a control character, as %j, is refused with the remedy, and nothing is stored',
    async (name) => {
      const before = (await contractor.get(batch.path)).body.input;
      const { type, body } = form('photos', name, await photograph());
      const reply = await contractor.post(`${batch.path}/photos`).set('Content-Type', type).send(body);
      expect([reply.status, reply.body.code]).toEqual([400, 'upload.name']);
      expect(reply.body.detail).toMatch(/control character.*Rename/u);
      expect((await contractor.get(batch.path)).body.input).toBe(before);
    },
  );

  it('of five hundred letters is shortened and keeps its ending', async () => {
    const { fileName } = await named(`${'x'.repeat(500)}.jpg`);
    expect(fileName).toBe(`${'x'.repeat(116)}.jpg`);
  });

  it('after a structure in another script finds its line', { timeout: 90_000 }, async () => {
    await uploadWorkbook(harness, contractor, {
      batch,
      site,
      workbook: { set: [setRow('L-1'), setRow('Опора-7')] },
    });
    const { id } = await named('Опора-7 kits.jpg');
    await harness.drain();
    const { body } = await contractor.get(`${batch.path}/photos`);
    expect(body.items.find((one: { id: string }) => one.id === id)).toMatchObject({
      structureNumber: 'Опора-7',
      view: 'kits',
      method: 'name',
    });
  });
});

describe('a workbook named', () => {
  it.each([
    ['with a path and marks that are not seen', '..\\..\\a\u200B\u202Eb.xlsx', 'ab.xlsx'],
    ['in another script', '報告書 17.xlsx', '報告書 17.xlsx'],
  ])('%s is shown so wherever it is named', async (_what, name, kept) => {
    const own = await startBatch(contractor, site);
    const bytes = await workbookFile({ workOrder: site.order.number, set: [setRow('L-1')] });
    const { type, body } = form('workbook', name, bytes);
    const reply = await contractor.put(`${own.path}/workbook`).set('Content-Type', type).send(body);
    expect([reply.status, reply.body.files?.[0]?.fileName]).toEqual([202, kept]);
    await harness.drain();
    expect((await contractor.get(own.path)).body).toMatchObject({
      status: 'checked',
      workbook: { fileName: kept },
    });
    expect((await contractor.get(`${own.path}/inputs`)).body.items[0].fileName).toBe(kept);
  });
});
