import type { Browser, BrowserContextOptions } from 'playwright-core';
import { afterAll, afterEach, beforeAll, expect } from 'vitest';
import type { Actor } from '#shared/permissions/ability.ts';
import { startBrowser } from './browser.ts';
import { openPage, type GuardedPage } from './guarded-page.ts';
import { startServer, type Server } from './server.ts';
import { signIn } from './sign-in.ts';

/** Characters of a page shown after a failure. */
const SHOWN = 6_000;

export type E2e = {
  server(): Server;
  /** A browser session of its own, nobody signed in. */
  open(options?: BrowserContextOptions): Promise<GuardedPage>;
  /** The same with this person signed in. */
  openAs(who: Actor, options?: { to?: string } & BrowserContextOptions): Promise<GuardedPage>;
};

/**
 * Server and browser of a test file. After each test every page that is still open must be without a fault; pages stay
 * open from test to test, so that a file may tell one story.
 */
export function useE2e(options: Parameters<typeof startServer>[0] = {}): E2e {
  let server: Server;
  let browser: Browser;
  const pages: GuardedPage[] = [];
  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(options), startBrowser()]);
  }, 240_000);
  afterEach(async ({ task }) => {
    if (task.result?.state === 'fail') await describePages(pages);
    expect(pages.flatMap((page) => page.faults())).toEqual([]);
  });
  afterAll(async () => {
    await browser?.close();
    await server?.stop();
  });
  const open: E2e['open'] = async (context = {}) => {
    const page = await openPage(browser, { url: server.url, ...context });
    pages.push(page);
    return page;
  };
  return {
    server: () => server,
    open,
    openAs: async (who, { to, ...context } = {}) => {
      const opened = await open(context);
      await signIn(opened.page, who, to === undefined ? {} : { to });
      return opened;
    },
  };
}

/** What stood on each page when a test failed: the quickest way to see why. */
async function describePages(pages: readonly GuardedPage[]): Promise<void> {
  for (const { page } of pages) {
    if (page.isClosed()) continue;
    const seen = await page.locator('body').ariaSnapshot();
    process.stderr.write(`\n--- ${page.url()}\n${seen.slice(0, SHOWN)}\n`);
  }
}
