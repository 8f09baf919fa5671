import { describe, it } from 'vitest';
import { readWorkbookBytes } from '#server/workbook/read-workbook-bytes.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { ONE_A_REASON, PARITY_REFUSED } from '#tests/fixtures/parity/refused.ts';
import { checkInBrowser } from './check-in-browser.ts';
import type { ParityStage } from './parity-stage.ts';

const EVERYWHERE = new Set(ONE_A_REASON.map(({ name }) => name));
const CASES = PARITY_REFUSED.map((file) => ({
  ...file,
  where: EVERYWHERE.has(file.name) ? 'browser, server, command line' : 'browser and the server’s reader',
}));

/** Every file that is refused as a whole: in the browser as by the server's reader; one a reason by all three programs. */
export function compareRefused(stage: () => ParityStage): void {
  describe.concurrent('refused', () => {
    it.for(CASES)('$name: alike in $where', async ({ name, bytes, code }, { expect }) => {
      const { good, page, url, context, agent, byCommandLine, onTheServer } = stage();
      const file = bytes(good);
      const all = EVERYWHERE.has(name);
      const [{ end }, refused, document, batch] = await Promise.all([
        checkInBrowser(page, { url, bytes: file, context }),
        readWorkbookBytes(file).then(
          () => null,
          (error: unknown) => error,
        ),
        all ? byCommandLine(file) : null,
        // A form has no file without bytes.
        all && file.length > 0 ? onTheServer(file) : null,
      ]);
      if (!(refused instanceof WorkbookRefused)) throw new Error('The server’s reader took it.');
      const detail = refusalText(refused);
      expect(refused.code).toBe(code);
      expect(end).toEqual({ type: 'refused', code, params: refused.params, detail });
      if (all) expect(document).toEqual({ problem: { code, detail } });
      if (!batch) return;
      const { body } = await agent.get(`${batch.path}/check`);
      expect(body).toMatchObject({ state: 'failed', problem: { code: `workbook.${code}`, detail } });
    });
  });
}
