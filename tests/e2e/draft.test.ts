import type { Browser } from 'playwright-core';

import { startApp, type AppServer } from '../support/app-server';
import { openBrowser, visit, type Visit } from '../support/browser';
import { openBlock, openScenario, saved, signIn } from './walk';

const EXPECTED = /status of (401|409)|ERR_INTERNET_DISCONNECTED/;

let app: AppServer;
let browser: Browser;
const visits: Visit[] = [];

const enter = async (who: 'designer' | 'tester' = 'designer') => {
  const seen = await visit(browser, 'wide', { expected: EXPECTED });
  visits.push(seen);
  await signIn(seen.page, app.url, who);
  return seen;
};

beforeAll(async () => {
  [app, browser] = await Promise.all([startApp(), openBrowser()]);
}, 120_000);
afterAll(async () => {
  await browser.close();
  await app.stop();
});
afterEach(async () => {
  const problems = visits.flatMap((seen) => seen.problems);
  await Promise.all(visits.splice(0).map(({ context }) => context.close()));
  expect(problems).toEqual([]);
});

describe('A draft', () => {
  it('says what is wrong with a figure, with an example, and is saved once it is right', async () => {
    const { page } = await enter();
    await openScenario(page, app.url, /Door controller/);
    await openBlock(page, /^Bulk capacitor/);
    const field = page.getByLabel('Capacitance', { exact: true });
    await field.fill('470 mm');
    await page.getByText(/write for example 470u/).first().waitFor();
    await page.getByText(/kept here, 1 field to correct/).waitFor();
    await field.fill('330u');
    await saved(page);
  }, 60_000);

  it('keeps an edit made without a connection, through a closed page, and sends it', async () => {
    const { page, context } = await enter();
    await openScenario(page, app.url, /Meter supply/);
    const address = page.url();
    await openBlock(page, /^Bulk capacitor/);
    const field = page.getByLabel('Bleeder across the bus');
    await field.focus();
    await page.waitForTimeout(1000);
    await context.setOffline(true);
    await field.fill('220k');
    await page.getByText('Not connected').waitFor();
    await page.getByText(/kept here until connected/).waitFor();
    await context.setOffline(false);
    await saved(page);
    const other = await enter('tester');
    await other.page.goto(address);
    await openBlock(other.page, /^Bulk capacitor/);
    expect(await other.page.getByLabel('Bleeder across the bus').inputValue()).toBe('220k');
  }, 60_000);

  it('is there again after a reload in the middle of typing', async () => {
    const { page } = await enter();
    await openScenario(page, app.url, /Meter supply/);
    await openBlock(page, /^Bulk capacitor/);
    await page.getByLabel('Voltage before switch-on', { exact: true }).fill('12 x');
    page.on('dialog', (dialog) => void dialog.accept());
    await page.reload();
    await openBlock(page, /^Bulk capacitor/);
    expect(await page.getByLabel('Voltage before switch-on', { exact: true }).inputValue()).toBe('12 x');
    await page.getByLabel('Voltage before switch-on', { exact: true }).fill('12');
    await saved(page);
  }, 60_000);

  it('that two people change is overwritten by neither', async () => {
    const first = await enter();
    await openScenario(first.page, app.url, /Outdoor lamp/);
    const second = await enter('tester');
    await second.page.goto(first.page.url());
    await openBlock(first.page, /^Bulk capacitor/);
    await openBlock(second.page, /^Bulk capacitor/);
    await second.page.getByLabel('Voltage before switch-on', { exact: true }).fill('2');
    await saved(second.page);
    await first.page.getByLabel('Voltage before switch-on', { exact: true }).fill('3');
    await first.page.getByText(/saved this scenario at/).waitFor();
    await first.page.getByRole('button', { name: 'Compare' }).click();
    await first.page.getByText('mine 3 V, theirs 2 V').waitFor();
    await first.page.getByRole('radio', { name: 'Theirs' }).click();
    await first.page.getByRole('button', { name: 'Go on with these' }).click();
    await saved(first.page);
    expect(await first.page.getByLabel('Voltage before switch-on', { exact: true }).inputValue()).toBe('2');
  }, 60_000);
});
