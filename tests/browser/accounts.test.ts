import { randomUUID } from 'node:crypto';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { baseUrl, launchBrowser, openVisit, signIn } from '@/tests/browser/helpers/browser';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const firstPassword = 'a quiet anchorage';
const anEmail = () => `visitor-${randomUUID().slice(0, 8)}@example.org`;

async function register(page: Page, email: string): Promise<void> {
  await page.goto('/register');
  await page.getByLabel('Name').fill('Visitor');
  await page.getByLabel('E-mail').fill(email);
  await page.getByRole('button', { name: 'Register' }).click();
  await page.getByText('Look into your mail', { exact: true }).waitFor();
}

/** Registers, reads the mail and chooses the first password. */
async function makeAccount(page: Page, email: string): Promise<void> {
  await register(page, email);
  await chooseFirstPassword(page, await readMail(page, email, 'Your Twobow account'));
}

async function chooseFirstPassword(page: Page, mail: string): Promise<void> {
  await page.goto(/\S+\/reset\/\S+/.exec(mail)![0]);
  await page.getByLabel('New password').fill(firstPassword);
  await page.getByRole('button', { name: 'Set the password' }).click();
  await page.getByText('The password is changed').waitFor();
}

/** The newest mail to the address that has such a subject; mail goes out after the answer, so it may take a moment. */
async function readMail(page: Page, email: string, subject: string): Promise<string> {
  for (let attempt = 0; ; attempt += 1) {
    await page.goto('/dev/mail');
    const mails = page.locator('section', { hasText: email }).filter({ hasText: subject });
    if ((await mails.count()) > 0) return mails.first().innerText();
    if (attempt === 30) throw new Error(`No mail “${subject}” to ${email}.`);
    await page.waitForTimeout(200);
  }
}

describe('an account', () => {
  it('is registered; the screen is the same for an address that has one, and only the mail tells', async () => {
    const { page, context, complaints } = await openVisit(browser);
    const email = anEmail();
    await register(page, email);
    const firstScreen = await page.locator('main').innerText();
    const mail = await readMail(page, email, 'Your Twobow account');
    expect(mail).toContain('choose a password');
    await chooseFirstPassword(page, mail);
    await register(page, email);
    expect(await page.locator('main').innerText()).toBe(firstScreen);
    await expect.poll(() => readMail(page, email, 'Your Twobow account')).toContain('has an account already');
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('names what is wrong at its field and keeps what was typed', async () => {
    const { page, context } = await openVisit(browser);
    await page.goto('/register');
    await page.getByLabel('Name').fill('Visitor');
    await page.getByLabel('E-mail').fill('no address');
    await page.getByRole('button', { name: 'Register' }).click();
    await page.getByTestId('field-problem').first().waitFor();
    expect(await page.getByTestId('field-problem').allInnerTexts()).toEqual([expect.stringContaining('E-mail:')]);
    expect(await page.getByLabel('Name').inputValue()).toBe('Visitor');
    expect(await page.getByLabel('E-mail').inputValue()).toBe('no address');
    await context.close();
  });

  it('is signed in to with the right password only, and goes on to the page that was asked for', async () => {
    const { page, context } = await openVisit(browser);
    await page.goto('/account');
    expect(new URL(page.url()).pathname).toBe('/sign-in');
    await page.getByLabel('E-mail').fill('crew@example.org');
    await page.getByLabel('Password', { exact: true }).fill('not the password');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByText('do not go together').waitFor();
    expect(await page.getByLabel('E-mail').inputValue()).toBe('crew@example.org');
    await page.getByLabel('Password', { exact: true }).fill('two-bows-one-wind');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL('**/account');
    await page.getByRole('button', { name: 'Sign out', exact: true }).click();
    await page.waitForURL('**/sign-in');
    await page.goto('/account');
    expect(new URL(page.url()).pathname).toBe('/sign-in');
    await context.close();
  });

  it('does not go on to another site', async () => {
    const { page, context } = await openVisit(browser);
    await page.goto('/sign-in?next=https://elsewhere.example.org/');
    await page.getByLabel('E-mail').fill('crew@example.org');
    await page.getByLabel('Password', { exact: true }).fill('two-bows-one-wind');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL(`${baseUrl}/passages`);
    await context.close();
  });

  it('gets a new password by a mailed link that works once and ends other sessions', async () => {
    const here = await openVisit(browser);
    const elsewhere = await openVisit(browser);
    const email = anEmail();
    await makeAccount(here.page, email);
    await signIn(elsewhere.page, email, firstPassword);
    await here.page.goto('/forgot');
    await here.page.getByLabel('E-mail').fill(email);
    await here.page.getByRole('button', { name: 'Send a link' }).click();
    await here.page.getByText('Look into your mail').waitFor();
    const mail = await readMail(here.page, email, 'Set a new Twobow password');
    const link = /\S+\/reset\/\S+/.exec(mail)![0];
    await here.page.goto(link);
    await here.page.getByLabel('New password').fill('the wind came round');
    await here.page.getByRole('button', { name: 'Set the password' }).click();
    await here.page.getByText('The password is changed').waitFor();
    await elsewhere.page.goto('/account');
    expect(new URL(elsewhere.page.url()).pathname).toBe('/sign-in');
    await signIn(here.page, email, 'the wind came round');
    await elsewhere.page.goto(link);
    await elsewhere.page.getByLabel('New password').fill('yet another password');
    await elsewhere.page.getByRole('button', { name: 'Set the password' }).click();
    await elsewhere.page.getByText('was used already').waitFor();
    await here.context.close();
    await elsewhere.context.close();
  });

  it('changes name and password, makes and revokes a token, and signs out everywhere', async () => {
    const { page, context, complaints } = await openVisit(browser);
    const email = anEmail();
    await makeAccount(page, email);
    await signIn(page, email, firstPassword);
    await page.goto('/account');
    await page.getByRole('textbox', { name: 'Name', exact: true }).fill('Renamed Visitor');
    await page.getByRole('button', { name: 'Save the name' }).click();
    await page.getByText('The name is saved.').waitFor();

    await page.getByLabel('Name of the token').fill('Chart table');
    await page.getByRole('button', { name: 'Make a token' }).click();
    const token = (await page.getByTestId('new-token').innerText()).trim();
    const ask = () => fetch(`${baseUrl}/api/boats`, { headers: { authorization: `Bearer ${token}` } });
    expect(await (await ask()).json()).toEqual({ boats: [], hidden: [] });
    await page.reload();
    expect(await page.getByTestId('new-token').count()).toBe(0);
    expect(await page.getByRole('textbox', { name: 'Name', exact: true }).inputValue()).toBe('Renamed Visitor');
    await page.getByRole('button', { name: 'Revoke “Chart table”' }).click();
    await page.getByText(/^revoked /).waitFor();
    expect((await ask()).status).toBe(401);

    await page.getByLabel('Present password').fill(firstPassword);
    await page.getByLabel('New password').fill('a brand new password');
    await page.getByRole('button', { name: 'Change the password' }).click();
    await page.getByText('The password is changed').waitFor();
    await signIn(page, email, 'a brand new password');
    await page.goto('/account');
    await page.getByRole('button', { name: 'Sign out everywhere' }).click();
    await page.getByText('signed out on every device').waitFor();
    await page.goto('/account');
    expect(new URL(page.url()).pathname).toBe('/sign-in');
    expect(complaints).toEqual([]);
    await context.close();
  });
});
