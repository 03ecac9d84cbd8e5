import AxeBuilder from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, openVisit, signIn } from '@/tests/browser/helpers/browser';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const polar = 'true_wind_speed_kn,true_wind_angle_deg,boat_speed_kn\n6,60,2.8\n6,150,2.2\n16,60,5\n16,150,5.6\n';
const boatName = `Petrel ${process.pid}`;

async function fillAll(page: Page, label: string, values: readonly string[]): Promise<void> {
  const fields = page.getByLabel(label, { exact: true });
  for (const [index, value] of values.entries()) await fields.nth(index).fill(value);
}

/** Everything that a new boat needs, but for her span. */
async function typeBoat(page: Page): Promise<void> {
  await page.getByLabel('Boat name').fill(boatName);
  await fillAll(page, 'Mass, kg', ['180', '70', '40', '35', '75']);
  await fillAll(page, 'y, m', ['0', '3', '1.5', '0', '1.2']);
  await fillAll(page, 'z, m', ['0.2', '0.1', '0.5', '2.5', '0.6']);
  await page.getByLabel('Centre of lateral resistance, m', { exact: true }).fill('-0.4');
  await page.getByLabel('Reef', { exact: true }).nth(1).fill('Small sail');
  await fillAll(page, 'Area, m²', ['16', '9']);
  await fillAll(page, 'Centre of effort, m', ['3', '2.2']);
  await page.getByLabel('Carry up to, mean, kn', { exact: true }).first().fill('25');
}

describe('the boat sheet', () => {
  it('is made, read, mended and kept in every version, by clicks and keys', async () => {
    const { page, complaints } = await openVisit(browser);
    await signIn(page, 'owner@example.org');
    await page.goto('/boats/new');
    await typeBoat(page);
    await page.getByLabel('Polar as CSV').fill(polar.replace('16,150,5.6', '16,150,fast'));
    await page.getByRole('button', { name: 'Take over the pasted polar' }).click();
    await page.getByText('Line 5, boat_speed_kn: “fast” is not a number.').waitFor();
    await page
      .getByLabel('Take it from a file')
      .setInputFiles({ name: 'p.csv', mimeType: 'text/csv', buffer: Buffer.from(polar) });
    await page.getByText('Taken over: 2 wind speeds by 2 wind angles.').waitFor();

    await page.getByRole('button', { name: 'Save the new boat' }).click();
    const summary = page.getByTestId('error-summary');
    await summary.getByRole('link', { name: /^Span/ }).press('Enter');
    await page.keyboard.type('3');
    await page.keyboard.press('Enter');
    await page.getByText('Saved as boat sheet 1.').waitFor();

    await page.getByText('“Full sail”: carry up to is over holds up to').waitFor();
    await page.getByText('Her righting curve is not known').waitFor();
    await page.getByText('Show working of the righting moment by hand').click();
    await page.getByText('180 kg × 0 m + 70 kg × 3 m + 40 kg × 1.5 m + 35 kg × 0 m + 75 kg × 1.2 m').waitFor();
    await page.getByTestId('caution').waitFor();

    const address = new URL(page.url()).pathname;
    await page.goto(`${address}/edit`);
    await page.getByLabel('Mass, kg', { exact: true }).nth(1).fill('90');
    await page.getByRole('button', { name: 'Save as boat sheet 2' }).click();
    await page.getByText('Saved as boat sheet 2.').waitFor();
    await page.getByRole('link', { name: 'Boat sheet 1', exact: true }).click();
    await page.getByText('This is boat sheet 1; the newest is 2.').waitFor();
    await page.getByRole('cell', { name: '70', exact: true }).waitFor();
    expect(complaints).toEqual([]);
  });

  it('keeps what was typed where somebody saved in between, and asks before it is left', async () => {
    const first = await openVisit(browser);
    await signIn(first.page, 'owner@example.org');
    await first.page.goto('/boats');
    await first.page.getByRole('link', { name: boatName }).click();
    await first.page.getByRole('link', { name: 'Edit the boat sheet' }).click();
    const span = first.page.getByLabel('Span, m', { exact: true });
    await span.fill('3.2');

    const second = await first.context.newPage();
    await second.goto(first.page.url());
    await second.getByLabel('Notes', { exact: true }).fill('Weighed again.');
    await second.getByRole('button', { name: 'Save as boat sheet 3' }).click();
    await second.getByText('Saved as boat sheet 3.').waitFor();

    const asked: string[] = [];
    first.page.on('dialog', (dialog) => {
      asked.push(dialog.message());
      void dialog.dismiss();
    });
    await first.page.getByRole('link', { name: 'Leave' }).click();
    expect(asked).toHaveLength(1);
    await first.page.getByRole('button', { name: 'Save as boat sheet 3' }).click();
    await first.page.getByRole('button', { name: 'Save mine as boat sheet 4' }).waitFor();
    expect(await span.inputValue()).toBe('3.2');
    await first.page.getByRole('button', { name: 'Save mine as boat sheet 4' }).click();
    await first.page.getByText('Saved as boat sheet 4.').waitFor();
  });

  it.each(['day', 'night'])('has no fault that a machine finds, by %s, on a phone', async (theme) => {
    const { context, page } = await openVisit(browser, { width: 390, height: 844 });
    await signIn(page, 'owner@example.org');
    await context.addCookies([{ name: 'theme', value: theme, url: page.url() }]);
    await page.goto('/boats');
    const address = (await page.getByRole('link', { name: boatName }).getAttribute('href'))!;
    for (const path of ['/boats', address, `${address}/edit`]) {
      await page.goto(path);
      const { violations } = await new AxeBuilder({ page }).analyze();
      expect(violations.map(({ id, nodes }) => [path, id, nodes[0]?.html])).toEqual([]);
      expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(
        0,
      );
    }
  });

  it('is only read by the crew, and not seen by strangers', async () => {
    const { page } = await openVisit(browser);
    await signIn(page, 'crew@example.org');
    await page.goto('/boats');
    expect(await page.getByRole('link', { name: boatName }).count()).toBe(0);
    await page.getByTestId('boat-list').getByRole('link').first().click();
    await page.getByRole('heading', { name: 'Reef table' }).waitFor();
    expect(await page.getByRole('link', { name: 'Edit the boat sheet' }).count()).toBe(0);
    await page.goto(`${new URL(page.url()).pathname}/edit`);
    await page.getByRole('heading', { name: 'Reef table' }).waitFor();
    expect(page.url()).not.toContain('/edit');
  });

  it('is put away and brought back', async () => {
    const { page } = await openVisit(browser);
    await signIn(page, 'owner@example.org');
    await page.goto('/boats');
    await page.getByRole('link', { name: boatName }).click();
    await page.getByText('Put this boat away').click();
    await page.getByRole('button', { name: `Put ${boatName} away` }).click();
    await page.getByText(/^Put away \(/).click();
    await page.getByRole('listitem').filter({ hasText: boatName }).getByRole('button', { name: 'Bring back' }).click();
    await page.getByRole('link', { name: boatName }).waitFor();
  });
});
