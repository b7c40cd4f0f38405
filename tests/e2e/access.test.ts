import AxeBuilder from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';

import { startApp, type AppServer } from '../support/app-server';
import { EACH_SIZE, openBrowser, visit, type Visit } from '../support/browser';
import { fillSignIn, nextVerdict, openScenario, signIn, verdictOf } from './walk';

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
afterEach(async () => {
  await seen.context.close();
  expect(seen.problems).toEqual([]);
});

/** What axe finds that is serious or critical, told so that it can be found again. */
const barriers = async (page: Page): Promise<string[]> => {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .flatMap(({ id, nodes }) => nodes.map((node) => `${id}: ${node.html.slice(0, 160)} ${node.failureSummary ?? ''}`));
};

const LOOKS = EACH_SIZE.flatMap((size) => [{ size, dark: false }, { size, dark: true }]);

describe.each(LOOKS)('Every screen ($size, dark: $dark)', ({ size, dark }) => {
  beforeEach(async () => {
    seen = await visit(browser, size, { dark });
  });

  it('has nothing that bars anyone', async () => {
    const { page } = seen;
    await page.goto(app.url);
    await page.getByLabel('Password').waitFor();
    const found: Record<string, string[]> = { 'sign-in': await barriers(page) };
    await fillSignIn(page, 'designer');
    await page.waitForURL(/\/scenarios/);
    for (const [name, place] of [['list', '/scenarios'], ['parts', '/parts'], ['account', '/account']] as const) {
      await page.goto(`${app.url}${place}`);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await page.waitForLoadState('networkidle');
      found[name] = await barriers(page);
    }
    await page.goto(`${app.url}/parts`);
    await page.getByRole('link', { name: /Heron/ }).click();
    await page.getByText('Figures and their sources').waitFor();
    found.part = await barriers(page);
    await openScenario(page, app.url, /Instrument supply/);
    await verdictOf(page);
    for (const tab of await page.getByRole('tab').all()) {
      await tab.click();
      found[`scenario, ${await tab.getAttribute('aria-label')}`] = await barriers(page);
    }
    expect(Object.fromEntries(Object.entries(found).filter(([, list]) => list.length > 0))).toEqual({});
  }, 180_000);

  it('does not scroll sideways', async () => {
    await signIn(seen.page, app.url);
    for (const place of ['/scenarios', '/parts', '/account']) {
      await seen.page.goto(`${app.url}${place}`);
      await seen.page.waitForLoadState('networkidle');
      expect(await seen.page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)).toBe(0);
    }
  }, 60_000);
});

describe('The keyboard alone', () => {
  const tabTo = async (page: Page, name: RegExp) => {
    for (let press = 0; press < 120; press += 1) {
      await page.keyboard.press('Tab');
      const focused = await page.evaluate(() => {
        const element = document.activeElement;
        return `${element?.getAttribute('aria-label') ?? ''} ${element?.textContent ?? ''}`.trim();
      });
      if (name.test(focused)) return;
    }
    throw new Error(`Tab does not reach ${name}`);
  };

  it('is enough for the main job', async () => {
    seen = await visit(browser, 'wide');
    const { page } = seen;
    await page.goto(app.url);
    await page.getByLabel('E-mail address').waitFor();
    await tabTo(page, /^E-mail address/);
    await page.keyboard.type('designer@ninebar.example');
    await page.keyboard.press('Tab');
    await page.keyboard.type('quiet-estuary-lamp');
    await page.keyboard.press('Enter');
    await page.waitForURL(/\/scenarios\/[0-9a-f-]{36}/);
    const before = await verdictOf(page);
    await tabTo(page, /^Limiter/);
    await page.keyboard.press('ArrowRight');
    await page.keyboard.press('ArrowRight');
    await tabTo(page, /^Capacitance/);
    await page.keyboard.type('2m2');
    expect(await nextVerdict(page, before)).not.toBe(before);
    await tabTo(page, /^Bleeder/);
    await page.keyboard.type('4k7');
    await page.getByText('= 4.7 kΩ').waitFor();
  }, 60_000);
});
