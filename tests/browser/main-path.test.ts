import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoPassword, launchBrowser, openVisit, type Visit } from './helpers/browser';

/** Two days on, so that departure and wind are always ahead of the clock. */
const day = new Date(Date.now() + 2 * 24 * 3_600_000).toISOString().slice(0, 10);

let browser: Browser;
let visit: Visit;
let page: Page;

beforeAll(async () => {
  browser = await launchBrowser();
  visit = await openVisit(browser);
  page = visit.page;
});
afterAll(() => browser?.close());

const verdict = () => page.getByTestId('verdict');
const state = () => verdict().getAttribute('data-state');
const names = () =>
  page
    .getByTestId('waypoint-row')
    .getByLabel(/^Name of waypoint/)
    .evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).value));

async function until(what: string, holds: () => Promise<boolean>): Promise<void> {
  const end = Date.now() + 20_000;
  while (!(await holds())) {
    if (Date.now() > end) throw new Error(`Waited in vain until ${what}.`);
    await page.waitForTimeout(100);
  }
}

async function mapReady(): Promise<Locator> {
  const map = page.locator('[data-map-ready="true"]');
  await map.waitFor({ timeout: 60_000 });
  await map.scrollIntoViewIfNeeded();
  return map;
}

/** A place on the map's canvas by shares of its width and height. */
async function clickMap(acrossShare: number, downShare: number): Promise<void> {
  const box = (await (await mapReady()).locator('canvas').boundingBox())!;
  await page.mouse.click(box.x + box.width * acrossShare, box.y + box.height * downShare);
}

async function typeWind(row: number, clock: string, from: string, mean: string, gust: string): Promise<void> {
  await page.getByLabel(`Wind row ${row}, date and time`).fill(`${day} ${clock}`);
  await page.getByLabel(`Wind row ${row}, from, degrees true`).fill(from);
  await page.getByLabel(`Wind row ${row}, mean, knots`).fill(mean);
  await page.getByLabel(`Wind row ${row}, gust, knots`).fill(gust);
}

