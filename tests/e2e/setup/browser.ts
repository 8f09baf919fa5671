import { existsSync } from 'node:fs';
import { chromium, type Browser } from 'playwright-core';

/** Debian's Chromium. A machine without one fails: what cannot be tried is not fine. */
export function startBrowser(): Promise<Browser> {
  const executablePath = process.env['CHROMIUM_PATH'] ?? process.env['CHROMIUM'] ?? '/usr/bin/chromium';
  if (!existsSync(executablePath))
    throw new Error(
      `The browser tests need Chromium, and there is none at ${executablePath}. Install it, or set CHROMIUM_PATH.`,
    );
  return chromium.launch({
    executablePath,
    // Root, as in a container, may not use Chromium's own sandbox; the pages are our own.
    chromiumSandbox: process.getuid?.() !== 0,
    args: ['--disable-dev-shm-usage'],
  });
}
