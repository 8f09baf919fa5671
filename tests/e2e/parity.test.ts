import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { runCheck } from '#scripts/check-workbook/run-check.ts';
import { readWorkbookBytes } from '#server/workbook/read-workbook-bytes.ts';
import type { CheckContextData, FindingRow } from '#shared/generated/api-types.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { findingsOf, recordsOf, startBatch, type HandedIn } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { ONE_A_REASON, PARITY_REFUSED } from '#tests/fixtures/parity/refused.ts';
import { PARITY_WORKBOOKS } from '#tests/fixtures/parity/workbooks.ts';
import type { Agent } from '#tests/setup/api-harness.ts';
import { checkInBrowser, workerUrl } from './setup/check-in-browser.ts';
import { findingRows, recordRows } from './setup/parity-rows.ts';
import { useE2e } from './setup/stage.ts';

const e2e = useE2e();
let site: WorkSite;
let agent: Agent;
let page: Page;
let url: string;
let context: CheckContextData;
let folder: string;
let good: Buffer;

beforeAll(async () => {
  const server = e2e.server();
  // The demo's order, so that its own workbook is one of these.
  site = await createWorkSite(server, { number: '17', planned: ['L-1', 'L-2', 'L-3', '17-0414', '17-0423'] });
  agent = await server.signIn(site.contractor);
  const opened = await e2e.openAs(site.contractor, { to: `/work-orders/${site.order.id}/check?tab=line` });
  ({ page } = opened);
  url = await workerUrl(page);
  // As the page itself asks for it.
  context = await page.evaluate(async (path) => {
    const reply = await fetch(path);
    return (await reply.json()) as CheckContextData;
  }, `/api/work-orders/${site.order.id}/check-context`);
  folder = await mkdtemp(join(tmpdir(), 'upstand-parity-'));
  await writeFile(join(folder, 'context.json'), JSON.stringify(context));
  const [first] = PARITY_WORKBOOKS;
  if (!first) throw new Error('There is no workbook to compare.');
  good = await first.make(site);
}, 240_000);
afterAll(() => rm(folder, { recursive: true, force: true }));

async function onTheServer(bytes: Buffer): Promise<HandedIn> {
  const batch = await startBatch(agent, site);
  const reply = await agent.put(`${batch.path}/workbook`).attach('workbook', bytes, 'batch.xlsx');
  expect([reply.status, reply.text.slice(0, 200)]).toEqual([202, expect.any(String)]);
  await e2e.server().drain();
  return batch;
}

async function byCommandLine(bytes: Buffer): Promise<unknown> {
  const path = join(folder, 'batch.xlsx');
  await writeFile(path, bytes);
  const { stdout } = await runCheck([path, '--json', '--context', join(folder, 'context.json')]);
  return JSON.parse(stdout) as unknown;
}

type Report = {
  readonly records: readonly object[];
  readonly findings: readonly FindingRow[];
  readonly skipped: readonly { readonly code: string; readonly reason: string }[];
};

describe.each(PARITY_WORKBOOKS)('$name', (workbook) => {
  it('comes out alike in the browser, on the server and on the command line', async () => {
    const bytes = await workbook.make(site);
    const { lines, end } = await checkInBrowser(page, { url, bytes, context });
    if (end.type !== 'done') throw new Error(`The browser ended with ${JSON.stringify(end)}.`);
    const found = [...lines.flatMap(({ findings }) => findings), ...end.loose];
    expect(lines).toHaveLength(workbook.lines);
    expect(found.map(({ code }) => code)).toEqual(expect.arrayContaining([...workbook.finds]));

    const report = (await byCommandLine(bytes)) as Report;
    expect(findingRows(report.findings)).toEqual(findingRows(found));
    expect(recordRows(report.records)).toEqual(recordRows(lines));
    expect(report.skipped).toEqual(end.notRun.map(({ code, reason }) => ({ code, reason })));

    const batch = await onTheServer(bytes);
    const onServer = await findingsOf(agent, batch);
    // What the browser says that it left to the server is the server's alone; all else is the same.
    const left = new Set(
      end.notRun.flatMap(({ code, reason }) => (reason === 'own-only' || reason === 'off' ? [] : [code])),
    );
    expect(findingRows(onServer.filter(({ code }) => !left.has(code)))).toEqual(findingRows(found));
    expect(recordRows(await recordsOf(agent, batch))).toEqual(recordRows(lines));
  });
});

describe.each(ONE_A_REASON)('refused: $name', ({ bytes, code }) => {
  it('is refused in the same words by browser, server and command line', async () => {
    const file = bytes(good);
    const { end } = await checkInBrowser(page, { url, bytes: file, context });
    expect(end).toMatchObject({ type: 'refused', code });
    const detail = end.type === 'refused' ? end.detail : '';
    expect(await byCommandLine(file)).toEqual({ problem: { code, detail } });
    if (file.length === 0) return;
    const batch = await onTheServer(file);
    const { body } = await agent.get(`${batch.path}/check`);
    expect(body).toMatchObject({ state: 'failed', problem: { code: `workbook.${code}`, detail } });
  });
});

describe('every file that is refused', () => {
  it.each(PARITY_REFUSED)('$name: in the browser as by the server’s reader', async ({ bytes }) => {
    const file = bytes(good);
    const { end } = await checkInBrowser(page, { url, bytes: file, context });
    const refused: unknown = await readWorkbookBytes(file).then(
      () => null,
      (error: unknown) => error,
    );
    if (!(refused instanceof WorkbookRefused)) throw new Error('The server’s reader took it.');
    const { code, params } = refused;
    expect(end).toEqual({ type: 'refused', code, params, detail: refusalText(refused) });
  });
});
