import type { Browser, BrowserContextOptions, ConsoleMessage, Page } from 'playwright-core';

export type GuardedPage = {
  readonly page: Page;
  /** A refusal that the test provokes: the browser writes each to its console. */
  readonly expectRefusal: (status: number, path: RegExp) => void;
  /** What went wrong on the page since this was last asked. Empty in a test that passes. */
  readonly faults: () => string[];
  readonly close: () => Promise<void>;
};

const LOCAL = /^(?:https?:\/\/127\.0\.0\.1(?::\d+)?\/|data:|blob:|about:)/;
const REFUSED = /^Failed to load resource: the server responded with a status of (\d{3})/;

/** A page of a browser session of its own that notes console errors, page errors and requests beyond loopback. */
export async function openPage(
  browser: Browser,
  options: { url: string } & BrowserContextOptions,
): Promise<GuardedPage> {
  const { url, ...rest } = options;
  const context = await browser.newContext({
    baseURL: url,
    viewport: { width: 1440, height: 900 },
    locale: 'en-US',
    timezoneId: 'America/Chicago',
    // Nothing of the tests is about motion, and a page that still moves cannot be judged.
    reducedMotion: 'reduce',
    ...rest,
  });
  context.setDefaultTimeout(15_000);
  const faults: string[] = [];
  const refusals: { status: number; path: RegExp }[] = [];
  // The session is asked for before anybody has signed in.
  refusals.push({ status: 401, path: /^\/api\/session$/ });

  const isExpected = (message: ConsoleMessage): boolean => {
    const status = Number(REFUSED.exec(message.text())?.[1]);
    const from = message.location().url;
    const path = URL.canParse(from) ? new URL(from).pathname : '';
    return refusals.some((one) => one.status === status && one.path.test(path));
  };
  context.on('console', (message) => {
    if (message.type() !== 'error' && message.type() !== 'warning') return;
    if (!isExpected(message))
      faults.push(`console ${message.type()}: ${message.text()} ${message.location().url}`);
  });
  context.on('weberror', (error) =>
    faults.push(`page error: ${error.error().stack ?? error.error().message}`),
  );
  context.on('request', (request) => {
    if (!LOCAL.test(request.url())) faults.push(`request beyond loopback: ${request.url()}`);
  });
  const page = await context.newPage();
  return {
    page,
    expectRefusal: (status, path) => void refusals.push({ status, path }),
    faults: () => faults.splice(0),
    close: () => context.close(),
  };
}
