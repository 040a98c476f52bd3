import { expect, test } from '@playwright/test';
import { desk, expectSound, phone, signIn } from './steps';

const looks = [
  { name: 'phone, dark', viewport: phone, colorScheme: 'dark' },
  { name: 'desk, light', viewport: desk, colorScheme: 'light' },
] as const;

for (const { name, ...look } of looks) {
  test.describe(name, () => {
    test.use(look);

    test('pages for everybody', async ({ page }) => {
      for (const path of ['/', '/sources', '/calculator', '/calculator?units=metric', '/sign-in', '/register', '/forgot', '/check-mail', '/auth-error', '/verify/none', '/no-such-page']) {
        await page.goto(path);
        await expectSound(page);
      }
    });

    test('pages of a homeowner', async ({ page }) => {
      test.setTimeout(120_000);
      await signIn(page, 'marit@example.com');
      await page.getByRole('link', { name: 'Larch Ridge' }).first().click();
      await page.waitForURL(/\/homes\/[\w-]{36}$/);
      const home = new URL(page.url()).pathname;
      for (const path of ['/homes', '/homes/new', '/account', home, `${home}/plan`, `${home}/record`, `${home}/buy`, `${home}/share`, `${home}/edit`, `${home}/walls/new`, '/homes/none']) {
        await page.goto(path);
        await expectSound(page);
      }
      await page.goto(home);
      await page.getByRole('link', { name: /East porch/ }).first().click();
      await page.waitForURL(/\/walls\//);
      await expect(page.locator('.recharts-surface')).toBeVisible();
      await expectSound(page);
      await page.goto(`${page.url()}/edit`);
      await expectSound(page);
    });

    test('pages of a contractor and of the operator', async ({ page }) => {
      await signIn(page, 'harlan@example.org');
      await expectSound(page);
      await page.goto('/work?kind=recaulk');
      await expectSound(page);
      await page.context().clearCookies();
      await signIn(page, 'reva@example.org');
      for (const path of ['/operator', '/operator/outbox', '/operator/mailbox']) {
        await page.goto(path);
        await expectSound(page);
      }
    });
  });
}

test('the stain calculator answers while one types, and without scripts', async ({ page, browser }) => {
  await page.goto('/calculator');
  await page.getByLabel('Width').fill('30');
  await page.getByLabel('Height', { exact: true }).fill('9');
  await page.getByLabel('Doors, windows').fill('36');
  await expect(page.getByText(/^234 ft², 248 ft² counting/)).toBeVisible();
  await page.getByLabel('Width').fill('thirty');
  await expect(page.getByText(/Width could not be read/)).toBeVisible();
  const plain = await (await browser.newContext({ javaScriptEnabled: false })).newPage();
  await plain.goto('/calculator');
  await plain.getByLabel('Width').fill('30');
  await plain.getByLabel('Height', { exact: true }).fill('9');
  await plain.getByLabel('Doors, windows').fill('36');
  await plain.getByRole('button', { name: 'Work it out' }).click();
  await expect(plain.getByText(/^234 ft², 248 ft² counting/)).toBeVisible();
});

test('a page behind sign-in leads there and back; another role’s page leads home', async ({ page }) => {
  await page.goto('/account');
  await expect(page).toHaveURL(/\/sign-in\?callbackUrl=%2Faccount/);
  await page.getByLabel('E-mail address', { exact: true }).fill('tobias@example.com');
  await page.locator('input[name=password]').fill('wrong words here');
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page.getByText(/do not go together/)).toBeVisible();
  await expect(page.getByLabel('E-mail address', { exact: true })).toHaveValue('tobias@example.com');
  await page.locator('input[name=password]').fill('cedar-and-rain-42');
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page).toHaveURL(/\/account$/);
  await page.goto('/operator');
  await expect(page).toHaveURL(/\/homes$/);
});
