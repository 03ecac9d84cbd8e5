import AxeBuilder from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import type { ViteDevServer } from 'vite';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { launchBrowser } from '@/tests/browser/helpers/browser';
import { serveMapPage } from '@/tests/browser/helpers/map-page';

/** The map by itself, with mouse, finger and keys. The page around it has tests of its own. */
let browser: Browser;
let server: ViteDevServer;
let address: string;
beforeAll(async () => {
  ({ server, address } = await serveMapPage());
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser.close();
  await server.close();
});

interface Opened {
  readonly page: Page;
  readonly complaints: string[];
  readonly outside: string[];
}

async function open(size: { width: number; height: number }, hasTouch = false): Promise<Opened> {
  const context = await browser.newContext({ viewport: size, hasTouch });
  const page = await context.newPage();
  const complaints: string[] = [];
  const outside: string[] = [];
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => {
    // The software renderer tells of its own slowness when a picture is taken.
    if (['error', 'warning'].includes(message.type()) && !message.text().includes('GPU stall')) {
      complaints.push(message.text());
    }
  });
  page.on('request', (request) => {
    if (!/^(data|blob):/.test(request.url()) && !request.url().startsWith(`${address}/`)) outside.push(request.url());
  });
  await page.goto(address);
  await page.locator('[data-map-ready="true"]').waitFor({ timeout: 90_000 });
  return { page, complaints, outside };
}

const asked = (page: Page) => page.evaluate(() => window.asked.splice(0)) as Promise<[string, ...unknown[]][]>;

async function middleOf(page: Page, testId: string): Promise<{ x: number; y: number }> {
  const box = (await page.getByTestId(testId).boundingBox())!;
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
}

async function drag(page: Page, testId: string, dx: number, dy: number): Promise<void> {
  const { x, y } = await middleOf(page, testId);
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x + dx / 2, y + dy / 2, { steps: 4 });
  await page.mouse.move(x + dx, y + dy, { steps: 4 });
  await page.mouse.up();
}

