import { readFileSync } from 'node:fs';
import path from 'node:path';
import { type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { axe, launchBrowser, openPage, signIn, type Person, type Theme } from '../setup/browser';
import { personOf } from '../setup/people';

/** The main job from end to end as its people do it, once by night and once by day. */
let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const fixture = (name: string) => path.resolve(import.meta.dirname, '../fixtures', name);
const tablet = { width: 1180, height: 820, isTouch: true };

async function as(
  person: Person,
  theme: Theme,
  view: object = {},
): Promise<{ page: Page; leave: () => Promise<void> }> {
  const { page, complaints } = await openPage(browser, { theme, ...view });
  await signIn(page, person);
  return {
    page,
    leave: async () => {
      expect(complaints).toEqual([]);
      await page.context().close();
    },
  };
}

const announced = (page: Page, words: RegExp | string) =>
  page.getByRole('status').filter({ hasText: words }).first().waitFor();

/** The one big button: as the plan asks, or at a rate of the driver's own where the plan says nothing. */
async function logAsAsked(page: Page): Promise<void> {
  const asShown = page.getByRole('button', { name: /^(Done, as shown|Done, ploughed|Passed, nothing spread)$/ });
  if ((await asShown.count()) > 0) await asShown.click();
  else {
    await page.getByRole('button', { name: 'Done, at a rate I set' }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Done at this rate' }).click();
  }
}

const nights = [
  { theme: 'dark', driver: { email: 'i.sand@skerrow.example', password: 'skerrow-demo' }, name: 'Ivo Sand' },
  { theme: 'light', driver: { email: 'r.garth@skerrow.example', password: 'skerrow-demo' }, name: 'Rhona Garth' },
] as const satisfies readonly { theme: Theme; driver: Person; name: string }[];

describe.each(nights)('the whole job, $theme', ({ theme, driver, name }) => {
  it('roads come in from a file, are looked at, saved and undone', async () => {
    const { page, leave } = await as(personOf.administrator, theme);
    await page.goto('/setup/roads');
    await page.locator('input[type="file"]').setInputFiles(fixture('harbour-lanes.geojson'));
    await page.waitForURL(/\/setup\/roads\/\d+/);
    await page.getByRole('button', { name: /^Save/ }).waitFor();
    expect(await axe(page)).toEqual([]);
    await page.getByRole('button', { name: /^Save/ }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('button', { name: /^Save/ }).click();
    await announced(page, /Saved:/);
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('dialog').getByRole('button', { name: /^Undo/ }).click();
    await announced(page, /Undone:/);
    await leave();
  });

  it('readings come in from a sensor file: good rows land, bad rows are kept with their reason', async () => {
    const { page, leave } = await as(personOf.administrator, theme);
    await page.goto('/setup/stations');
    // each night its own station: the same file twice would rightly change nothing
    await page
      .getByRole('table')
      .getByRole('link')
      .nth(theme === 'dark' ? 0 : 1)
      .click();
    await page.getByRole('heading', { name: 'Load readings' }).waitFor();
    await page.locator('input[type="file"]').setInputFiles(fixture('station-log.csv'));
    const load = page.getByRole('button', { name: 'Load this file' });
    await load.waitFor();
    expect(await axe(page)).toEqual([]);
    await load.click();
    await page.getByText('station-log.csv is read.').waitFor();
    await page
      .getByText(/“broken”/)
      .first()
      .waitFor();
    const started = page.waitForEvent('download');
    await page.getByRole('link', { name: 'Download the rejected rows' }).first().click();
    const rejected = readFileSync(await (await started).path(), 'utf8');
    expect(rejected.trim().split(/\r?\n/)).toHaveLength(3);
    expect(rejected).toContain('broken');
    expect(rejected).toContain('25:40');
    expect(rejected).not.toContain('already has');
    await leave();
  });

  it('a pass is worked out and published', async () => {
    const { page, leave } = await as(personOf.dispatcher, theme);
    await page.goto('/storm');
    await page.getByRole('link', { name: /^Storm 07/ }).click();
    await page.getByRole('heading', { level: 1, name: /Storm 07/ }).waitFor();
    const workOut = page
      .getByRole('banner')
      .or(page.locator('header'))
      .getByRole('button', { name: /^Work out pass/ });
    if ((await workOut.count()) > 0) {
      await workOut.first().click();
      await announced(page, /Worked out: version \d+ is a draft/);
    }
    expect(await axe(page)).toEqual([]);
    await page
      .getByRole('button', { name: /^Publish pass/ })
      .first()
      .click();
    await announced(page, 'Published. Drivers see it now.');
    await leave();
  });

  it('the roads that refreeze first are listed, and the time cursor moves the whole screen', async () => {
    const { page, leave } = await as(personOf.dispatcher, theme);
    await page.goto('/roads');
    await page.getByRole('heading', { name: 'Refreezes first' }).waitFor();
    const cursor = page.getByRole('slider').first();
    await cursor.waitFor();
    const before = await cursor.getAttribute('aria-valuetext');
    await cursor.focus();
    await page.keyboard.press('Shift+ArrowRight');
    await expect.poll(() => cursor.getAttribute('aria-valuetext')).not.toBe(before);
    await page.getByRole('button', { name: 'Why' }).first().click();
    await page.getByRole('dialog').waitFor();
    expect(await axe(page)).toEqual([]);
    await leave();
  });

  it('a driver takes a list of roads, logs them at the set and at another rate, loads, skips and ends', async () => {
    const { page, leave } = await as(driver, theme, tablet);
    await page.waitForURL('**/cab');
    await page.getByRole('region', { name: 'Truck' }).getByRole('button', { disabled: false }).first().click();
    await page.getByText('A list of roads').click();
    await page.getByLabel('Find a road by its name').fill('road');
    for (let count = 0; count < 3; count += 1)
      await page.getByRole('region', { name: 'Roads' }).getByRole('list').first().getByRole('button').first().click();
    await page.getByRole('button', { name: 'Start the run' }).click();
    await page.getByText('0 of 3 roads done').waitFor();
    expect(await axe(page)).toEqual([]);

    await page.getByRole('button', { name: 'Load', exact: true }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Loaded' }).click();

    await page.getByRole('button', { name: /^(Different rate|Done, at a rate I set)$/ }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Rate: More', exact: true }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Done at this rate' }).click();
    await page.getByText('1 of 3 roads done').waitFor();

    await logAsAsked(page);
    await page.getByText('2 of 3 roads done').waitFor();

    await page.getByRole('button', { name: 'Skip this road' }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Road blocked' }).click();
    await page.getByRole('heading', { name: 'Every road is logged' }).waitFor();
    await page.getByText('All sent').waitFor();
    await page.getByRole('button', { name: 'End the run' }).click();
    await page.getByRole('heading', { name: 'Take a run' }).waitFor();
    await leave();
  });

  it('what a driver logs without signal is kept, counted, and sent when the signal is back', async () => {
    const { page } = await as(driver, theme, tablet);
    await page.waitForURL('**/cab');
    await page.getByRole('region', { name: 'Truck' }).getByRole('button', { disabled: false }).first().click();
    await page.getByText('A list of roads').click();
    await page.getByLabel('Find a road by its name').fill('lane');
    await page.getByRole('region', { name: 'Roads' }).getByRole('list').first().getByRole('button').first().click();
    await page.getByRole('button', { name: 'Start the run' }).click();
    await page.getByText('0 of 1 roads done').waitFor();
    await page.context().setOffline(true);
    await page.getByRole('button', { name: 'Skip this road' }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Already treated' }).click();
    await page.getByText('No signal, 1 entry kept on this tablet').waitFor();
    await page.context().setOffline(false);
    await page.getByText('All sent').waitFor();
    await page.getByRole('button', { name: 'End the run' }).click();
    await page.getByRole('heading', { name: 'Take a run' }).waitFor();
    await page.context().close();
  });

  it('the ledger shows the run beside what was recommended, and gives it as a file', async () => {
    const { page, leave } = await as(personOf.supervisor, theme);
    await page.goto('/ledger');
    await page.getByRole('heading', { level: 1, name: /what went down/ }).waitFor();
    const row = page.getByRole('row').filter({ hasText: name }).filter({ hasText: '3 of 3' });
    expect(await row.count()).toBeGreaterThan(0);
    await row.first().getByRole('button').click();
    await page.getByText('Road blocked').first().waitFor();
    const started = page.waitForEvent('download');
    await page.getByRole('link', { name: 'Download CSV' }).click();
    const file = await (await started).path();
    const text = readFileSync(file, 'utf8');
    expect(text.split('\r\n')[0]).toMatch(/^storm,pass,route,truck,driver/);
    expect(text).toContain(name);
    await leave();
  });
});
