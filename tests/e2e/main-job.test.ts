import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import type { Download, Locator, Page } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { photograph } from '#tests/factories/photograph.ts';
import { pourRows, SET_VIEWS, setRow } from '#tests/factories/set-row.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { dropFiles, XLSX, type DroppedFile } from './setup/drop-files.ts';
import { expectAsBuiltCells } from './setup/expect-as-built-cells.ts';
import { fillTemplate } from './setup/fill-template.ts';
import { useE2e } from './setup/stage.ts';

/**
 * The whole job as its people do it, each in a browser of their own. Due depth of every pole: 6.0 ft (10 % of 40 ft
 * plus 2 ft). L-1 meets every rule; L-2 is half a foot short and comes back; L-3 is a quarter short and is approved on
 * evidence; L-4 is half a foot short and is accepted by concession.
 */
const STRUCTURES = ['L-1', 'L-2', 'L-3', 'L-4'];
const LINES = [
  setRow('L-1'),
  setRow('L-2', { embedmentFt: 5.5 }),
  setRow('L-3', { embedmentFt: 5.75 }),
  setRow('L-4', { embedmentFt: 5.5 }),
];

const e2e = useE2e();
let site: WorkSite;
let contractor: Page;
let inspector: Page;
let batchPath: string;

beforeAll(async () => {
  site = await createWorkSite(e2e.server(), { planned: STRUCTURES, number: '17' });
  contractor = (await e2e.openAs(site.contractor)).page;
  inspector = (await e2e.openAs(await e2e.server().person('inspector'))).page;
});

const photographsOf = async (structures: readonly string[]): Promise<DroppedFile[]> => {
  const files: DroppedFile[] = [];
  for (const structure of structures)
    for (const view of SET_VIEWS)
      files.push({ name: `${structure} ${view}.jpg`, type: 'image/jpeg', bytes: await photograph() });
  return files;
};

async function download(page: Page, act: () => Promise<void>): Promise<Download> {
  const [file] = await Promise.all([page.waitForEvent('download'), act()]);
  return file;
}

const line = (page: Page, structure: string) => page.getByRole('article', { name: `Line ${structure}` });

describe('the main job', () => {
  it('goes from the contractor’s empty template to the auditor’s list', async () => {
    await fillAndDrop();
    await seeFindings();
    await expectHandedIn();
    await review();
    await readMail();
    await correct();
    await accept();
    await expectAsBuilt();
    await expectListed();
  });
});

/** Begins with the contractor’s template, filled in, and a batch. */
async function fillAndDrop(): Promise<void> {
  await contractor.getByRole('link', { name: 'Work orders' }).first().click();
  await contractor.getByRole('link', { name: '17', exact: true }).click();
  await contractor.getByRole('heading', { name: /Work order 17/ }).waitFor();
  const template = await download(contractor, () =>
    contractor.getByRole('link', { name: 'Download workbook template' }).click(),
  );
  const workbook = fillTemplate(await template.path(), {
    set: LINES,
    pours: STRUCTURES.flatMap((structure) => pourRows(structure, site.lot.number)),
  });
  await contractor.getByRole('button', { name: 'Open a new batch' }).click();
  await contractor.getByRole('heading', { name: 'Batch 17-01' }).waitFor();
  batchPath = new URL(contractor.url()).pathname;
  await dropFiles(contractor, [
    { name: 'order-17.xlsx', type: XLSX, bytes: workbook },
    ...(await photographsOf(STRUCTURES)),
  ]);
  await contractor.getByText('16 of 16 stored').waitFor();
}

/** Shows the contractor what the check found, with limit and cell, and takes an answer. */
async function seeFindings(): Promise<void> {
  const short = line(contractor, 'L-2');
  await short.waitFor();
  // 5.5 ft measured against 6.0 ft due.
  await short
    .getByText(/6(\.00?)? ft/)
    .first()
    .waitFor();
  await short.getByText(/Set!/).first().waitFor();
  await contractor.getByText('3 nonconformities', { exact: false }).first().waitFor();
  await short.getByRole('button', { name: /Answer in writing/ }).click();
  await short.getByLabel('Your answer').fill('Rock at 5.5 ft.');
  await short.getByRole('button', { name: 'Keep this answer' }).click();
  await short.getByText('Rock at 5.5 ft.').waitFor();
}

