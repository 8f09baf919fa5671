import { beforeAll, describe, expect, it } from 'vitest';
import { run } from '#server/db/rows.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { PASSWORD } from '#tests/factories/people.ts';
import { uploadLines } from '#tests/factories/hand-in.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { startBatch } from '#tests/factories/start-batch.ts';
import { createWorkSite } from '#tests/factories/work-site.ts';
import { fillSignIn } from './setup/sign-in.ts';
import { useE2e } from './setup/stage.ts';

/** As many wrong passwords as an account bears in a quarter of an hour. */
const FAILURES = 8;
const e2e = useE2e();
let inspector: Actor;
beforeAll(async () => {
  inspector = await e2e.server().person('inspector');
});

describe('signing in', () => {
  it('leads back to the address that was asked for, and out again', async () => {
    const { page } = await e2e.openAs(inspector, { to: '/nonconformities?rule=embedment-short' });
    await page.getByRole('heading', { name: 'Nonconformities', level: 1 }).waitFor();
    expect(new URL(page.url()).search).toBe('?rule=embedment-short');
    await page.getByRole('button', { name: new RegExp(inspector.name) }).click();
    await page.getByRole('menuitem', { name: 'Sign out' }).click();
    await page.getByRole('button', { name: 'Sign in' }).waitFor();
    await page.goto('/nonconformities');
    await page.getByRole('button', { name: 'Sign in' }).waitFor();
    expect(await page.getByRole('heading', { name: 'Nonconformities' }).count()).toBe(0);
  });

  it('says that a password is wrong and keeps what was typed; after too many it asks to wait', async () => {
    const { page, expectRefusal } = await e2e.open();
    expectRefusal(429, /^\/api\/session$/);
    const person = await e2e.server().person('clerk');
    await page.goto('/sign-in');
    const attempt = async (password: string): Promise<number> => {
      const answer = page.waitForResponse((reply) => reply.request().method() === 'POST');
      await fillSignIn(page, { email: person.email, password });
      return (await answer).status();
    };
    for (let nth = 0; nth < FAILURES; nth++) expect(await attempt('not this one')).toBe(401);
    await page.getByText('The e-mail address or the password is not right.').waitFor();
    expect(await page.getByLabel('E-mail address').inputValue()).toBe(person.email);
    expect(await attempt(PASSWORD)).toBe(429);
    await page.getByText(/Too many/i).waitFor();
    expect(page.url()).toContain('/sign-in');
  });
});

describe('a session that ends while somebody writes', () => {
  it('gives back the page and what was typed, and the answer goes through', async () => {
    const server = e2e.server();
    const site = await createWorkSite(server, { planned: ['L-1'], number: '21' });
    const agent = await server.signIn(site.contractor);
    const batch = await startBatch(agent, site);
    // Due 6.0 ft: half a foot short.
    await uploadLines(server, { site, agent, batchId: batch.id, set: [setRow('L-1', { embedmentFt: 5.5 })] });

    const { page, expectRefusal } = await e2e.openAs(site.contractor, { to: `/batches/${batch.id}` });
    expectRefusal(401, /^\/api\//);
    await page.getByRole('button', { name: /Answer in writing/ }).click();
    const words = 'Rock at 5.5 ft; the photograph shows the bit.';
    await page.getByLabel('Your answer').fill(words);
    await run(server.em(), 'delete from sessions');
    await page.getByRole('button', { name: 'Keep this answer' }).click();

    const dialog = page.getByRole('dialog', { name: 'Your session has ended' });
    await dialog.waitFor();
    expect(await dialog.getByLabel('E-mail address').inputValue()).toBe(site.contractor.email);
    await dialog.getByLabel('Password').fill(PASSWORD);
    await dialog.getByRole('button', { name: 'Sign in' }).click();
    await dialog.waitFor({ state: 'hidden' });
    await page.getByRole('blockquote').getByText(words).waitFor();
    const again = await server.signIn(site.contractor);
    const { body } = await again.get(`${batch.path}/findings`);
    expect(body.items.map((one: { answer: { text: string } | null }) => one.answer?.text ?? null)).toContain(
      words,
    );
  });
});
