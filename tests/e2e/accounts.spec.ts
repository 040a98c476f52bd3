import { expect, test } from '@playwright/test';
import { expectSound, linkIn, phone, signIn, signOut, waitForMail } from './steps';

test.use({ viewport: phone });

test('a sign-in link by mail, used once by its button', async ({ page }) => {
  const email = `newcomer-${Date.now()}@example.com`;
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address for the link').fill(email);
  await page.getByRole('button', { name: 'Send me a sign-in link' }).click();
  await expect(page.getByText(/on its way/)).toBeVisible();
  const link = linkIn(await waitForMail(email, /sign-in link/), 'sign-in/link');
  await page.goto(link);
  await expectSound(page);
  await page.getByRole('button', { name: /^Sign in/ }).click();
  await page.waitForURL(/\/homes$/);
  await signOut(page);
  await page.goto(link);
  const again = page.getByRole('button', { name: /^Sign in/ });
  if (await again.isVisible()) await again.click();
  await expect(page.getByText(/used already|no longer works/).first()).toBeVisible();
});

test('a forgotten password is set anew from the mail', async ({ page }) => {
  const email = 'wendell@example.com';
  await page.goto('/sign-in');
  await page.getByRole('link', { name: 'I do not know my password' }).click();
  await page.waitForURL(/\/forgot/);
  await page.getByLabel('E-mail address').fill(email);
  await page.getByRole('button', { name: 'Send the link' }).click();
  await page.waitForURL(/\/check-mail/);
  await page.goto(linkIn(await waitForMail(email, /new password/), 'reset/'));
  await expectSound(page);
  await page.getByLabel('New password').fill('short');
  await page.getByRole('button', { name: 'Set the password' }).click();
  await expect(page.getByText(/at least 10 characters\. Three/).last()).toBeVisible();
  await page.getByLabel('New password').fill('larch needles in may');
  await page.getByRole('button', { name: 'Set the password' }).click();
  await page.waitForURL(/\/sign-in/);
  await signIn(page, email, 'larch needles in may');
  await expect(page).toHaveURL(/\/homes$/);
});
