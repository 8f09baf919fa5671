import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { runCheck } from '#scripts/check-workbook/run-check.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import { startBatch, type HandedIn } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { PARITY_WORKBOOKS } from '#tests/fixtures/parity/workbooks.ts';
import type { Agent } from '#tests/setup/api-harness.ts';
import { workerUrl } from './check-in-browser.ts';
import type { Server } from './server.ts';
import type { E2e } from './stage.ts';

/** What all comparisons of a file share: one server, one page, one order. */
export type ParityStage = {
  readonly server: Server;
  readonly site: WorkSite;
  readonly agent: Agent;
  readonly page: Page;
  /** Of the worker. */
  readonly url: string;
  readonly context: CheckContextData;
  readonly folder: string;
  /** A workbook that is read. */
  readonly good: Buffer;
  readonly contextOf: (orderId: string) => Promise<CheckContextData>;
  readonly onTheServer: (bytes: Buffer) => Promise<HandedIn>;
  /** The command line's document. */
  readonly byCommandLine: (bytes: Buffer) => Promise<unknown>;
  readonly end: () => Promise<void>;
};

export async function makeParityStage(e2e: E2e): Promise<ParityStage> {
  const server = e2e.server();
  // The demo's order, so that its own workbook is one of these.
  const site = await createWorkSite(server, {
    number: '17',
    planned: ['L-1', 'L-2', 'L-3', '17-0414', '17-0423'],
  });
  const agent = await server.signIn(site.contractor);
  const { page } = await e2e.openAs(site.contractor, { to: `/work-orders/${site.order.id}/check?tab=line` });
  const url = await workerUrl(page);
  // As the page itself asks for it.
  const contextOf = (orderId: string) =>
    page.evaluate(async (path) => {
      const reply = await fetch(path);
      return (await reply.json()) as CheckContextData;
    }, `/api/work-orders/${orderId}/check-context`);
  const context = await contextOf(site.order.id);
  const folder = await mkdtemp(join(tmpdir(), 'upstand-parity-'));
  const contextFile = join(folder, 'context.json');
  await writeFile(contextFile, JSON.stringify(context));
  const [first] = PARITY_WORKBOOKS;
  if (!first) throw new Error('There is no workbook to compare.');
  let files = 0;
  return {
    server,
    site,
    agent,
    page,
    url,
    context,
    folder,
    good: await first.make(site),
    contextOf,
    onTheServer: async (bytes) => {
      const batch = await startBatch(agent, site);
      const reply = await agent.put(`${batch.path}/workbook`).attach('workbook', bytes, 'batch.xlsx');
      expect([reply.status, reply.text.slice(0, 200)]).toEqual([202, expect.any(String)]);
      await server.drain();
      return batch;
    },
    byCommandLine: async (bytes) => {
      files += 1;
      const path = join(folder, `batch-${files}.xlsx`);
      await writeFile(path, bytes);
      const { stdout } = await runCheck([path, '--json', '--context', contextFile]);
      return JSON.parse(stdout) as unknown;
    },
    end: () => rm(folder, { recursive: true, force: true }),
  };
}
