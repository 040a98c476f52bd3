import { expect, test } from '@playwright/test';
import { desk, expectSound, linkIn, mailFor, phone, runReminders, signIn, signOut, waitForMail } from './steps';

/** The day so many months ago, at the machine's clock. */
function monthsAgo(months: number): string {
  const date = new Date();
  date.setMonth(date.getMonth() - months, 10);
  return date.toISOString().slice(0, 10);
}

test.use({ viewport: phone });

test('from registering to a reminder in the mailbox, a logged coat and a changed plan; the contractor sees it', async ({ page, request }) => {
  test.setTimeout(180_000);
  const email = `owner-${Date.now()}@example.com`;
  const password = 'three words in a row';

  await test.step('register, and confirm the address from the mail', async () => {
    await page.goto('/');
    await page.getByRole('link', { name: /register|make an account|set up/i }).first().click();
    await page.waitForURL(/\/register/);
    await page.getByLabel('Your name').fill('Ingrid Tolliver');
    await page.getByLabel('E-mail address').fill(email);
    await page.locator('input[name=password]').fill(password);
    await page.getByRole('button', { name: 'Make the account' }).click();
    await page.waitForURL(/\/check-mail/);
    await page.goto(linkIn(await waitForMail(email, /confirm/i), 'verify/'));
    await page.getByLabel('The password you chose').fill(password);
    await page.getByRole('button', { name: 'Confirm and sign in' }).click();
    await page.waitForURL(/\/homes$/);
  });

  await test.step('set up a home from its postal code', async () => {
    await page.getByRole('link', { name: /add a home|set up/i }).first().click();
    await page.waitForURL(/\/homes\/new/);
    await page.getByRole('button', { name: 'Set up the home' }).click();
    await expect(page.getByLabel('What do you call it?')).toHaveAttribute('aria-invalid', 'true');
    await page.getByLabel('What do you call it?').fill('Saguaro House');
    await page.getByLabel('Postal code').fill('85003');
    await expect(page.getByText('Phoenix').first()).toBeVisible();
    await expect(page.getByText('2B').first()).toBeVisible();
    await page.getByLabel('Finish on the wood').selectOption('water-repellent');
    await page.getByLabel('Last stained').fill(monthsAgo(25));
    await page.getByLabel('Last caulked').fill(monthsAgo(25));
    await page.getByRole('button', { name: 'Set up the home' }).click();
    await page.waitForURL(/\/homes\/[\w-]{36}$/);
    await expect(page.getByRole('heading', { level: 1, name: 'Saguaro House' })).toBeVisible();
    await expect(page.getByText('Due', { exact: true }).first()).toBeVisible();
    await expectSound(page);
  });
  const homePath = new URL(page.url()).pathname;

  await test.step('a wall explains its figures; a change to it moves the plan', async () => {
    await page.getByRole('link', { name: /Front/ }).first().click();
    await page.waitForURL(/\/walls\//);
    await expectSound(page);
    await page.getByText('Coat life', { exact: true }).click();
    await expect(page.getByText(/Wood Handbook/).first()).toBeVisible();
    const before = await page.locator('summary').filter({ hasText: 'Sun dose' }).textContent();
    await page.getByRole('link', { name: 'Edit this wall' }).click();
    await page.getByLabel('Depth of the eave').fill('8');
    await page.getByRole('button', { name: /^Save/ }).click();
    await page.waitForURL(/\/walls\/[\w-]{36}$/);
    await expect(page.locator('summary').filter({ hasText: 'Sun dose' })).not.toHaveText(before ?? '');
  });

  await test.step('the reminder goes out once', async () => {
    const run = await runReminders(request);
    expect(run.mails).toBeGreaterThanOrEqual(1);
    const reminder = await waitForMail(email, /Saguaro House/);
    expect(reminder.text).toContain('Restain: can be done now');
    expect(reminder.html).toContain('Saguaro House');
    const count = (await mailFor(email)).length;
    await Promise.all([runReminders(request), runReminders(request)]);
    expect((await mailFor(email)).length).toBe(count);
  });

  await test.step('the operator reads it in the mailbox', async () => {
    await signOut(page);
    await signIn(page, 'reva@example.org');
    await page.goto('/operator/mailbox');
    await page.getByRole('link', { name: /Saguaro House/ }).first().click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('Saguaro House');
    await expect(page.frameLocator('iframe').getByText('Restain: can be done now').first()).toBeVisible();
    await expectSound(page);
    await signOut(page);
  });

  await test.step('the owner logs one wall straight from the mail, without signing in', async () => {
    await page.goto(linkIn(await waitForMail(email, /Saguaro House/), 'do/'));
    await expectSound(page);
    await expect(page.getByRole('heading', { level: 1 })).toHaveText(/^Log the \w+ of .* as done\?$/);
    await page.getByRole('button', { name: 'Log it' }).click();
    await expect(page.getByText(/^Logged\. To take it back/)).toBeVisible();
  });

  await test.step('the owner logs the restain of every wall; the plan changes at once', async () => {
    await signIn(page, email, password);
    await page.goto(`${homePath}/log?kind=restain`);
    await expectSound(page);
    await expect(page.getByRole('radio', { name: /Restain/ })).toBeChecked();
    await page.getByRole('button', { name: 'Choose all walls' }).click();
    await page.getByLabel('Product').fill('Clear coat, two cans');
    await page.getByLabel('Cost').fill('$1,240.50');
    await page.getByRole('button', { name: 'Log it' }).click();
    await page.waitForURL(new RegExp(`${homePath}$`));
    await expect(page.getByText(/^Logged\./)).toBeVisible();
    await expect(page.getByText(/Restain .*moves|Restain .*→|restain moves/i).first()).toBeVisible();
    await page.goto(`${homePath}/record`);
    await expect(page.getByText('$1,240.50')).toBeVisible();
  });

  await test.step('the next run is silent about those walls', async () => {
    const count = (await mailFor(email)).length;
    await runReminders(request);
    expect((await mailFor(email)).length).toBe(count);
  });

  await test.step('shared with a contractor, who sees it and no other home', async () => {
    await page.goto(`${homePath}/share`);
    await page.getByLabel('Their e-mail address').fill('odile@example.org');
    await page.getByRole('button', { name: 'Share the home' }).click();
    await expect(page.getByText('odile@example.org').first()).toBeVisible();
    await waitForMail('odile@example.org', /Saguaro House/);
    await signOut(page);
    await signIn(page, 'odile@example.org');
    await expect(page).toHaveURL(/\/work$/);
    await expect(page.getByRole('heading', { name: 'Saguaro House' }).first()).toBeVisible();
    await expect(page.getByRole('heading', { name: 'Laurel Cabin (rental)' }).first()).toBeVisible();
    await expect(page.getByRole('heading', { name: /Larch Ridge|Agate Point|Pruitt/ })).toHaveCount(0);
    await page.goto(homePath.replace('/homes/', '/work/'));
    await expectSound(page);
    expect((await page.goto(homePath))?.url()).not.toContain(homePath);
  });
});

test('the contractor logs work and the owner sees it', async ({ page }) => {
  await page.setViewportSize(desk);
  await signIn(page, 'harlan@example.org');
  await page.getByRole('link', { name: 'Log work here' }).first().click();
  await expectSound(page);
  await page.getByRole('radio', { name: /Recaulk/ }).check();
  await page.getByRole('button', { name: 'Choose all walls' }).click();
  await page.getByLabel('Note').fill('Both bedroom windows too.');
  await page.getByRole('button', { name: 'Log it' }).click();
  await page.waitForURL(/\/work\/[\w-]{36}$/);
  await expect(page.getByText('Both bedroom windows too.')).toBeVisible();
  const homeId = new URL(page.url()).pathname.split('/').pop() ?? '';
  await signOut(page);
  await signIn(page, 'marit@example.com');
  await page.goto(`/homes/${homeId}/record`);
  await expect(page.getByText('Both bedroom windows too.')).toBeVisible();
  await expect(page.getByText('Harlan Voss').first()).toBeVisible();
});
