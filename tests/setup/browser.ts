import { AxeBuilder } from '@axe-core/playwright';
import { chromium, type Browser, type Page } from 'playwright-core';
import { inject } from 'vitest';
import './provided';

const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];
const wcag = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

export type Theme = 'dark' | 'light';

export interface View {
  theme?: Theme;
  width?: number;
  height?: number;
  /** a finger in place of a mouse */
  isTouch?: boolean;
}

export interface Person {
  email: string;
  password: string;
}

export function launchBrowser(): Promise<Browser> {
  return chromium.launch({ executablePath: process.env.CHROMIUM_PATH || '/usr/bin/chromium', args: flags });
}

/**
 * A page of its own session on the started product. `complaints` gathers errors of scripts and of the console:
 * a journey ends with `expect(complaints).toEqual([])`.
 */
export async function openPage(browser: Browser, view: View = {}): Promise<{ page: Page; complaints: string[] }> {
  const { theme = 'light', width = 1440, height = 900, isTouch = false } = view;
  const context = await browser.newContext({
    baseURL: inject('baseUrl'),
    viewport: { width, height },
    colorScheme: theme,
    hasTouch: isTouch,
    locale: 'en-GB',
    timezoneId: 'UTC',
    // Movement would make a screenshot and a contrast check depend on the moment.
    reducedMotion: 'reduce',
  });
  const page = await context.newPage();
  page.setDefaultTimeout(20_000);
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(`script: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(`console: ${message.text()} (${message.location().url})`);
  });
  return { page, complaints };
}

/** People whose theme follows the system, as everybody's does at first, see the change at once. */
export async function useTheme(page: Page, theme: Theme): Promise<void> {
  await page.emulateMedia({ colorScheme: theme });
}

/** Signs in through the form and waits until the first screen has come. */
export async function signIn(page: Page, { email, password }: Person): Promise<void> {
  await page.goto('/sign-in');
  const form = page.locator('form', { has: page.locator('input[name="password"]') });
  await form.locator('input[name="email"]').fill(email);
  await form.locator('input[name="password"]').fill(password);
  await form.locator('button[type="submit"]').click();
  const refusal = form.getByRole('alert');
  const refused = refusal.waitFor().then(async () => {
    throw new Error(`${email} was refused: ${await refusal.innerText()}`);
  });
  // The one that loses the race ends with the page, and nobody is to hear of it.
  refused.catch(() => undefined);
  await Promise.race([page.waitForURL((url) => !url.pathname.startsWith('/sign-in')), refused]);
}

/** What axe finds against WCAG 2.2 AA, one line a finding; nothing found is an empty list. */
export async function axe(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).withTags(wcag).analyze();
  return violations.flatMap(({ id, help, nodes }) =>
    nodes.map(({ target, failureSummary }) => `${id}: ${help} at ${target.join(' ')} — ${failureSummary ?? ''}`),
  );
}
