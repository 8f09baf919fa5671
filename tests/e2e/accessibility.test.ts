import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { paths } from '#src/config/paths.ts';
import { buildWorld, type Caller, type World } from '#tests/api/authorisation/world.ts';
import { SCREENS, type Screen } from './setup/screens.ts';
import { useE2e } from './setup/stage.ts';

const e2e = useE2e();
let world: World;
beforeAll(async () => {
  world = await buildWorld(e2e.server());
}, 240_000);

/** One signed-in page a role and width: the theme is changed under it. */
const pages = new Map<string, Promise<Page>>();
function pageOf(who: Caller | 'nobody', width: number): Promise<Page> {
  const key = `${who} ${width}`;
  const known = pages.get(key);
  if (known) return known;
  const narrow = width < 600;
  const look = { viewport: { width, height: narrow ? 740 : 900 }, hasTouch: narrow, isMobile: narrow };
  const opened = (async () => {
    const { page } = who === 'nobody' ? await e2e.open(look) : await e2e.openAs(world.people[who], look);
    return page;
  })();
  pages.set(key, opened);
  return opened;
}

/** The theme, painted: colours read before that are those of the other one. */
async function wear(page: Page, theme: 'light' | 'dark'): Promise<void> {
  await page.emulateMedia({ colorScheme: theme });
  await page.evaluate(async () => {
    await new Promise((resolve) => requestAnimationFrame(() => requestAnimationFrame(resolve)));
    await Promise.all(document.getAnimations().map((one) => one.finished.catch(() => null)));
  });
}

/** On its page, all that was being fetched in place. */
async function show(screen: Screen, page: Page): Promise<void> {
  await wear(page, 'light');
  await page.goto(screen.path(world));
  await page.waitForLoadState('load');
  await page.locator('h1').first().waitFor();
  await page
    .getByRole('progressbar', { name: /Loading/ })
    .first()
    .waitFor({ state: 'hidden' });
  await page.locator('main[aria-busy="true"]').waitFor({ state: 'detached' });
}

describe.each(SCREENS)('$name', (screen) => {
  it.each([1440, 360])('has no fault of accessibility at %i px, light and dark', async (width) => {
    const page = await pageOf(screen.as, width);
    await show(screen, page);
    const press = (name: RegExp) => page.getByRole('button', { name }).first().click();
    if (screen.tab) await page.getByRole('tab', { name: screen.tab }).click();
    if (screen.pressNarrow && width === 360) await press(screen.pressNarrow);
    if (screen.press) await press(screen.press);
    if (screen.key) {
      await page.keyboard.press(screen.key);
      await page.getByRole('dialog').waitFor();
    }
    const found: string[] = [];
    for (const theme of ['light', 'dark'] as const) {
      await wear(page, theme);
      // The frame of a captured mail lets no script in, axe's neither: it would be waited for in vain.
      const axe = new AxeBuilder({ page }).exclude('iframe');
      // The theme changes colours alone: what else there is to find has been found in the first.
      const { violations } = await (theme === 'light' ? axe : axe.withRules(['color-contrast'])).analyze();
      for (const { id, nodes } of violations)
        found.push(
          ...nodes.map((node) => `${theme}: ${id} at ${node.target.join(' ')}: ${node.failureSummary ?? ''}`),
        );
    }
    expect(found).toEqual([]);
    // Nothing is cut off at the side, nor scrolled sideways to.
    const [content, view] = await page.evaluate(() => [
      document.documentElement.scrollWidth,
      document.documentElement.clientWidth,
    ]);
    expect(content).toBeLessThanOrEqual(view ?? 0);
  });
});

describe('the screens looked at', () => {
  it('are all that have an address', () => {
    const seen = SCREENS.map((screen) => new URL(screen.path(world), 'http://127.0.0.1').pathname);
    const unseen = Object.entries(paths)
      .filter(([, { path }]) => {
        const pattern = new RegExp(`^${path.replaceAll(/:\w+/g, '[^/]+')}$`);
        return !seen.some((one) => pattern.test(one));
      })
      .map(([name]) => name);
    expect(unseen).toEqual([]);
  });
});
