import AxeBuilder from '@axe-core/playwright';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { afterAll, beforeAll, expect, inject } from 'vitest';

const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export type Look = { width: number; colorScheme: 'light' | 'dark' };
export const looks: Look[] = [
  { width: 1440, colorScheme: 'light' },
  { width: 1440, colorScheme: 'dark' },
  { width: 390, colorScheme: 'light' },
  { width: 390, colorScheme: 'dark' },
];

/** One browser per test file; each visit is a context of its own and notes what the console complained of. */
export function withBrowser() {
  let browser: Browser;
  beforeAll(async () => {
    browser = await chromium.launch({ executablePath: '/usr/bin/chromium', args: flags });
  });
  afterAll(async () => {
    await browser?.close();
  });
  return {
    async visit({ width, colorScheme }: Look = looks[0]): Promise<Visit> {
      const context = await browser.newContext({
        viewport: { width, height: 900 },
        colorScheme,
        acceptDownloads: true,
        baseURL: inject('productUrl'),
      });
      const page = await context.newPage();
      const complaints: string[] = [];
      page.on(
        'console',
        (message) => message.type() === 'error' && complaints.push(`${message.text()} ${message.location().url}`),
      );
      page.on('pageerror', (error) => complaints.push(error.message));
      return { context, page, complaints };
    },
  };
}

export type Visit = { context: BrowserContext; page: Page; complaints: string[] };

/** No violation of WCAG that axe can find, nothing wider than the screen, nothing the console complains of. */
export async function expectSound({ page, complaints }: Visit): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`)).toEqual(
    [],
  );
  const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(overflow, 'the page is wider than the screen').toBeLessThanOrEqual(0);
  expect(complaints).toEqual([]);
}

let made = 0;

export async function signUp(page: Page): Promise<string> {
  const email = `person${Date.now()}-${++made}@example.org`;
  await page.goto('/sign-up');
  await page.getByLabel('Your name').fill('Somebody New');
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password', { exact: true }).fill('grains drift away');
  await page.getByLabel('Name of your group').fill('A dust group');
  await page.getByRole('button', { name: 'Create the account' }).click();
  await page.waitForURL('**/home');
  return email;
}
