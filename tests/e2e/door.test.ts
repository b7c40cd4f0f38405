import type { Browser } from 'playwright-core';

import { startApp, type AppServer } from '../support/app-server';
import { openBrowser, visit, type Visit } from '../support/browser';
import { fillSignIn, openBlock, openScenario, signIn } from './walk';

let app: AppServer;
let browser: Browser;
let seen: Visit;

beforeAll(async () => {
  [app, browser] = await Promise.all([startApp(), openBrowser()]);
}, 120_000);
afterAll(async () => {
  await browser.close();
  await app.stop();
});
beforeEach(async () => {
  seen = await visit(browser, 'wide');
});
afterEach(async () => {
  await seen.context.close();
  expect(seen.problems).toEqual([]);
});

describe('The door', () => {
  it('does not open to a wrong password, and says what to do', async () => {
    await seen.page.goto(app.url);
    await fillSignIn(seen.page, 'designer', 'not the password');
    await seen.page.getByText(/do not belong together/).waitFor();
    expect(seen.page.url()).toContain('/sign-in');
  }, 60_000);

  it('leads on to the address that was wanted', async () => {
    await seen.page.goto(`${app.url}/parts`);
    await seen.page.waitForURL(/\/sign-in\?to=/);
    await fillSignIn(seen.page, 'designer');
    await seen.page.waitForURL(/\/parts$/);
    await seen.page.getByRole('heading', { name: 'Parts', level: 1 }).waitFor();
  }, 60_000);

  it('shows a new person the worked scenario once, then the list', async () => {
    await signIn(seen.page, app.url);
    await seen.page.waitForURL(/\/scenarios\/[0-9a-f-]{36}/);
    await seen.page.goto(app.url);
    await seen.page.waitForURL(/\/scenarios$/);
  }, 60_000);

  it('closes behind who signs out', async () => {
    await signIn(seen.page, app.url);
    await seen.page.goto(`${app.url}/account`);
    await seen.page.getByRole('button', { name: 'Sign out' }).click();
    await seen.page.waitForURL(/\/sign-in/);
    await seen.page.goto(`${app.url}/scenarios`);
    await seen.page.waitForURL(/\/sign-in\?to=/);
  }, 60_000);

  it('lets a reviewer read and not write, and says why', async () => {
    await signIn(seen.page, app.url, 'reviewer');
    await openScenario(seen.page, app.url, /Door controller/);
    await openBlock(seen.page, /^Bulk capacitor/);
    await seen.page.getByText(/Read only: your role reads scenarios/).waitFor();
    expect(await seen.page.getByLabel('Capacitance', { exact: true }).isEditable()).toBe(false);
    expect(await seen.page.getByRole('button', { name: 'Undo' }).count()).toBe(0);
  }, 60_000);

  it('says at an unknown address that nothing is there', async () => {
    await signIn(seen.page, app.url);
    await seen.page.goto(`${app.url}/scenarios/00000000-0000-4000-8000-000000000000`);
    await seen.page.getByText(/Nothing is here, or it belongs to another team/).waitFor();
    seen.problems.splice(0, seen.problems.length, ...seen.problems.filter((one) => !/status of 404/.test(one)));
  }, 60_000);
});
