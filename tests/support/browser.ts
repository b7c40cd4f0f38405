import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';

/** The two sizes that the product is drawn for. */
export const SIZES = {
  phone: { width: 390, height: 844 },
  wide: { width: 1440, height: 900 },
} as const;
export type Size = keyof typeof SIZES;
export const EACH_SIZE = Object.keys(SIZES) as Size[];

/** That nobody is signed in is an answer (401), which the browser nevertheless logs as a failed load. */
const EXPECTED = /status of 401/;

/** Chromium without its sandbox where it runs as root, which it otherwise refuses. */
export const openBrowser = (): Promise<Browser> =>
  chromium.launch({ executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium', args: process.getuid?.() === 0 ? ['--no-sandbox'] : [] });

export interface Visit {
  page: Page;
  context: BrowserContext;
  /** Errors on the console, thrown errors and violations of the content policy, as they came. */
  problems: string[];
}

/** A browser window of one person. */
export const visit = async (browser: Browser, size: Size, { dark = false, expected = EXPECTED }: { dark?: boolean; expected?: RegExp } = {}): Promise<Visit> => {
  const phone = size === 'phone';
  const context = await browser.newContext({ viewport: SIZES[size], colorScheme: dark ? 'dark' : 'light', isMobile: phone, hasTouch: phone, reducedMotion: 'reduce' });
  const page = await context.newPage();
  const problems: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error' && !expected.test(message.text())) problems.push(message.text());
  });
  page.on('pageerror', (error) => problems.push(error.message));
  return { page, context, problems };
};
