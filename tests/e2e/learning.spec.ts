import { expect, test } from '@playwright/test';
import { expectSound, phone, signIn } from './steps';

test.use({ viewport: phone });

test('a walkaround gives an unknown wall a date; the work is put off, taken up again, put under an own rule, and priced', async ({ page }) => {
  test.setTimeout(150_000);
  await signIn(page, 'tobias@example.com');
  await page.getByRole('link', { name: 'Agate Point' }).first().click();
  await page.waitForURL(/\/homes\/[\w-]{36}$/);
  const home = new URL(page.url()).pathname;

  await test.step('walk around: what was seen moves the plan, and the page says so', async () => {
    await page.getByRole('link', { name: 'Walkaround', exact: true }).click();
    await page.waitForURL(/\/walkaround/);
    await expectSound(page);
    await page.getByRole('button', { name: 'Keep this walkaround' }).click();
    await expect(page.getByText(/Nothing is answered yet/)).toBeVisible();
    const wall = page.getByRole('region', { name: 'Wood-shed side' });
    await wall.getByRole('radio', { name: 'Darkens the wood' }).check();
    await wall.getByRole('radio', { name: 'Holds on both sides' }).check();
    await page.getByRole('button', { name: 'Keep this walkaround' }).click();
    await page.waitForURL(new RegExp(`${home}$`));
    await expect(page.getByText(/^Walkaround kept\..*Wood-shed side: next restain in .*next recaulk in /)).toBeVisible();
  });

  await page.getByRole('link', { name: /Wood-shed side/ }).first().click();
  await page.waitForURL(/\/walls\//);
  const wallPath = new URL(page.url()).pathname;
  await expect(page.getByText(/It was found due on .*\(assumed\)/).first()).toBeVisible();
  await expectSound(page);

  await test.step('put the restain off, at a stated price, and take it up again', async () => {
    await page.getByRole('link', { name: /Put off the restain/ }).click();
    await page.waitForURL(/\/put-off/);
    await expect(page.getByText(/past the end of its coat/)).toBeVisible();
    await expectSound(page);
    await page.getByRole('button', { name: 'Put off the restain' }).click();
    await page.waitForURL(/\/plan\?/);
    await expect(page.getByText(/^Put off\..*Wood-shed side: next restain moves/)).toBeVisible();
    await expect(page.getByText(/It was put off to/).first()).toBeVisible();
    await page.getByRole('button', { name: 'Take it up again' }).click();
    await expect(page.getByText(/^Taken up again\..*Wood-shed side: next restain moves/)).toBeVisible();
  });

  await test.step('an own rule is shown day by day, refused in words, saved, and dropped', async () => {
    await page.goto(`${wallPath}/rule?kind=restain`);
    await expectSound(page);
    await page.getByRole('radio', { name: /A rule I write myself/ }).check();
    await page.getByLabel('The rule', { exact: true }).fill('FREQ=DAILY');
    await page.getByRole('button', { name: 'Save my rule' }).click();
    await expect(page.locator('[aria-invalid=true]').first()).toBeVisible();
    await page.getByLabel('The rule', { exact: true }).fill('FREQ=YEARLY;INTERVAL=4;BYMONTH=7;BYMONTHDAY=1');
    await expect(page.getByText(/July 1, 20\d\d/).first()).toBeVisible();
    await page.getByRole('button', { name: 'Save my rule' }).click();
    await page.waitForURL(new RegExp(`${wallPath}$`));
    await expect(page.getByText(/^Your rule is saved\./)).toBeVisible();
    await page.goto(`${wallPath}/rule?kind=restain`);
    await page.getByRole('button', { name: /Go back to the computed rule/ }).click();
    await page.getByRole('dialog').getByRole('button', { name: /Go back/ }).click();
    await page.waitForURL(new RegExp(`${wallPath}$`));
  });

  await test.step('prices change the years ahead', async () => {
    await page.goto(`${home}/budget`);
    await expect(page.locator('.recharts-surface')).toBeVisible();
    const total = () => page.locator('summary').filter({ hasText: 'Cost through' }).textContent();
    const before = await total();
    await page.getByRole('radio', { name: /A contractor does it/ }).check();
    await page.getByRole('button', { name: 'Save the prices' }).click();
    await expect(page.locator('summary').filter({ hasText: 'Cost through' })).not.toHaveText(before ?? '');
  });
});