/** Is handed in. */
async function expectHandedIn(): Promise<void> {
  await contractor.getByRole('button', { name: 'Submit…' }).click();
  await contractor.getByRole('dialog').getByRole('button', { name: 'Submit 4 lines' }).click();
  await contractor.getByRole('dialog').waitFor({ state: 'hidden' });
  await contractor.getByRole('button', { name: 'Withdraw…' }).waitFor();
}

/** Is taken by an inspector and decided by keyboard and by mouse. */
async function review(): Promise<void> {
  await inspector.getByRole('link', { name: 'Review desk' }).first().click();
  await openDesk(inspector);
  // By keyboard: the next open finding is L-2's; it is rejected.
  await select(inspector, 'L-2');
  await inspector.keyboard.press('r');
  const reject = inspector.getByRole('form', { name: /^Reject:/ });
  const rework = reject.getByRole('radio', { name: /^Rework/ });
  await rework.waitFor();
  await inspector.keyboard.press('ArrowDown');
  expect(await rework.isChecked()).toBe(true);
  await reject.getByLabel('Due by').fill('2099-05-11');
  await reject.getByLabel('Why, in words for the contractor').fill('Half a foot short: reset the pole.');
  await inspector.keyboard.press('Control+Enter');
  await listed(inspector, 'L-2').getByText('returned').waitFor();

  // By mouse: L-3 on evidence.
  await select(inspector, 'L-3');
  await inspector.getByRole('button', { name: 'Approve', exact: true }).click();
  await inspector.getByLabel('What the photograph or field check shows').fill('The tape reads 6.0 ft.');
  await inspector
    .getByRole('form', { name: /^Approve:/ })
    .getByRole('button', { name: /^Approve/ })
    .click();
  await listed(inspector, 'L-3').getByText('approved').waitFor();

  // L-4: the engineers are asked.
  await select(inspector, 'L-4');
  await inspector.keyboard.press('c');
  await inspector.getByLabel('Why it might be accepted as built').fill('Rock at 5.5 ft on all sides.');
  await inspector.getByRole('button', { name: /Ask the engineers/ }).click();
  await listed(inspector, 'L-4').getByText('concession').waitFor();

  await inspector.getByRole('button', { name: 'Approve the one line without findings' }).click();
  await inspector.getByRole('button', { name: 'Close review…' }).click();
  await inspector.getByRole('dialog').getByRole('button', { name: 'Close the review' }).click();
  await inspector.getByRole('dialog').getByText('revision 1').waitFor();
  await inspector.getByRole('link', { name: 'To the queue' }).click();
}

/** Writes to the contractor what came back and why. */
async function readMail(): Promise<void> {
  const { page } = await e2e.openAs(await e2e.server().person('administrator'), { to: '/mail' });
  await page
    .getByRole('link', { name: /Batch 17-01: 1 line returned, due 11 May 2099/ })
    .first()
    .click();
  const message = page.frameLocator('iframe');
  await message.getByText('Half a foot short: reset the pole.').first().waitFor();
  await message.getByText('L-2').first().waitFor();
  await page.close();
}

/** Shows the contractor the returned line, and takes it corrected. */
async function correct(): Promise<void> {
  await contractor.goto(batchPath);
  const came = contractor.getByRole('region', { name: 'Returned line L-2' });
  await came.getByText('Half a foot short: reset the pole.').first().waitFor();
  const bytes = await workbookFile({
    workOrder: '17',
    contractor: site.contractor.orgName,
    set: [setRow('L-2', { embedmentFt: 6, boreDepthFt: 6 })],
    pours: pourRows('L-2', site.lot.number),
  });
  await dropFiles(contractor, [
    { name: 'order-17-again.xlsx', type: XLSX, bytes },
    ...(await photographsOf(['L-2'])),
  ]);
  await contractor.getByText('4 of 4 stored').waitFor();
  await contractor.getByText('0 nonconformities').waitFor();
  await contractor.getByRole('button', { name: 'Submit…' }).click();
  await contractor.getByRole('dialog').getByRole('button', { name: 'Submit 1 line' }).click();
  await contractor.getByRole('button', { name: 'Withdraw…' }).waitFor();
}

