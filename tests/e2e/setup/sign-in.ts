import type { Page } from 'playwright-core';
import type { Actor } from '#shared/permissions/ability.ts';
import { PASSWORD } from '#tests/factories/people.ts';

/** Through the sign-in page, as a person does; ends on the page that was asked for. */
export async function signIn(page: Page, who: Actor, options: { to?: string } = {}): Promise<void> {
  await page.goto(options.to ?? '/');
  await fillSignIn(page, { email: who.email, password: PASSWORD });
  await page.getByRole('button', { name: new RegExp(who.name) }).waitFor();
}

export async function fillSignIn(page: Page, who: { email: string; password: string }): Promise<void> {
  await page.getByLabel('E-mail address').fill(who.email);
  await page.getByLabel('Password').fill(who.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}
