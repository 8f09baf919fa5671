import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { row, run } from '#server/db/rows.ts';
import { readPdfForTests } from '#server/modules/sheets/read-pdf-for-tests.ts';
import { handIn } from '#tests/factories/hand-in.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let inspector: Agent;
let batch: { id: string; number: string };

beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['P-1', 'P-2', 'P-3'], number: '17' });
  contractor = await harness.signIn(site.contractor);
  inspector = await harness.signIn('inspector');
  batch = await handIn(harness, {
    site,
    agent: contractor,
    set: [setRow('P-1'), setRow('P-2', { embedmentFt: 5.5 }), setRow('P-3')],
  });
});
afterAll(() => harness.close());

/** Superagent keeps the bytes of a type it does not know only when told to. */
const bytes = (asked: ReturnType<Agent['get']>) =>
  asked.buffer(true).parse((res, done) => {
    const parts: Buffer[] = [];
    res.on('data', (part: Buffer) => parts.push(part));
    res.on('end', () => done(null, Buffer.concat(parts)));
  });

async function recordId(structure: string): Promise<string> {
  const list = await inspector.get(`/api/batches/${batch.id}/records?structure=${structure}`);
  return list.body.items[0].id as string;
}

describe('the PDF of one record sheet', () => {
  it('is streamed on the paper asked for, with its findings', async () => {
    const id = await recordId('P-2');
    const reply = await bytes(inspector.get(`/api/records/${id}/sheet.pdf?paper=a4`));
    expect([reply.status, reply.headers['content-type']]).toEqual([200, 'application/pdf']);
    expect(reply.headers['content-disposition']).toBe('attachment; filename=P-2-sheet.pdf');
    const pdf = readPdfForTests(reply.body as Buffer);
    // A4, 210 × 297 mm in points.
    expect(pdf.mediaBoxes[0]).toBe('0 0 595.28 841.89');
    expect(pdf.pages.join(' ')).toContain('Embedment short');
    expect(pdf.pages[0]).toContain(`page 1 of ${pdf.pages.length}`);
    expect(pdf.pages.join(' ')).toContain(`batch ${batch.number}, revision 0`);
  });

  it('is on US Letter unless told, and on no other paper', async () => {
    const id = await recordId('P-1');
    const reply = await bytes(contractor.get(`/api/records/${id}/sheet.pdf`));
    // 8.5 × 11 in in points.
    expect(readPdfForTests(reply.body as Buffer).mediaBoxes[0]).toBe('0 0 612 792');
    expect((await contractor.get(`/api/records/${id}/sheet.pdf?paper=a0`)).status).toBe(400);
  });
});

describe('the PDF of a batch', () => {
  it('is made by a job, every sheet in order, pages counted through the file', async () => {
    const asked = await inspector.post(`/api/batches/${batch.id}/sheets`).send({ paper: 'letter' });
    expect([asked.status, asked.body.state, asked.body.sheets, asked.body.done]).toEqual([
      202,
      'queued',
      3,
      0,
    ]);
    expect((await inspector.get(`/api/sheets/${asked.body.id}/file`)).status).toBe(409);
    await harness.drain();
    const made = (await inspector.get(`/api/sheets/${asked.body.id}`)).body;
    expect([made.state, made.done, made.problem]).toEqual(['ready', 3, null]);
    const file = await bytes(inspector.get(`/api/sheets/${asked.body.id}/file`));
    expect(file.headers['content-disposition']).toBe(`attachment; filename=${batch.number}-rev0-sheets.pdf`);
    const { pages } = readPdfForTests(file.body as Buffer);
    expect(pages).toHaveLength(made.pages);
    pages.forEach((page, index) => expect(page).toContain(`page ${index + 1} of ${pages.length}`));
    const sheets = pages.flatMap((page) => /Sheet (\d of 3)/.exec(page)?.[1] ?? []);
    expect(sheets).toEqual(['1 of 3', '2 of 3', '3 of 3']);
  });

  it('run twice leaves the file that is there', async () => {
    const asked = await contractor.post(`/api/batches/${batch.id}/sheets`).send({ paper: 'a4' });
    await harness.drain();
    const sha = () =>
      row<{ sha256: string }>(harness.em(), 'select sha256 from sheet_files where id = $1', [asked.body.id]);
    const first = await sha();
    await run(
      harness.em(),
      `update pgboss.job set state = 'created', completed_on = null where name = 'make-sheets' and data ->> 'sheetFileId' = $1`,
      [asked.body.id],
    );
    await harness.drain();
    expect(await sha()).toEqual(first);
    expect((await contractor.get(`/api/sheets/${asked.body.id}`)).body.state).toBe('ready');
  });

  it('is for whoever asked alone, and shows a contractor nothing of an open review', async () => {
    await inspector.post(`/api/batches/${batch.id}/take`);
    const found = await inspector.get(`/api/batches/${batch.id}/findings?code=embedment-short`);
    const { id, version } = found.body.items[0];
    const decided = await inspector
      .put(`/api/findings/${id}/decision`)
      .set('If-Match', `"${version}"`)
      .send({ decision: 'approve', grounds: 'evidence', reason: 'The tape reads six feet.' });
    expect(decided.status).toBe(200);
    const [mine, theirs] = [contractor, inspector].map((agent) =>
      agent.post(`/api/batches/${batch.id}/sheets`).send({ paper: 'letter' }),
    );
    const ids = [(await mine!).body.id, (await theirs!).body.id] as [string, string];
    await harness.drain();
    const words = async (agent: Agent, file: string) =>
      readPdfForTests((await bytes(agent.get(`/api/sheets/${file}/file`))).body as Buffer).pages.join(' ');
    expect(await words(inspector, ids[1])).toContain('The tape reads six feet.');
    expect(await words(contractor, ids[0])).not.toContain('The tape reads six feet.');
    expect((await contractor.get(`/api/sheets/${ids[1]}`)).status).toBe(404);
    expect((await inspector.get(`/api/sheets/${ids[0]}/file`)).status).toBe(404);
    expect((await contractor.get(`/api/events?subject=sheets:${ids[1]}`)).status).toBe(404);
  });

  it('is refused while there is nothing to draw', async () => {
    const begun = await contractor.post(`/api/work-orders/${site.order.id}/batches`);
    const asked = await contractor.post(`/api/batches/${begun.body.id}/sheets`).send({ paper: 'letter' });
    expect([asked.status, asked.body.code]).toEqual([409, 'sheets.none']);
  });

  it('says so when no attempt is left', async () => {
    const asked = await contractor.post(`/api/batches/${batch.id}/sheets`).send({ paper: 'letter' });
    const { parkSheets } = await import('#server/modules/sheets/park-sheets.ts');
    await harness
      .em()
      .transactional((em) =>
        parkSheets({ sheetFileId: asked.body.id }, { em: em as never, reason: 'disk full' }),
      );
    const { state, problem } = (await contractor.get(`/api/sheets/${asked.body.id}`)).body;
    expect([state, problem]).toEqual([
      'failed',
      'The sheets could not be written after several attempts. Ask for them again; if that fails too, an administrator can look at the parked job.',
    ]);
  });
});