describe('the main path', () => {
  it('signs in by keys alone', async () => {
    await page.goto('/sign-in');
    await page.getByLabel('E-mail').focus();
    await page.keyboard.type('skipper@example.org');
    await page.getByLabel('Password', { exact: true }).focus();
    await page.keyboard.type(demoPassword);
    await page.keyboard.press('Enter');
    await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
  });

  it('shows the demo passage in the list and by itself, its worst leg named, with the caution', async () => {
    await page.goto('/passages');
    const line = page.getByTestId('passage-list').getByRole('link', { name: /Round the west side/ });
    expect(await line.textContent()).toMatch(/Worst: leg \d, .+ to .+ — beyond righting moment/);
    await line.click();
    await page.getByTestId('worst-leg').waitFor();
    expect(await page.getByTestId('worst-leg').textContent()).toMatch(/^Worst: leg \d, .+ — beyond righting moment$/);
    expect(await verdict().textContent()).toMatch(/gust \d+ kn gives \d\.\d\d × her righting moment/);
    expect(await page.getByTestId('check-origin').textContent()).toMatch(/boat sheet \d+, engine \d/);
    expect(await page.getByTestId('caution').first().textContent()).toMatch(/An aid, not a permission/);
    await mapReady();
    const states = await page.getByTestId('legs-table').locator('tbody [data-state]').allTextContents();
    for (const word of ['within limits', 'little margin', 'beyond righting moment', 'not known']) {
      expect(states).toContain(word);
    }
  });

  it('ties the passage strip to the table of legs, by keys', async () => {
    const slider = page.getByRole('slider', { name: 'Look along the passage' });
    const before = await slider.getAttribute('aria-valuetext');
    await slider.focus();
    for (let i = 0; i < 70; i += 1) await page.keyboard.press('ArrowRight');
    const after = await slider.getAttribute('aria-valuetext');
    expect(after).not.toBe(before);
    expect(after).toMatch(/^10:1\d UTC−\d · leg 2 to /);
  });

  it('makes a new passage', async () => {
    await page.goto('/passages/new');
    await page.getByLabel('Name of the passage').fill('A day in the strait');
    await page.getByLabel('Time zone').fill('America/Los_Angeles');
    await page.getByRole('button', { name: 'Make the passage' }).click();
    await page.waitForURL(/\/passages\/[^/]+\/plan$/);
    expect(await state()).toBe('unknown');
    expect(await verdict().textContent()).toMatch(/Not known/);
  });

  it('adds waypoints by clicking the map', async () => {
    await clickMap(0.22, 0.8);
    await clickMap(0.2, 0.62);
    await clickMap(0.24, 0.9);
    await until('three waypoints stand in the table', async () => (await names()).length === 3);
    const first = page.getByTestId('leg-row').first();
    expect(await first.textContent()).toMatch(/\d{3}° T · \d{3}° M · \d+\.\d+ nmi/);
  });

  it('drags one, inserts in a leg, undoes and redoes', async () => {
    const lat = () => page.getByLabel('Latitude of waypoint 2, degrees').inputValue();
    const before = await lat();
    const marker = (await page.getByTestId('map-waypoint-2').boundingBox())!;
    await page.mouse.move(marker.x + marker.width / 2, marker.y + marker.height / 2);
    await page.mouse.down();
    await page.mouse.move(marker.x + marker.width / 2, marker.y + marker.height / 2 - 40, { steps: 8 });
    await page.mouse.up();
    await until('the dragged waypoint has moved north', async () => Number(await lat()) > Number(before));
    const dragged = await lat();

    await page.getByTestId('leg-row').getByRole('button', { name: 'Insert a waypoint in leg 2' }).click();
    expect(await names()).toHaveLength(4);
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    expect(await names()).toHaveLength(3);
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    expect(await lat()).toBe(before);
    await page.getByRole('button', { name: 'Redo', exact: true }).click();
    expect(await lat()).toBe(dragged);
  });

  it('reorders by keys in the table', async () => {
    const [a, b, c] = await names();
    await page.getByRole('button', { name: `Move ${c} up` }).focus();
    await page.keyboard.press('Enter');
    expect(await names()).toEqual([a, c, b]);
    await page.getByRole('button', { name: `Move ${c} down` }).focus();
    await page.keyboard.press('Enter');
    expect(await names()).toEqual([a, b, c]);
  });

  it('takes typed places in degrees and minutes', async () => {
    const places = [
      ['Off the bank', '48°24.0′N', '123°06.0′W'],
      ['Mid strait', '48 26.0 N', '123 12.0 W'],
      ['Off the head', '48.36', '-123.22'],
    ] as const;
    for (const [index, [name, lat, lon]] of places.entries()) {
      await page.getByLabel(`Name of waypoint ${index + 1}`).fill(name);
      await page.getByLabel(`Latitude of waypoint ${index + 1}, degrees`).fill(lat);
      await page.getByLabel(`Longitude of waypoint ${index + 1}, degrees`).fill(lon);
    }
    expect(await page.getByTestId('leg-row').first().textContent()).toMatch(/4\.4\d nmi/);
    expect(await page.getByTestId('field-problem').count()).toBe(0);
  });

  it('shows the verdict of the typed wind, and changes it with the wind', async () => {
    await page.getByLabel('Departure, date and time').fill(`${day} 10:00`);
    await page.getByLabel('Source of the wind, in words').fill('By radio, invented');
    await page
      .getByLabel('Issued, date and time')
      .fill(`${new Date(Date.now() - 3_600_000).toISOString().slice(0, 16)}Z`);
    await page.getByRole('button', { name: 'Add a wind row' }).click();
    await page.getByRole('button', { name: 'Add a wind row' }).click();
    await typeWind(1, '08:00', '200', '6', '8');
    await typeWind(2, '23:00', '200', '6', '8');
    await until('light wind is within limits', async () => (await state()) === 'within');
    expect(await page.getByTestId('wind-row').first().textContent()).toContain('force 2');

    await typeWind(1, '08:00', '200', '30', '45');
    await typeWind(2, '23:00', '200', '30', '45');
    await until('a gale is beyond righting moment', async () => (await state()) === 'beyond');
    expect(await page.getByTestId('worst-leg').textContent()).toMatch(/^Worst: leg \d, .+ — beyond righting moment$/);
  });

  it('keeps impossible values with their message at the field, and shows no old verdict', async () => {
    const gust = page.getByLabel('Wind row 2, gust, knots');
    await gust.fill('10');
    const message = page.locator(`[id="${await gust.getAttribute('aria-describedby')}"]`);
    expect(await message.textContent()).toMatch(/a gust of 10 kn is under the mean of 30 kn/);
    expect(await state()).toBe('unknown');
    await page.getByLabel('Wind row 1, mean, knots').fill('300');
    await page.getByLabel('Departure, date and time').fill('2027-03-14 02:30');
    const said = (await page.getByTestId('field-problem').allTextContents()).join(' ');
    expect(said).toMatch(/300 is over the possible 0 to 120 kn/);
    expect(said).toMatch(/2027-03-14 02:30 does not exist in America\/Los_Angeles/);
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    expect(await page.getByTestId('save-bar').textContent()).toMatch(/Not saved: some fields/);
    expect(await gust.inputValue()).toBe('10');
    await page.getByLabel('Departure, date and time').fill('2026-11-01 01:30');
    expect(await page.getByText('the clocks go back and this time happens twice').count()).toBe(1);
    await page.getByRole('radio', { name: /^second/ }).check();
    expect(await page.getByText('the clocks go back and this time happens twice').count()).toBe(0);
  });

  it('saves, and shows the same after a reload', async () => {
    await page.getByLabel('Departure, date and time').fill(`${day} 10:00`);
    await typeWind(1, '08:00', '200', '6', '8');
    await typeWind(2, '23:00', '200', '6', '8');
    await until('it can be checked again', async () => (await state()) === 'within');
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await until('it is saved', async () => (await page.getByTestId('saved-state').textContent()) === 'Saved');
    await page.reload();
    expect(await names()).toEqual(['Off the bank', 'Mid strait', 'Off the head']);
    expect(await page.getByLabel('Wind row 2, gust, knots').inputValue()).toBe('8');
    expect(await page.getByLabel('Departure, date and time').inputValue()).toBe(`${day} 10:00`);
    await until('the check is shown again', async () => (await state()) === 'within');
    await page.goto(page.url().replace(/\/plan$/, ''));
    expect(await page.getByTestId('check-origin').textContent()).toMatch(/By radio, invented/);
    expect(await verdict().textContent()).toMatch(/Within limits/);
  });

  it('tells of a conflict and saves over it when asked', async () => {
    await page.goto(`${page.url()}/plan`);
    await mapReady();
    const id = page.url().split('/').at(-2)!;
    const opened = await page.evaluate(async (at) => (await fetch(at)).json(), `/api/passages/${id}`);
    const { id: _id, boatId: _boat, revision, ...plan } = opened.passage;
    const status = await page.evaluate(
      async ([at, body]) =>
        (await fetch(at!, { method: 'PUT', headers: { 'content-type': 'application/json' }, body: body! })).status,
      [`/api/passages/${id}`, JSON.stringify({ plan: { ...plan, name: 'Theirs' }, basedOnRevision: revision })],
    );
    expect(status).toBe(200);
    await page.getByLabel('Passage name').fill('Mine');
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await page.getByTestId('save-message').waitFor();
    expect(await page.getByTestId('save-message').textContent()).toMatch(/Somebody saved this passage/);
    expect(await page.getByLabel('Passage name').inputValue()).toBe('Mine');
    await page.getByRole('button', { name: 'Save mine over it' }).click();
    await until('mine is saved', async () => (await page.getByTestId('saved-state').textContent()) === 'Saved');
  });

  it('did all this without an error in the page, but for the conflict asked for', () => {
    expect(visit.complaints.filter((line) => !/status of 409/.test(line))).toEqual([]);
  });
});