/** Is accepted, the held line by an engineer’s concession. */
async function accept(): Promise<void> {
  await inspector.goto('/review');
  await openDesk(inspector);
  await select(inspector, 'L-2');
  await inspector.keyboard.press('a');
  await listed(inspector, 'L-2').getByText('approved').waitFor();
  await inspector.getByRole('button', { name: 'Close review…' }).click();
  await inspector.getByRole('dialog').getByRole('button', { name: 'Close the review' }).click();
  await inspector.getByRole('link', { name: 'To the queue' }).click();

  const { page } = await e2e.openAs(await e2e.server().person('engineer'), { to: '/concessions' });
  await page.getByRole('link', { name: 'C-0001' }).click();
  await page.getByRole('radio', { name: /^Grant/ }).check();
  await page.getByLabel('Reason').fill('Rock carries it.');
  await page.getByLabel(/^Condition/).fill('Measure the lean again.');
  await page.getByRole('button', { name: 'Grant the concession' }).click();
  await page.getByText('Measure the lean again.').first().waitFor();
  await page.close();
}

/** Goes on record, and out as a workbook that says what the register says. */
async function expectAsBuilt(): Promise<void> {
  const { page } = await e2e.openAs(await e2e.server().person('clerk'), { to: '/register/enter' });
  await page.getByRole('row', { name: /L-4/ }).waitFor();
  await page.getByRole('button', { name: /Tick all/ }).click();
  await page.getByRole('button', { name: /^Enter…/ }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Enter 4 lines' }).click();
  await page.getByRole('status').getByRole('link', { name: 'R-000004' }).waitFor();

  await page.goto('/transmittals');
  await page.getByRole('button', { name: 'Issue…' }).click();
  await page.getByLabel('Work order', { exact: true }).selectOption(site.order.id);
  await page.getByRole('dialog').getByRole('button', { name: 'Issue', exact: true }).click();
  const issued = await download(page, () =>
    page.getByRole('link', { name: 'Download the workbook' }).click(),
  );
  const bytes = readFileSync(await issued.path());
  const digest = createHash('sha256').update(bytes).digest('hex');
  await page.getByText(digest).waitFor();
  expectAsBuiltCells(bytes, { structures: STRUCTURES, lot: site.lot.number });
  await page.close();
}

/** Is found by the auditor, who opens the record and takes the list away as CSV. */
async function expectListed(): Promise<void> {
  const { page } = await e2e.openAs(await e2e.server().person('auditor'), { to: '/nonconformities' });
  await page.getByRole('row', { name: /L-4/ }).first().waitFor();
  await page.goto('/nonconformities?grounds=concession&rule=embedment-short');
  await page.getByRole('row', { name: /L-4/ }).first().waitFor();
  expect(await page.getByRole('row', { name: /L-2/ }).count()).toBe(0);
  const csv = await download(page, () => page.getByRole('link', { name: /CSV/ }).click());
  const text = readFileSync(await csv.path(), 'utf8');
  expect(text).toContain('L-4');
  expect(text).not.toContain('L-2');
  await page.getByRole('row', { name: /L-4/ }).getByRole('link').first().click();
  await page.getByRole('heading', { name: /L-4/ }).first().waitFor();
  await page.getByText('Rock carries it.').first().waitFor();
  await page.close();
}

/** The line in the desk's list. */
function listed(page: Page, structure: string): Locator {
  return page.getByRole('button', { name: new RegExp(`^\\W*${structure}\\b`) });
}

/** Takes the batch from the queue and shows all of its lines. */
async function openDesk(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Take 17-01' }).click();
  await page.waitForURL(/[?&]line=/);
  await page.getByRole('tab', { name: /^All/ }).click();
  await page.getByRole('tab', { name: /^All/, selected: true }).waitFor();
}

async function select(page: Page, structure: string): Promise<void> {
  await listed(page, structure).click();
  await page.getByRole('figure').filter({ hasText: structure }).first().waitFor();
}
