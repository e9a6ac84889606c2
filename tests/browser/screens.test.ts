import { type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Role } from '@/lib/permissions';
import { axe, launchBrowser, openPage, signIn, type Theme } from '../setup/browser';
import { personOf } from '../setup/people';

/** Every screen in both themes: no finding of axe (WCAG 2.2 AA), no complaint of the console, nothing wider than the glass. */
const screens: readonly { role: Role | null; paths: readonly string[] }[] = [
  { role: null, paths: ['/sign-in', '/status'] },
  { role: 'dispatcher', paths: ['/roads', '/storm', '/routes', '/crew', '/yard', '/ledger', '/bench', '/account'] },
  {
    role: 'administrator',
    paths: ['/setup', '/setup/people', '/setup/roads', '/setup/stations', '/setup/materials', '/setup/fleet'],
  },
  { role: 'supervisor', paths: ['/setup/policy'] },
  { role: 'observer', paths: ['/not-allowed?for=plans.publish'] },
  { role: 'driver', paths: ['/cab'] },
];

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

/** Opens a screen and waits until its title stands and it has gone quiet; a live screen may never be, so not for long. */
async function settle(page: Page, path: string): Promise<void> {
  const response = await page.goto(path);
  expect(response?.status(), path).toBe(200);
  await page.locator('h1').first().waitFor();
  await page.waitForLoadState('networkidle', { timeout: 3000 }).catch(() => undefined);
}

async function widerThanGlass(page: Page): Promise<number> {
  return page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
}

describe.each(screens)('as $role', ({ role, paths }) => {
  it.each(['dark', 'light'] as const satisfies readonly Theme[])(
    'every screen is readable by all, %s',
    async (theme) => {
      const { page, complaints } = await openPage(browser, { theme });
      if (role) await signIn(page, personOf[role]);
      for (const path of paths) {
        await page.goto(path);
        await page.waitForLoadState('networkidle');
        expect(await page.locator('h1').count(), `${path} has its title`).toBeGreaterThan(0);
        expect(await axe(page), `${path}, ${theme}`).toEqual([]);
      }
      expect(complaints).toEqual([]);
      await page.context().close();
    },
  );

  it.each([
    ['tablet', 1024, 768],
    ['phone', 390, 844],
  ] as const)('no screen is wider than a %s', async (_, width, height) => {
    const { page } = await openPage(browser, { width, height, isTouch: true });
    if (role) await signIn(page, personOf[role]);
    for (const path of paths) {
      await settle(page, path);
      expect(await widerThanGlass(page), path).toBeLessThanOrEqual(0);
    }
    await page.context().close();
  });
});
