import { readdir, readFile } from 'node:fs/promises';
import path from 'node:path';
import AxeBuilder from '@axe-core/playwright';
import { type APIRequestContext, expect, type Page } from '@playwright/test';
import { type ParsedMail, simpleParser } from 'mailparser';

/** The same words as tests/setup/serve.mjs gives the server. */
const cronSecret = process.env.E2E_CRON_SECRET ?? 'cron secret of the browser tests';
const mailbox = process.env.E2E_MAILBOX ?? path.resolve(__dirname, '..', '.out', 'e2e', 'mailbox');
const demoPassword = 'cedar-and-rain-42';

export const phone = { width: 390, height: 844 };
export const desk = { width: 1280, height: 900 };

export async function signIn(page: Page, email: string, password = demoPassword) {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address', { exact: true }).fill(email);
  await page.locator('input[name=password]').fill(password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.waitForURL((url) => !/^\/(sign-in|start)/.test(url.pathname));
}

export async function signOut(page: Page) {
  await page.getByRole('button', { name: 'Sign out', exact: true }).click();
  await page.waitForURL(/\/sign-in/);
}

export type RunCounts = { items: number; mails: number; sent: number; deliveries: number };

/** What a hosted cron does. */
export async function runReminders(request: APIRequestContext): Promise<RunCounts> {
  const response = await request.post('/api/cron/reminders', { headers: { authorization: `Bearer ${cronSecret}` } });
  expect(response.status()).toBe(200);
  return (await response.json()) as RunCounts;
}

const addressOf = (mail: ParsedMail) => (mail.to && 'value' in mail.to ? mail.to.value[0]?.address : undefined);

/** Every message that the mail server got for an address, oldest first. */
export async function mailFor(address: string): Promise<ParsedMail[]> {
  const names = (await readdir(mailbox)).filter((name) => name.endsWith('.eml')).sort();
  const mails = await Promise.all(names.map(async (name) => simpleParser(await readFile(path.join(mailbox, name)))));
  return mails.filter((mail) => addressOf(mail) === address);
}

/** Waits for the newest mail whose subject fits. */
export async function waitForMail(address: string, subject: RegExp): Promise<ParsedMail> {
  let found: ParsedMail | undefined;
  await expect(async () => {
    found = (await mailFor(address)).findLast((mail) => subject.test(mail.subject ?? ''));
    expect(found).toBeDefined();
  }).toPass({ timeout: 15_000 });
  return found as ParsedMail;
}

export const linkIn = (mail: ParsedMail, route: string): string => {
  const found = new RegExp(`https?://[^/\\s]+(/${route}\\S*)`).exec(mail.text ?? '')?.[1];
  if (!found) throw new Error(`no link to /${route} in the mail`);
  return found;
};

/** No WCAG 2.2 AA finding, no sideways scroll, one main heading. */
export async function expectSound(page: Page) {
  await expect(page.getByRole('heading', { level: 1 })).toHaveCount(1);
  const sideways = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(sideways, `${page.url()} scrolls sideways`).toBeLessThanOrEqual(0);
  const { violations } = await new AxeBuilder({ page }).setLegacyMode(true).withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']).analyze();
  const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html.slice(0, 160)).join(' | ')}`);
  expect(found, page.url()).toEqual([]);
}
