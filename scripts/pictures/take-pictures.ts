/**
 * Takes the pictures of the README from the running demo: `npm start` in one terminal, `npm run pictures` in another.
 * The address may be given: `npm run pictures -- http://127.0.0.1:4610`.
 */
import { chromium, type Browser, type Page } from 'playwright-core';
import type { AppInfo } from '#shared/generated/api-types.ts';

const FOLDER = new URL('../../docs/pictures/', import.meta.url).pathname;
const base = process.argv[2] ?? 'http://127.0.0.1:4600';
const executablePath = process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium';

type Row = { id: string; status: string; counts?: { lines: number; nonconformity: number } };
type Listed = { items: Row[] };

const KINDS = ['set', 'straighten', 'relevel'] as const;

const browser = await chromium.launch({ executablePath, args: ['--no-sandbox', '--disable-dev-shm-usage'] });
try {
  await takeAll(browser);
} finally {
  await browser.close();
}

async function takeAll(using: Browser): Promise<void> {
  const info = (await (await fetch(`${base}/api/app`)).json()) as AppInfo;
  if (!info.demo) throw new Error(`${base} does not serve the demo: start it with npm start.`);
  for (const theme of ['light', 'dark'] as const) {
    const page = await using.newPage({ viewport: { width: 1440, height: 900 }, colorScheme: theme });
    await signIn(page, 'inspector@larkmoor.example', info.demo.password);
    const batches = await read<Listed>(page, '/api/batches?limit=200');
    // The largest of those under review.
    const batch = batches.items
      .filter((one) => one.status === 'in-review')
      .toSorted((a, b) => (b.counts?.lines ?? 0) - (a.counts?.lines ?? 0))[0];
    if (!batch) throw new Error('The demo has no batch in review any more: npm run reset, then npm start.');
    await take(page, `/review/${batch.id}`, `review-desk-${theme}`);
    const records = await read<Listed>(page, `/api/batches/${batch.id}/records?limit=200`);
    const worst = records.items.toSorted(
      (a, b) => (b.counts?.nonconformity ?? 0) - (a.counts?.nonconformity ?? 0),
    )[0];
    await take(page, `/records/${worst?.id}`, `record-sheet-${theme}`);
    if (theme === 'light') await takeKinds(page, batches.items);
    await page.close();
  }
}

/** The drawing alone, of the line of each kind with the most to show. */
async function takeKinds(page: Page, batches: readonly Row[]): Promise<void> {
  for (const kind of KINDS) {
    const found: Row[] = [];
    for (const batch of batches) {
      const path = `/api/batches/${batch.id}/records?kind=${kind}&limit=50`;
      found.push(...(await read<Listed>(page, path)).items);
    }
    const [best] = found.toSorted((a, b) => (b.counts?.nonconformity ?? 0) - (a.counts?.nonconformity ?? 0));
    if (!best) {
      console.log(
        `No batch of the demo has a line of kind ${kind}: docs/pictures/sheet-${kind}.png is left as it is.`,
      );
      continue;
    }
    await page.goto(`${base}/records/${best.id}`);
    const drawing = page.getByLabel(/^Drawing of structure/);
    await drawing.waitFor();
    await page.evaluate(() => document.fonts.ready);
    await drawing.screenshot({ path: `${FOLDER}sheet-${kind}.png` });
    console.log(`docs/pictures/sheet-${kind}.png`);
  }
}

async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto(`${base}/sign-in`);
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.keyboard.press('Enter');
  await page.waitForURL(`${base}/`);
}

async function read<T>(page: Page, path: string): Promise<T> {
  return (await (await page.request.get(base + path)).json()) as T;
}

async function take(page: Page, path: string, name: string): Promise<void> {
  await page.goto(base + path);
  await page.getByLabel(/^Drawing of structure/).waitFor();
  // Photographs come after the drawing.
  await page.waitForFunction(() => [...document.images].every((image) => image.complete));
  await page.screenshot({ path: `${FOLDER}${name}.png` });
  console.log(`docs/pictures/${name}.png`);
}
