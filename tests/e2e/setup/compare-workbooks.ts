import { describe, it } from 'vitest';
import type { FindingRow } from '#shared/generated/api-types.ts';
import { findingsOf, recordsOf } from '#tests/factories/start-batch.ts';
import { PARITY_WORKBOOKS } from '#tests/fixtures/parity/workbooks.ts';
import { checkInBrowser } from './check-in-browser.ts';
import type { ParityStage } from './parity-stage.ts';
import { findingRows, recordRows } from './parity-rows.ts';

export type Report = {
  readonly records: readonly object[];
  readonly findings: readonly FindingRow[];
  readonly skipped: readonly { readonly code: string; readonly reason: string }[];
};

/** Every workbook that is read, on the order's own context. */
export function compareWorkbooks(stage: () => ParityStage): void {
  describe.concurrent('a workbook', () => {
    it.for(PARITY_WORKBOOKS)(
      '$name: alike in the browser, on the server and on the command line',
      async (workbook, { expect }) => {
        const { page, url, context, site, agent, byCommandLine, onTheServer } = stage();
        const bytes = await workbook.make(site);
        const [{ lines, end }, document, batch] = await Promise.all([
          checkInBrowser(page, { url, bytes, context }),
          byCommandLine(bytes),
          onTheServer(bytes),
        ]);
        if (end.type !== 'done') throw new Error(`The browser ended with ${JSON.stringify(end)}.`);
        const found = [...lines.flatMap(({ findings }) => findings), ...end.loose];
        expect(lines).toHaveLength(workbook.lines);
        expect(found.map(({ code }) => code)).toEqual(expect.arrayContaining([...workbook.finds]));

        const report = document as Report;
        expect(findingRows(report.findings)).toEqual(findingRows(found));
        expect(recordRows(report.records)).toEqual(recordRows(lines));
        expect(report.skipped).toEqual(end.notRun.map(({ title: _title, ...one }) => one));

        const onServer = await findingsOf(agent, batch);
        // What the browser says that it left to the server is the server's alone; all else is the same.
        const left = new Set(
          end.notRun.flatMap(({ code, reason }) => (reason === 'own-only' || reason === 'off' ? [] : [code])),
        );
        expect(findingRows(onServer.filter(({ code }) => !left.has(code)))).toEqual(findingRows(found));
        expect(recordRows(await recordsOf(agent, batch))).toEqual(recordRows(lines));
      },
    );
  });
}
