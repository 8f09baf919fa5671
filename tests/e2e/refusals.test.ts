import { beforeAll, describe, expect, it } from 'vitest';
import { handIn, type HandedIn } from '#tests/factories/hand-in.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';
import { useE2e } from './setup/stage.ts';

const e2e = useE2e();
let site: WorkSite;
let batch: HandedIn;

beforeAll(async () => {
  const server = e2e.server();
  site = await createWorkSite(server, { planned: ['L-1'], number: '17' });
  const agent = await server.signIn(site.contractor);
  // Due 6.0 ft: half a foot short, one finding to decide.
  batch = await handIn(server, { site, agent, set: [setRow('L-1', { embedmentFt: 5.5 })] });
});

describe('a batch of another contractor', () => {
  it('is not found, and nothing of it is said', async () => {
    const stranger = await e2e.server().person('contractor');
    const { page, expectRefusal } = await e2e.openAs(stranger);
    expectRefusal(404, /^\/api\/batches\//);
    await page.goto(`/batches/${batch.id}`);
    await page.getByText('The batch was not found').waitFor();
    const seen = await page.locator('body').innerText();
    for (const secret of [batch.number, 'L-1', site.contractor.orgName]) expect(seen).not.toContain(secret);
    // The page stands in the shell: the way on is in sight.
    await page.getByRole('link', { name: 'Batches' }).first().click();
    await page.getByRole('heading', { name: 'Batches', level: 1 }).waitFor();
  });
});

describe('a decision on what somebody else has decided meanwhile', () => {
  it('is not kept; the newer state and what was typed are both shown, and it may be sent again', async () => {
    const server = e2e.server();
    const person = await server.person('inspector');
    const agent = await server.signIn(person);
    await agent.post(`/api/batches/${batch.id}/take`);
    const { page, expectRefusal } = await e2e.openAs(person, { to: `/review/${batch.id}` });
    expectRefusal(412, /\/decision$/);
    await page.getByRole('button', { name: 'Approve', exact: true }).click();
    const reason = 'The photograph reads 6.0 ft.';
    await page.getByLabel('What the photograph or field check shows').fill(reason);

    // The same person at another desk, or a colleague they share it with, is faster.
    const { body } = await agent.get(`/api/batches/${batch.id}/findings`);
    const [finding] = body.items as FindingRow[];
    const faster = await agent
      .put(`/api/findings/${finding?.id}/decision`)
      .set('If-Match', '"0"')
      .send({ decision: 'reject', action: 'rework', dueOn: '2099-05-11', reason: 'Half a foot short.' });
    expect(faster.status).toBe(200);

    const form = page.getByRole('form', { name: /^Approve:/ });
    await form.getByRole('button', { name: /^Approve/ }).click();
    await page.getByText('Changed by someone else meanwhile').waitFor();
    await page.getByText('Half a foot short.').first().waitFor();
    const typed = page.getByLabel('What the photograph or field check shows');
    expect(await typed.inputValue()).toBe(reason);

    await form.getByRole('button', { name: /^Approve/ }).click();
    await page.getByRole('button', { name: 'Undo' }).first().waitFor();
    const decided = await agent.get(`/api/batches/${batch.id}/findings`);
    expect(decided.body.items[0]).toMatchObject({
      state: 'approved',
      version: 2,
      decision: { decision: 'approve', grounds: 'evidence', reason },
    });
  });

  it('by another inspector is refused: the batch is held', async () => {
    const { page } = await e2e.openAs(await e2e.server().person('inspector'), { to: `/review/${batch.id}` });
    await page.getByRole('heading', { name: `Batch ${batch.number}` }).waitFor();
    await page.getByText('held by').waitFor();
    for (const word of ['Approve', 'Reject', 'Undo', 'Close review…', 'Take this batch'])
      expect([word, await page.getByRole('button', { name: word, exact: true }).count()]).toEqual([word, 0]);
  });
});
