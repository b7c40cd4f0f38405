import type { Page } from 'playwright-core';

import { DEMO_ACCOUNTS, DEMO_PASSWORD } from '../../server/demo/accounts';

type Who = 'designer' | 'reviewer' | 'tester';

const emailOf = (who: Who): string => {
  const account = DEMO_ACCOUNTS.find(({ email }) => email.startsWith(`${who}@`));
  if (!account) throw new Error(`the demo team has no ${who}`);
  return account.email;
};

export const fillSignIn = async (page: Page, who: Who, password = DEMO_PASSWORD) => {
  await page.getByLabel('E-mail address').fill(emailOf(who));
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
};

/** Signs in and waits until the first place is there. */
export const signIn = async (page: Page, url: string, who: Who = 'designer') => {
  await page.goto(url);
  await fillSignIn(page, who);
  await page.waitForURL(/\/scenarios/);
};

/** The verdict as a screen reader hears it; waits until the result belongs to the last edit. */
export const verdictOf = async (page: Page): Promise<string> => {
  const live = page.locator('[role="status"][aria-live="polite"]').filter({ hasText: /rating|assessed/ });
  await live.first().waitFor({ state: 'attached' });
  return (await live.first().textContent()) ?? '';
};

/** The verdict once it is another than before. */
export const nextVerdict = async (page: Page, before: string): Promise<string> => {
  await page.waitForFunction((old) => {
    const texts = Array.from(document.querySelectorAll('[role="status"][aria-live="polite"]')).map((one) => one.textContent ?? '');
    return texts.some((text) => /rating|assessed/.test(text) && text !== old);
  }, before);
  return verdictOf(page);
};

/** Opens the fields of a block of the path. */
export const openBlock = (page: Page, name: RegExp) => page.getByRole('tab', { name }).click();

/** Opens a scenario of the list by its name. */
export const openScenario = async (page: Page, url: string, name: string | RegExp) => {
  await page.goto(`${url}/scenarios`);
  await page.getByRole('link', { name }).first().click();
  await page.waitForURL(/\/scenarios\/[0-9a-f-]{36}/);
  await page.getByRole('tab').first().waitFor();
};

export const saved = (page: Page) => page.getByText(/draft \d+, saved/).waitFor();
