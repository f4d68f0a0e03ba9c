import { describe, expect, test } from 'vitest';
import type { Page } from 'playwright-core';
import { expectSound, signUp, withBrowser } from './browser';

const { visit } = withBrowser();

const csv = `radius_um,density_g_cm3,material\n${Array.from({ length: 30 }, (_, index) => `${0.1 + index / 20},2.6,astrosil`).join('\n')}\n`;

/** The newest message to an address, opened in the outbox; its link is followed as a reader would. */
async function followLinkTo(page: Page, email: string, subject: RegExp): Promise<void> {
  const message = page
    .locator('article', { hasText: email })
    .filter({ has: page.getByRole('heading', { name: subject }) })
    .first();
  for (let look = 0; look < 40 && !(await message.isVisible()); look += 1) {
    await page.goto('/outbox');
    await page.waitForTimeout(250);
  }
  await message.getByRole('link').click();
}

async function finishedRun(page: Page): Promise<void> {
  await page.goto('/catalogues/new');
  await page
    .locator('input[type=file]')
    .setInputFiles({ name: 'grains.csv', mimeType: 'text/csv', buffer: Buffer.from(csv) });
  await page.getByRole('button', { name: 'Upload and check' }).click();
  await page.waitForURL(/\/catalogues\/[0-9a-f-]{36}$/);
  await page.getByRole('link', { name: 'Start a run with this catalogue' }).click();
  await page.getByText('One efficiency for all').click();
  await page
    .getByLabel(/Q_pr|efficiency/i)
    .last()
    .fill('1');
  await page.getByRole('button', { name: 'Start the run' }).click();
  await page.getByText(/Starlight of .* unbinds/).waitFor({ timeout: 60_000 });
}

describe('a group', () => {
  test('invites by mail; a new person follows the link, joins, and is shown with their role', async () => {
    const pi = await visit();
    await signUp(pi.page);
    await pi.page.goto('/group');
    await expectSound(pi);
    const email = `invited-${Date.now()}@example.org`;
    await pi.page.getByLabel('E-mail address').fill(email);
    await pi.page.getByLabel('Role', { exact: true }).selectOption('student');
    await pi.page.getByRole('button', { name: 'Make an invitation' }).click();
    await pi.page.getByText(/it is not shown again/).waitFor();

    const guest = await visit();
    await followLinkTo(guest.page, email, /invites you/);
    await guest.page.waitForURL('**/invitation/*');
    await expectSound(guest);
    await guest.page.getByLabel('Your name').fill('Invited Person');
    await guest.page.getByLabel('Password', { exact: true }).fill('grains drift away');
    await guest.page.getByRole('button', { name: 'Create an account and join' }).click();
    await guest.page.waitForURL('**/home');
    await guest.page.goto('/catalogues/new');
    await guest.page.getByText(/for researchers and the principal investigator/).waitFor();

    await pi.page.goto('/group');
    await pi.page.getByText('Invited Person').first().waitFor();
    await pi.page.goto('/changes');
    await pi.page.getByText('group.join').first().waitFor();
    await expectSound(pi);
    await pi.page.goto('/roles');
    await expectSound(pi);
  });
});

describe('a forgotten password', () => {
  test('is replaced by the link in the message; looking at the link uses nothing up', async () => {
    const seen = await visit();
    const email = await signUp(seen.page);
    const out = await visit();
    await out.page.goto('/forgotten');
    await expectSound(out);
    await out.page.getByLabel('E-mail address').fill(email);
    await out.page.getByRole('button', { name: 'Send me a link' }).click();
    await out.page.getByText('Look into your e-mail').waitFor();
    await followLinkTo(out.page, email, /new password/);
    await out.page.waitForURL('**/reset/*');
    await out.page.reload();
    await out.page.getByLabel('New password').fill('a fresh and long one');
    await out.page.getByRole('button', { name: 'Set the password' }).click();
    await out.page.waitForURL('**/sign-in');
    await out.page.getByLabel('E-mail address').fill(email);
    await out.page.getByLabel('Password', { exact: true }).fill('a fresh and long one');
    await out.page.getByRole('button', { name: 'Sign in' }).click();
    await out.page.waitForURL('**/home');
    await seen.page.goto('/home');
    await seen.page.waitForURL('**/sign-in');
  });

  test('an address is confirmed by the link in the message', async () => {
    const { page } = await visit();
    const email = await signUp(page);
    await page.goto('/account');
    await page.getByText('Your e-mail address is not confirmed').waitFor();
    await followLinkTo(page, email, /Confirm your e-mail/);
    await page.getByRole('button', { name: 'It is my address' }).click();
    await page.waitForURL('**/home');
    await page.goto('/account');
    expect(await page.getByText('Your e-mail address is not confirmed').count()).toBe(0);
  });
});

describe('a shared run', () => {
  test('is read without an account behind its passphrase, names nobody, and is gone when revoked', async () => {
    const owner = await visit();
    await signUp(owner.page);
    await finishedRun(owner.page);
    await owner.page.getByLabel('Passphrase').fill('winnow the chaff');
    await owner.page.getByRole('button', { name: 'Make a link' }).click();
    const link = await owner.page.getByText(/\/s\//).innerText();
    await expectSound(owner);

    const reader = await visit({ width: 390, colorScheme: 'dark' });
    const answer = await reader.page.goto(link);
    expect(answer?.headers()).toMatchObject({ 'referrer-policy': 'no-referrer', 'x-robots-tag': 'noindex, nofollow' });
    expect(answer?.headers()['cache-control']).toContain('no-store');
    await reader.page.getByLabel('Passphrase').fill('not the passphrase');
    await reader.page.getByRole('button', { name: 'Show the run' }).click();
    await reader.page.getByText('This is not the passphrase.').waitFor();
    await reader.page.getByLabel('Passphrase').fill('winnow the chaff');
    await reader.page.getByRole('button', { name: 'Show the run' }).click();
    await reader.page.getByText(/Starlight of .* unbinds/).waitFor();
    await reader.page.getByText('30 rows.').waitFor();
    expect(await reader.page.getByText('Somebody New').count()).toBe(0);
    expect(await reader.page.getByRole('link', { name: /Download all grains/ }).count()).toBe(0);
    await expectSound(reader);

    await owner.page.getByRole('button', { name: /Revoke the link/ }).click();
    await owner.page.getByRole('cell', { name: 'revoked' }).waitFor();
    expect((await reader.page.goto(link))?.status()).toBe(404);
  });
});
