import { beforeAll, describe, expect, it } from 'vitest';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { useE2e } from './setup/stage.ts';

const e2e = useE2e();
let site: WorkSite;
beforeAll(async () => {
  site = await createWorkSite(e2e.server(), { planned: ['P-1', 'P-2'], number: '17' });
});

describe('planning kits', () => {
  it('leads from the work order to its kits, to one structure, and by its address to a colleague', async () => {
    const { page } = await e2e.openAs(site.contractor, { to: `/work-orders/${site.order.id}` });
    await page.getByRole('link', { name: 'Plan kits' }).click();
    await page.getByRole('heading', { name: 'Kit planner', level: 1 }).waitFor();
    const kits = page.getByRole('region', { name: 'Kits to order' });
    await kits.getByRole('table').waitFor();
    // What the owner holds in stock is not a contractor's to see.
    await kits.getByText('What the owner holds in stock is not shown here.').waitFor();
    await page.getByRole('link', { name: 'P-1' }).click();

    const answers = page.getByRole('region', { name: 'Kits', exact: true });
    const bore = page.getByLabel('Bore to be used');
    await bore.fill('11');
    await page.getByText('The pole is wider than the bore').waitFor();
    await bore.fill('20');
    // 40 ft class 4 in a 20 in bore, 6 ft deep: 9.1185 ft³ (worked record WR-02), kits 8 + 2.5 (WK2).
    await answers.getByText('8 + 2.5').first().waitFor();
    await page.getByRole('group', { name: /^Drawing of structure P-1/ }).waitFor();
    await bore.blur();
    await page.waitForURL(/boreIn=20/);

    const colleague = await e2e.openAs(site.contractor, {
      to: new URL(page.url()).pathname + new URL(page.url()).search,
    });
    await colleague.page
      .getByRole('region', { name: 'Kits', exact: true })
      .getByText('8 + 2.5')
      .first()
      .waitFor();
    // What is typed survives a page that is loaded again at once.
    await colleague.page.getByLabel('Bore to be used').fill('24');
    await colleague.page.reload();
    await colleague.page.getByLabel('Bore to be used').waitFor();
    expect(await colleague.page.getByLabel('Bore to be used').inputValue()).toBe('24');
  });

  it('shows the administrator what stands in stock, lot by lot', async () => {
    const administrator = await e2e.server().person('administrator');
    const { page } = await e2e.openAs(administrator, { to: `/planner?view=order&order=${site.order.id}` });
    const kits = page.getByRole('region', { name: 'Kits to order' });
    await kits.getByText(site.lot.number).first().waitFor();
    await kits.getByText('all at hand').waitFor();
    // Two poles with kits each, and one spare of every size.
    expect(await kits.getByRole('row').count()).toBeGreaterThan(1);
  });
});