describe('the passage map', () => {
  let opened: Opened;
  let page: Page;
  beforeAll(async () => {
    opened = await open({ width: 1200, height: 800 });
    page = opened.page;
  });
  beforeEach(() => asked(page));
  afterAll(() => page.context().close());

  it('adds a waypoint at the end where the water is clicked', async () => {
    const [first, third] = [await middleOf(page, 'map-waypoint-1'), await middleOf(page, 'map-waypoint-3')];
    await page.mouse.click((first.x + third.x) / 2, (first.y + third.y) / 2);
    await expect.poll(() => page.getByTestId('map-waypoint-4').count()).toBe(1);
    const [[what, place] = []] = (await asked(page)) as [string, { lat: number; lon: number }][];
    expect(what).toBe('add');
    // Half way between the two on the screen, within two pixels.
    expect(place!.lat).toBeCloseTo((48.54 + 48.4) / 2, 2);
    expect(place!.lon).toBeCloseTo((-123.2 - 122.98) / 2, 2);
  });

  it('moves a waypoint with the mouse, and only that', async () => {
    const before = await middleOf(page, 'map-waypoint-2');
    await drag(page, 'map-waypoint-2', 60, 24);
    const after = await middleOf(page, 'map-waypoint-2');
    expect(after.x - before.x).toBeCloseTo(60, -0.5);
    expect(after.y - before.y).toBeCloseTo(24, -0.5);
    const calls = await asked(page);
    expect(calls.filter(([what]) => what === 'move')).toHaveLength(1);
    expect(calls.some(([what]) => what === 'add')).toBe(false);
  });

  it('moves a waypoint with the arrow keys without panning the map or losing the focus', async () => {
    const other = await middleOf(page, 'map-waypoint-1');
    await page.getByTestId('map-waypoint-3').focus();
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Shift+ArrowRight');
    const moves = (await asked(page)) as [string, string, { lat: number; lon: number }][];
    expect(moves.map(([what, id]) => [what, id])).toEqual([
      ['move', 'third'],
      ['move', 'third'],
    ]);
    // 50 m is 0.00045° of latitude; 500 m east is 0.0068° of longitude here.
    expect(moves[0]![2].lat).toBeCloseTo(48.4 - 0.00045, 5);
    expect(moves[1]![2].lon).toBeCloseTo(-122.98 + 0.00675, 4);
    expect(await middleOf(page, 'map-waypoint-1')).toEqual(other);
    expect(await page.evaluate(() => document.activeElement?.getAttribute('data-testid'))).toBe('map-waypoint-3');
    await page.keyboard.press('Enter');
    expect(await asked(page)).toEqual([['waypoint', 'third']]);
  });

  it('inserts where the handle is tapped or dragged to', async () => {
    await page.getByTestId('map-insert-2').click();
    const [tapped] = await asked(page);
    expect(tapped?.slice(0, 2)).toEqual(['insert', 1]);
    await drag(page, 'map-insert-2', 20, 50);
    const dragged = await asked(page);
    expect(dragged.map((call) => call.slice(0, 2))).toEqual([['insert', 1]]);
    expect((dragged[0]![2] as { lat: number }).lat).toBeLessThan((tapped![2] as { lat: number }).lat);
  });

  it('selects the leg that is clicked and adds nothing', async () => {
    const from = await middleOf(page, 'map-waypoint-2');
    const to = await middleOf(page, 'map-waypoint-3');
    await page.mouse.click(from.x + 0.75 * (to.x - from.x), from.y + 0.75 * (to.y - from.y));
    expect(await asked(page)).toEqual([['leg', 1]]);
  });

  it('says what it is, whose it is and what it is not for', async () => {
    await page.getByRole('region', { name: /^Map of the passage\. .* tables/ }).waitFor();
    const credit = page.getByTestId('map-credit');
    expect(await credit.isVisible()).toBe(true);
    expect(await credit.innerText()).toContain('not for navigation');
    expect(await page.locator('.maplibregl-ctrl-scale').innerText()).toMatch(/nmi$/);
  });

  it('has targets a thumb can hit and no accessibility fault', async () => {
    await page.getByText('Legend').click();
    const sizes = await page
      .locator('button, summary')
      .evaluateAll((parts) => parts.map((part) => part.getBoundingClientRect()).map((box) => [box.width, box.height]));
    for (const [width, height] of sizes) {
      expect(width).toBeGreaterThanOrEqual(44);
      expect(height).toBeGreaterThanOrEqual(44);
    }
    const { violations } = await new AxeBuilder({ page }).include('.passage-map').analyze();
    expect(violations.map(({ id, nodes }) => [id, nodes[0]?.html])).toEqual([]);
    await page.getByText('Legend').click();
  });

  it('keeps what is drawn when night falls', async () => {
    await page.evaluate(() => window.setMapTheme('night'));
    await page.locator('[data-map-theme="night"]').waitFor();
    const { x, y } = await middleOf(page, 'map-waypoint-2');
    const to = await middleOf(page, 'map-waypoint-3');
    await expect
      .poll(async () => {
        await page.mouse.click(x + 0.8 * (to.x - x), y + 0.8 * (to.y - y));
        return (await asked(page))[0];
      })
      .toEqual(['leg', 1]);
  });

  it('complains of nothing and asks no other server', () => {
    expect(opened.complaints).toEqual([]);
    expect(opened.outside).toEqual([]);
  });
});

describe('the passage map on a telephone', () => {
  it('adds a waypoint by a tap and keeps its words in sight', async () => {
    const { page, complaints } = await open({ width: 390, height: 700 }, true);
    const { x, y } = await middleOf(page, 'map-waypoint-3');
    await page.touchscreen.tap(x - 10, y + 70);
    await expect.poll(() => page.getByTestId('map-waypoint-4').count()).toBe(1);
    expect((await asked(page)).map(([what]) => what)).toEqual(['add']);
    expect(await page.getByTestId('map-credit').isVisible()).toBe(true);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(390);
    expect(complaints).toEqual([]);
    await page.context().close();
  });
});
