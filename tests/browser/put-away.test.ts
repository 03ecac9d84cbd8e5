import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, openVisit, signIn } from '@/tests/browser/helpers/browser';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe('a passage', () => {
  it('is put away and brought back by who may write it', async () => {
    const { page, context, complaints } = await openVisit(browser);
    await signIn(page, 'skipper@example.org');
    await page.goto('/passages/new');
    await page.getByLabel('Name of the passage').fill('To the mooring and back');
    await page.getByRole('button', { name: 'Make the passage' }).click();
    await page.waitForURL(/\/passages\/[^/]+\/plan/);
    await page.goto(page.url().replace(/\/plan.*/, ''));
    await page.getByText('Put this passage away').click();
    await page.getByRole('button', { name: 'Put To the mooring and back away' }).click();
    await page.waitForURL('**/passages');
    expect(await page.getByTestId('passage-list').getByText('To the mooring and back').count()).toBe(0);
    await page.getByText('Put away (1), kept for 30 days').click();
    await page.getByRole('button', { name: 'Bring back' }).click();
    await page.getByTestId('passage-list').getByText('To the mooring and back').waitFor();
    expect(complaints).toEqual([]);
    await context.close();
  });
});
