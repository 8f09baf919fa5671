import { execFile } from 'node:child_process';
import { writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, it } from 'vitest';
import type { OrderContextData } from '#shared/check/context-from-data.ts';
import { RULES } from '#shared/rules/registry.ts';
import { findingsOf, recordsOf } from '#tests/factories/start-batch.ts';
import { CLEAN, EVERY_FINDING, EVERY_ROW, everyRuleWorkbook } from '#tests/fixtures/parity/every-rule.ts';
import { checkInBrowser, type BrowserCheck } from './check-in-browser.ts';
import type { Report } from './compare-workbooks.ts';
import { checkedAt, makeEveryRuleSite } from './every-rule-site.ts';
import { placedFigures } from './placed-figures.ts';
import type { ParityStage } from './parity-stage.ts';
import { findingRows, recordRows } from './parity-rows.ts';

const ROOT = fileURLToPath(new URL('../../../', import.meta.url));
/** Some of the lines are of April, when the owner asked for no brands. */
const OFF = { code: 'brand-differs', reason: 'off' };
/** What the route tells no contractor before hand-in, and the rules that therefore do not run, or on its own alone. */
const NOT_TOLD = [
  OFF,
  { code: 'lot-overdrawn', reason: 'no-lot-use' },
  { code: 'position-shared', reason: 'own-only' },
  { code: 'already-on-record', reason: 'own-only' },
  { code: 'changed-to-pass', reason: 'no-earlier-check' },
  ...['missing', 'reused', 'alike', 'elsewhen', 'elsewhere', 'undated', 'small'].map((what) => ({
    code: `photo-${what}`,
    reason: 'no-photos',
  })),
];
const LEFT_TO_SERVER = new Set(NOT_TOLD.flatMap((one) => (one === OFF ? [] : [one.code])));

type Spawned = { readonly code: unknown; readonly stdout: string; readonly stderr: string };
const npmCheck = (files: readonly string[]): Promise<Spawned> =>
  new Promise((resolve) => {
    const args = ['run', '-s', 'check', '--', ...files];
    execFile('npm', args, { cwd: ROOT, maxBuffer: 2 ** 28 }, (error, stdout, stderr) =>
      resolve({ code: error ? error.code : 0, stdout, stderr }),
    );
  });

const doneIn = ({ lines, end }: BrowserCheck) => {
  if (end.type !== 'done') throw new Error(`The browser ended with ${JSON.stringify(end)}.`);
  return {
    lines,
    found: [...lines.flatMap(({ findings }) => findings), ...end.loose],
    notRun: end.notRun.map(({ code, reason }) => ({ code, reason })),
  };
};

type Compared = {
  readonly server: { readonly findings: readonly object[]; readonly records: readonly object[] };
  readonly browser: ReturnType<typeof doneIn>;
  /** In the browser, on no more than the page is told before hand-in. */
  readonly routeFed: ReturnType<typeof doneIn>;
  readonly cli: Spawned;
  readonly report: Report;
  readonly asOf: string;
};

async function everywhere({ agent, page, url, contextOf, folder, ...stage }: ParityStage): Promise<Compared> {
  const { site, batch, beside } = await makeEveryRuleSite(stage.server, { agent, site: stage.site });
  const bytes = await everyRuleWorkbook(site);
  const reply = await agent.put(`${batch.path}/workbook`).attach('workbook', bytes, 'batch.xlsx');
  if (reply.status !== 202) throw new Error(`The workbook was refused: ${reply.text}`);
  await stage.server.drain();
  const server = { findings: await findingsOf(agent, batch), records: await recordsOf(agent, batch) };
  const asOf = await checkedAt(stage.server, batch);
  // One "now" for all of them: a time that is still to come is told with it.
  const told = { ...(await contextOf(site.order.id)), asOf };
  const whole: OrderContextData = { ...told, ...beside };
  const [workbook, context] = [join(folder, 'every-rule.xlsx'), join(folder, 'every-rule.json')];
  await writeFile(workbook, bytes);
  await writeFile(context, JSON.stringify(whole));
  const [cli, browser, routeFed] = await Promise.all([
    npmCheck([workbook, '--json', '--context', context]),
    checkInBrowser(page, { url, bytes, context: whole }),
    checkInBrowser(page, { url, bytes, context: told }),
  ]);
  return {
    server,
    browser: doneIn(browser),
    routeFed: doneIn(routeFed),
    cli,
    report: JSON.parse(cli.stdout) as Report,
    asOf,
  };
}

/**
 * The mixed workbook with a failing line for every rule and a clean one of each kind. It is begun with the file and held
 * against the literals at its end, so that its many steps fall between those of the other comparisons.
 */
export function compareEveryRule(stage: () => ParityStage): void {
  let begun: Promise<Compared>;
  beforeAll(() => {
    begun = everywhere(stage());
    // Told where it is awaited.
    begun.catch(() => null);
  });

  describe('one line for every rule’s failing side, and a clean line of each kind', () => {
    let server: Compared['server'];
    let browser: Compared['browser'];
    let routeFed: Compared['routeFed'];
    let cli: Compared['cli'];
    let report: Report;
    let asOf: string;
    beforeAll(async () => {
      ({ server, browser, routeFed, cli, report, asOf } = await begun);
    }, 240_000);

    it('has every rule of the registry', () => {
      const failing = new Set(EVERY_FINDING.map(({ code }) => code));
      expect(RULES.flatMap(({ code }) => (failing.has(code) ? [] : [code]))).toEqual([]);
    });

    it('gives exactly the expected findings on the server', () => {
      expect(placedFigures(server.findings)).toEqual(placedFigures(EVERY_FINDING, asOf));
    });

    it('gives exactly the expected findings on the command line, which ends with 1', () => {
      expect({ code: cli.code, stderr: cli.stderr }).toEqual({ code: 1, stderr: '' });
      expect(placedFigures(report.findings)).toEqual(placedFigures(EVERY_FINDING, asOf));
      expect(report.skipped.map(({ code, reason }) => ({ code, reason }))).toEqual([OFF]);
    });

    it('gives exactly the expected findings in the browser', () => {
      expect(placedFigures(browser.found)).toEqual(placedFigures(EVERY_FINDING, asOf));
      expect(browser.notRun).toEqual([OFF]);
    });

    it('finds nothing on the clean lines', () => {
      const clean = new Set<unknown>(Object.values(CLEAN));
      for (const found of [server.findings, report.findings, browser.found])
        expect(found.filter((one) => 'structureNumber' in one && clean.has(one.structureNumber))).toEqual([]);
    });

    it('is the same finding by finding and word by word on all three', () => {
      expect(findingRows(report.findings)).toEqual(findingRows(browser.found));
      expect(findingRows(server.findings)).toEqual(findingRows(browser.found));
    });

    it('computes the same records on all three', () => {
      expect(browser.lines).toHaveLength(EVERY_ROW.length);
      expect(recordRows(report.records)).toEqual(recordRows(browser.lines));
      expect(recordRows(server.records)).toEqual(recordRows(browser.lines));
    });

    it('is the same on what the page is told before hand-in, but for the rules that it names', () => {
      expect(routeFed.notRun).toEqual(NOT_TOLD);
      expect(findingRows(routeFed.found)).toEqual(
        findingRows(browser.found.filter(({ code }) => !LEFT_TO_SERVER.has(code))),
      );
      expect(recordRows(routeFed.lines)).toEqual(recordRows(browser.lines));
    });
  });
}
