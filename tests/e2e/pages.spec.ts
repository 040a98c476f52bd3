import { expect, test } from '@playwright/test';
import { desk, expectSound, phone, signIn } from './steps';

const looks = [
  { name: 'phone, dark', viewport: phone, colorScheme: 'dark', all: true },
  // On the wide page only those that are laid out anew there.
  { name: 'desk, light', viewport: desk, colorScheme: 'light', all: false },
] as const;

for (const { name, all, ...look } of looks) {
  test.describe(name, () => {
    test.use(look);
    const everybody = ['/', '/calculator', ...(all ? ['/sources', '/calculator?units=metric', '/sign-in', '/register', '/forgot', '/check-mail', '/auth-error', '/verify/none', '/no-such-page'] : [])];

    test('pages for everybody', async ({ page }) => {
      for (const path of everybody) {
        await page.goto(path);
        await expectSound(page);
      }
    });

    test('pages of a homeowner', async ({ page }) => {
      await signIn(page, 'marit@example.com');
      await page.getByRole('link', { name: 'Larch Ridge' }).first().click();
      await page.waitForURL(/\/homes\/[\w-]{36}$/);
      const home = new URL(page.url()).pathname;
      for (const path of ['/homes/new', `${home}/plan`, `${home}/buy`, ...(all ? ['/homes', '/account', `${home}/record`, `${home}/day`, `${home}/budget`, `${home}/share`, `${home}/edit`, `${home}/walls/new`, '/homes/none'] : [])]) {
        await page.goto(path);
        await expectSound(page);
      }
      await page.goto(home);
      await expectSound(page);
      await page.getByRole('link', { name: /East porch/ }).first().click();
      await page.waitForURL(/\/walls\//);
      await expect(page.locator('.recharts-surface')).toBeVisible();
      await expectSound(page);
      if (!all) return;
      await page.goto(`${page.url()}/edit`);
      await expectSound(page);
    });

    test('pages of a contractor and of the operator', async ({ page }) => {
      await signIn(page, 'harlan@example.org');
      await expectSound(page);
      await page.context().clearCookies();
      await signIn(page, 'reva@example.org');
      for (const path of all ? ['/operator', '/operator/outbox', '/operator/mailbox'] : ['/operator/outbox']) {
        await page.goto(path);
        await expectSound(page);
      }
    });
  });
}

test('the stain calculator answers while one types, and without scripts', async ({ page, browser }) => {
  const size = (on: typeof page, label: string) => on.getByRole('group', { name: 'Wall 1' }).getByLabel(label, { exact: true }).first();
  await page.goto('/calculator');
  await size(page, 'Width').fill('40');
  await size(page, 'Height').fill('10');
  await expect(page.getByText(/364 ft²/).filter({ visible: true }).first()).toBeVisible();
  await size(page, 'Width').fill('forty');
  await expect(page.getByText(/Width could not be read/)).toBeVisible();
  const plain = await (await browser.newContext({ javaScriptEnabled: false })).newPage();
  await plain.goto('/calculator');
  await size(plain, 'Width').fill('40');
  await size(plain, 'Height').fill('10');
  await plain.getByRole('button', { name: 'Work it out' }).click();
  await expect(plain.getByText(/364 ft²/).filter({ visible: true }).first()).toBeVisible();
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
