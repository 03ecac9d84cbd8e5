import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';

/** Where `npm test` serves the app for these tests. (Vitest sets a BASE_URL of its own, hence the long name.) */
export const baseUrl: string = process.env.TWOBOW_TEST_ADDRESS ?? '';
if (!baseUrl) throw new Error('TWOBOW_TEST_ADDRESS is not set. Run these tests by “npm test -- browser”.');

export const demoPassword = 'two-bows-one-wind';

const flags = [
  '--no-sandbox',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--disable-dev-shm-usage',
];

/** Debian's Chromium; WebGL comes from its software renderer by itself. Close it in `afterAll`. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({ executablePath: '/usr/bin/chromium', args: flags });
}

export interface Visit {
  readonly context: BrowserContext;
  readonly page: Page;
  /** What went wrong in the page unasked: uncaught errors, console errors, what the CSP blocked. */
  readonly complaints: string[];
}

/** A fresh window with cookies of its own. */
export async function openVisit(browser: Browser, size = { width: 1440, height: 900 }): Promise<Visit> {
  const context = await browser.newContext({ baseURL: baseUrl, viewport: size, timezoneId: 'America/Los_Angeles' });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(`error: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(`console: ${message.text()}`);
  });
  return { context, page, complaints };
}

/** Signs in through the form, as a person does, and waits for the signed-in frame. */
export async function signIn(page: Page, email: string, password = demoPassword): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}
