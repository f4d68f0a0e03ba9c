import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { expectSound, looks, signUp, withBrowser } from './browser';

const { visit } = withBrowser();

const csv = [
  'label,diameter_um,diameter_um_sigma,density_g_cm3,material',
  ...Array.from(
    { length: 120 },
    (_, index) =>
      `g${index},${(0.1 * 1.05 ** index).toPrecision(4)},${(0.01 * 1.05 ** index).toPrecision(2)},2.6,${index % 3 ? 'astrosil' : 'carbon_be'}`,
  ),
].join('\n');
const upload = (content: string, name = 'my-grains.csv') => ({
  name,
  mimeType: 'text/csv',
  buffer: Buffer.from(content),
});

describe('from a file to an answer', () => {
  test('a newcomer signs up, uploads, runs, reads the answer and downloads it', async () => {
    const seen = await visit();
    const { page } = seen;
    await signUp(page);
    await expectSound(seen);

    await page
      .getByRole('link', { name: /Upload a catalogue|New catalogue/ })
      .first()
      .click();
    await page.waitForURL('**/catalogues/new');
    await page.locator('input[type=file]').setInputFiles(upload(csv));
    await page
      .getByText(/rows are in order|in order/)
      .first()
      .waitFor();
    await expectSound(seen);
    await page.getByRole('button', { name: 'Upload and check' }).click();
    await page.waitForURL(/\/catalogues\/[0-9a-f-]{36}$/);
    await page.getByRole('link', { name: 'Start a run with this catalogue' }).click();

    await page.waitForURL('**/runs/new?catalogueId=*');
    await page.getByLabel('Star', { exact: true }).selectOption({ label: 'Fomalhaut (A3V)' });
    await page.getByLabel(/Eccentricity/).fill('0.1');
    await page.getByText('0.45', { exact: true }).waitFor();
    await expectSound(seen);
    await page.getByRole('button', { name: 'Start the run' }).click();

    await page.waitForURL(/\/runs\/[0-9a-f-]{36}$/);
    await page.getByText(/Starlight of Fomalhaut unbinds/).waitFor({ timeout: 60_000 });
    await page.locator('.js-plotly-plot').nth(1).waitFor();
    await page.getByText('120 rows.').waitFor();
    await expectSound(seen);

    const waiting = page.waitForEvent('download');
    await page.getByRole('link', { name: /Download all grains/ }).click();
    const lines = readFileSync(await (await waiting).path(), 'utf8')
      .trimEnd()
      .split('\r\n');
    expect(lines).toHaveLength(121);

    await page.getByLabel('Fate', { exact: true }).selectOption('unbound');
    await page.getByRole('button', { name: 'Filter', exact: true }).click();
    await page.getByText(/rows? with this filter/).waitFor();
  });

  test('a file with bad rows earns a list, and nothing is half stored', async () => {
    const seen = await visit();
    const { page } = seen;
    await signUp(page);
    await page.goto('/catalogues/new');
    await page
      .locator('input[type=file]')
      .setInputFiles(upload('radius_um,density_g_cm3,material\n-1,2,astrosil\n1,2,cheese\n2,2,ice\n'));
    await page
      .getByText(/not valid/)
      .first()
      .waitFor();
    await page.getByRole('button', { name: 'Upload and check' }).click();
    await page.waitForURL(/\/catalogues\/[0-9a-f-]{36}$/);
    await page.getByText('This catalogue was not accepted').waitFor();
    await page.getByRole('cell', { name: 'cheese' }).waitFor();
    await expectSound(seen);
  });

  test('a picture is refused with a sentence', async () => {
    const { page } = await visit();
    await signUp(page);
    await page.goto('/catalogues/new');
    const picture = readFileSync(new URL('../../fixtures/catalogues/awkward/picture.bin', import.meta.url));
    await page
      .locator('input[type=file]')
      .setInputFiles({ name: 'picture.csv', mimeType: 'text/csv', buffer: picture });
    await page
      .getByText(/PNG image/)
      .first()
      .waitFor();
  });
});

describe.each(looks)('at $width px, $colorScheme', (look) => {
  test('every page is sound', async () => {
    const seen = await visit(look);
    const { page } = seen;
    await page.goto('/');
    await expectSound(seen);
    await page.goto('/sign-in');
    await expectSound(seen);
    await signUp(page);
    for (const path of [
      '/home',
      '/catalogues',
      '/catalogues/new',
      '/runs',
      '/runs/new',
      '/calculator',
      '/stars',
      '/materials',
      '/methods',
      '/account',
    ]) {
      await page.goto(path, { waitUntil: 'networkidle' });
      await expectSound(seen);
    }
  });
});

describe('signing in and out', () => {
  test('a wrong password says so and keeps the address; the right one goes home; out is out', async () => {
    const seen = await visit();
    const { page } = seen;
    const email = await signUp(page);
    await page.locator('summary', { hasText: 'Somebody New' }).click();
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.waitForURL('**/sign-in');
    await page.goto('/home');
    await page.waitForURL('**/sign-in');
    await page.getByLabel('E-mail address').fill(email);
    await page.getByLabel('Password', { exact: true }).fill('not this password');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByText(/do not belong together/).waitFor();
    expect(await page.getByLabel('E-mail address').inputValue()).toBe(email);
    await page.getByLabel('Password', { exact: true }).fill('grains drift away');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL('**/home');
    const [cookie] = (await seen.context.cookies()).filter(({ name }) => name === '__Host-session');
    expect(cookie).toMatchObject({ httpOnly: true, secure: true, sameSite: 'Lax', path: '/' });
  });
});
