import { afterAll, beforeAll } from 'vitest';
import { compareEveryRule } from './setup/compare-every-rule.ts';
import { compareRefused } from './setup/compare-refused.ts';
import { compareWorkbooks } from './setup/compare-workbooks.ts';
import { makeParityStage, type ParityStage } from './setup/parity-stage.ts';
import { useE2e } from './setup/stage.ts';

/** Browser, server and command line on the same workbooks: one server and one page for all of them. */

const e2e = useE2e();
let made: ParityStage | null = null;
const stage = (): ParityStage => {
  if (!made) throw new Error('The stage is not made yet.');
  return made;
};
beforeAll(async () => {
  made = await makeParityStage(e2e);
}, 240_000);
afterAll(() => made?.end());

compareWorkbooks(stage);
compareRefused(stage);
compareEveryRule(stage);
