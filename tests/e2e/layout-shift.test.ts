import type { Page } from 'playwright-core';
import { beforeAll, expect, it } from 'vitest';
import type { Actor } from '#shared/permissions/ability.ts';
import { handIn, type HandedIn } from '#tests/factories/hand-in.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { createWorkSite } from '#tests/factories/work-site.ts';
import { useE2e } from './setup/stage.ts';

/** Layout shifts of a page load summed, as browsers score them; under 0.1 is called good (web.dev, "Cumulative Layout Shift"). */
const MOST = 0.02;
const e2e = useE2e();
let inspector: Actor;
let clerk: Actor;
let batch: HandedIn;
beforeAll(async () => {
  const server = e2e.server();
  inspector = await server.person('inspector');
  clerk = await server.person('clerk');
  const site = await createWorkSite(server, { planned: ['L-1', 'L-2'], number: '31' });
  const agent = await server.signIn(site.contractor);
  batch = await handIn(server, { site, agent, set: [setRow('L-1', { embedmentFt: 5.5 }), setRow('L-2')] });
  const taking = await server.signIn(inspector);
  await taking.post(`/api/batches/${batch.id}/take`).expect(200);
});

/** Shifts from the first paint until the page has stood still for a while. */
async function shiftOf(page: Page, to: string, heading: RegExp): Promise<number> {
  await page.goto(to, { waitUntil: 'networkidle' });
  await page.getByRole('heading', { level: 1, name: heading }).first().waitFor();
  return page.evaluate(
    () =>
      new Promise<number>((resolve) => {
        let sum = 0;
        new PerformanceObserver((list) => {
          for (const entry of list.getEntries()) sum += (entry as PerformanceEntry & { value: number }).value;
        }).observe({ type: 'layout-shift', buffered: true });
        setTimeout(() => resolve(sum), 300);
      }),
  );
}

it('the sign-in page does not move as it loads', async () => {
  const { page } = await e2e.open();
  expect(await shiftOf(page, '/sign-in', /./)).toBeLessThan(MOST);
});

it('home, batch and desk do not move as they load', async () => {
  const { page } = await e2e.openAs(inspector);
  expect.soft(await shiftOf(page, '/', /./), 'home').toBeLessThan(MOST);
  expect.soft(await shiftOf(page, `/batches/${batch.id}`, /./), 'batch').toBeLessThan(MOST);
  expect.soft(await shiftOf(page, `/review/${batch.id}`, /./), 'desk').toBeLessThan(MOST);
});

it('the register does not move as it loads', async () => {
  const { page } = await e2e.openAs(clerk);
  expect(await shiftOf(page, '/register', /./)).toBeLessThan(MOST);
});
