import type { Browser } from 'playwright-core';

import { startApp, type AppServer } from '../support/app-server';
import { EACH_SIZE, openBrowser, visit, type Visit } from '../support/browser';
import { nextVerdict, openBlock, openScenario, saved, signIn, verdictOf } from './walk';

let app: AppServer;
let browser: Browser;
let seen: Visit;

afterEach(async () => {
  await seen.context.close();
  expect(seen.problems).toEqual([]);
});

describe.each(EACH_SIZE)('The main job at %s size', (size) => {
  // A product of its own for each size: what one has changed and saved must not be there for the other.
  beforeAll(async () => {
    [app, browser] = await Promise.all([startApp(), openBrowser()]);
  }, 120_000);
  afterAll(async () => {
    await browser.close();
    await app.stop();
  });
  beforeEach(async () => {
    seen = await visit(browser, size);
  });

  it('begins with a design that passes cold and fails when power comes back', async () => {
    await signIn(seen.page, app.url);
    await seen.page.waitForURL(/\/scenarios\/[0-9a-f-]{36}/);
    expect(await verdictOf(seen.page)).toMatch(/^Over rating\. Hot restart draws/);
    const cold = seen.page.getByRole('button', { name: /Peak current, cold start/ });
    expect(await cold.getAttribute('aria-label')).toMatch(/^(Pass|Caution)/);
  }, 60_000);

  it('changes the limiter and sees another verdict', async () => {
    await signIn(seen.page, app.url);
    await openScenario(seen.page, app.url, /Tool charger/);
    const before = await verdictOf(seen.page);
    await openBlock(seen.page, /^Limiter/);
    await seen.page.getByRole('button', { name: 'Change the part' }).click();
    const dialog = seen.page.getByRole('dialog');
    await dialog.getByLabel('Search parts').fill('Lapwing');
    await dialog.getByRole('button', { name: /Take .*Lapwing/ }).click();
    expect(await nextVerdict(seen.page, before)).not.toBe(before);
    await seen.page.getByRole('button', { name: 'Undo' }).click();
    await nextVerdict(seen.page, await verdictOf(seen.page)).catch(() => undefined);
  }, 60_000);

  it('takes 470u and 4k7 where they fit, echoes them, and the verdict follows', async () => {
    await signIn(seen.page, app.url);
    await openScenario(seen.page, app.url, /Door controller/);
    const before = await verdictOf(seen.page);
    await openBlock(seen.page, /^Bulk capacitor/);
    await seen.page.getByLabel('Capacitance', { exact: true }).fill('470u');
    expect(await nextVerdict(seen.page, before)).not.toBe(before);
    await seen.page.getByText('= 470 µF').waitFor();
    await seen.page.getByLabel('Bleeder across the bus').fill('4k7');
    await seen.page.getByText('= 4.7 kΩ').waitFor();
    await saved(seen.page);
    await seen.page.reload();
    await openBlock(seen.page, /^Bulk capacitor/);
    expect(await seen.page.getByLabel('Bleeder across the bus').inputValue()).toBe('4.7k');
    expect(await seen.page.getByLabel('Capacitance', { exact: true }).inputValue()).toBe('470µ');
  }, 60_000);

  it('flags a pulse above the energy rating of the part', async () => {
    await signIn(seen.page, app.url);
    await openScenario(seen.page, app.url, /energy at high line/);
    const energy = seen.page.getByRole('button', { name: /Limiter energy, single pulse/ });
    expect(await energy.getAttribute('aria-label')).toMatch(/^Fail/);
    expect(await verdictOf(seen.page)).toMatch(/^Over rating/);
  }, 60_000);
});
