import { type Browser, type Locator, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { axe, launchBrowser, openPage, signIn, type View } from '../setup/browser';
import { personOf } from '../setup/people';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

async function openRoads(
  view: View = {},
  address = '/roads',
): Promise<{ page: Page; cursor: Locator; complaints: string[] }> {
  const { page, complaints } = await openPage(browser, view);
  await signIn(page, personOf.dispatcher);
  await page.goto(address);
  const cursor = page.getByRole('slider', { name: 'Time shown' });
  await cursor.waitFor();
  await page.locator('.leaflet-container canvas').first().waitFor();
  return { page, cursor, complaints };
}

const timeOf = (cursor: Locator) => cursor.getAttribute('aria-valuetext');
const legendOf = (page: Page) => page.getByText(/^Freeze margin at/).innerText();

describe('the time cursor', () => {
  it('moves by keys, and with it the legend, the list and the address', async () => {
    const { page, cursor, complaints } = await openRoads();
    const before = await timeOf(cursor);
    const legendBefore = await legendOf(page);
    await cursor.focus();
    await page.keyboard.press('Shift+ArrowLeft');
    await expect.poll(() => timeOf(cursor)).not.toBe(before);
    expect(await timeOf(cursor)).toContain('measured');
    expect(await legendOf(page)).not.toBe(legendBefore);
    await expect.poll(() => page.url()).toContain('at=');
    await page.keyboard.press('n');
    await expect.poll(() => timeOf(cursor)).toBe(before);
    await expect.poll(() => page.url()).not.toContain('at=');
    expect(complaints).toEqual([]);
    await page.context().close();
  });

  it('moves by dragging', async () => {
    const { page, cursor } = await openRoads();
    const box = await cursor.boundingBox();
    if (!box) throw new Error('The strip is not on the glass');
    await page.mouse.move(box.x + box.width * 0.6, box.y + 60);
    await page.mouse.down();
    await page.mouse.move(box.x + box.width * 0.2, box.y + 60, { steps: 6 });
    const early = await timeOf(cursor);
    await page.mouse.move(box.x + box.width * 0.9, box.y + 60, { steps: 6 });
    await page.mouse.up();
    expect(early).toContain('measured');
    expect(await timeOf(cursor)).toContain('forecast');
    await page.mouse.move(box.x + box.width * 0.1, box.y + 60);
    expect(await timeOf(cursor)).toContain('forecast');
    await page.context().close();
  });

  it('is where the address says, with the road it names', async () => {
    const first = await openRoads();
    const second = first.page.getByRole('region', { name: 'Refreezes first' }).getByRole('button').nth(1);
    const name = await second.locator('span').first().locator('span').first().innerText();
    await second.click();
    await first.cursor.focus();
    await first.page.keyboard.press('ArrowLeft');
    await expect.poll(() => first.page.url()).toMatch(/segment=\d+.*at=\d+|at=\d+.*segment=\d+/);
    const { search } = new URL(first.page.url());
    const time = await timeOf(first.cursor);
    await first.page.context().close();
    const { page, cursor } = await openRoads({}, `/roads${search}`);
    expect(await timeOf(cursor)).toBe(time);
    expect(await page.getByRole('region', { name: 'Chosen road' }).getByRole('heading', { level: 2 }).innerText()).toBe(
      name,
    );
    await page.context().close();
  });
});

describe('the map', () => {
  it('chooses the road that is clicked, as the list would', async () => {
    const { page } = await openRoads();
    const map = page.locator('.leaflet-container');
    const box = await map.boundingBox();
    if (!box) throw new Error('The map is not on the glass');
    const chosen = page.getByRole('region', { name: 'Chosen road' }).getByRole('heading', { level: 2 });
    const before = await chosen.innerText();
    // A line across the island crosses several roads: walk along it until another road is chosen.
    for (let step = 1; step < 60 && (await chosen.innerText()) === before; step += 1) {
      await page.mouse.click(box.x + (box.width * step) / 60, box.y + box.height * 0.62);
    }
    expect(await chosen.innerText()).not.toBe(before);
    await expect.poll(() => page.url()).toContain('segment=');
    await page.context().close();
  });

  it('moves and zooms by keys and says in words what its buttons do', async () => {
    const { page, complaints } = await openRoads();
    const map = page.locator('.leaflet-container');
    await map.focus();
    const pane = page.locator('.leaflet-map-pane');
    const before = await pane.getAttribute('style');
    await page.keyboard.press('ArrowRight');
    await expect.poll(() => pane.getAttribute('style')).not.toBe(before);
    for (const name of ['Zoom in', 'Zoom out', 'Show all roads']) await page.getByRole('button', { name }).click();
    expect(complaints).toEqual([]);
    await page.context().close();
  });
});

describe('why', () => {
  it('names inputs with their source, what bounds the rate and that it is decision support', async () => {
    const { page } = await openRoads();
    await page.getByRole('button', { name: 'Why' }).click();
    const sheet = page.getByRole('dialog');
    await sheet.getByText('What went in').waitFor();
    await sheet.getByText('What bounds it').waitFor();
    expect(await sheet.innerText()).toContain('decision support');
    expect(await axe(page)).toEqual([]);
    await page.context().close();
  });
});

describe('on a phone', () => {
  it('map, list and road share the window, the strip stays', async () => {
    const { page, cursor, complaints } = await openRoads({ width: 390, height: 844, isTouch: true, theme: 'dark' });
    const list = page.getByRole('region', { name: 'Refreezes first' });
    const road = page.getByRole('region', { name: 'Chosen road' });
    expect([await list.isVisible(), await road.isVisible(), await cursor.isVisible()]).toEqual([false, false, true]);
    await page.getByText('List', { exact: true }).tap();
    await list.getByRole('button').nth(1).tap();
    await expect.poll(() => road.isVisible()).toBe(true);
    expect(await list.isVisible()).toBe(false);
    expect(await axe(page)).toEqual([]);
    expect(complaints).toEqual([]);
    await page.context().close();
  });
});
