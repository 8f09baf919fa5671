/** A step of the check in a process of its own, nothing handed over: `read` the cells, or `records` made of them as well. */
import { readFile } from 'node:fs/promises';
import { readWorkbookBytes } from '#server/workbook/read-workbook-bytes.ts';

const [step, path = ''] = process.argv.slice(2);
const workbook = await readWorkbookBytes(await readFile(path));
if (step === 'records') {
  const { readSource } = await import('#shared/workbook/read-source.ts');
  const { prepare } = await import('#shared/check/prepare.ts');
  const { clockOf } = await import('#shared/check/instants.ts');
  const { DEMO_CONTEXT } = await import('#shared/check/demo-context.ts');
  prepare(readSource(workbook), DEMO_CONTEXT, clockOf(DEMO_CONTEXT.zone));
}
