import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { AxeBuilder } from '@axe-core/playwright';
import { chromium } from 'playwright-core';
import type { Browser, BrowserContext, Page } from 'playwright-core';

const PASSWORD = 'measure twice buy once';
const SCREENSHOTS = join(import.meta.dirname, '../../.local/screenshots');

export const productUrl = required('E2E_URL');
export const inboxUrl = required('E2E_INBOX_URL');

export function startBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: required('CHROMIUM_PATH'),
    args: ['--no-sandbox', '--disable-dev-shm-usage', '--disable-background-networking', '--no-first-run'],
  });
}

interface Look {
  width?: number;
  height?: number;
  dark?: boolean;
}

/** A new person's browser: no cookies, no memory. What its pages complain about ends up in `complaints`. */
export async function newPage(browser: Browser, { width = 1440, height = 900, dark = false }: Look = {}) {
  const context = await browser.newContext({
    viewport: { width, height },
    colorScheme: dark ? 'dark' : 'light',
    reducedMotion: 'reduce',
  });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  return { context, page, complaints };
}

export async function signIn(page: Page, email: string): Promise<void> {
  await page.goto(`${productUrl}/sign-in`);
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname.startsWith('/rounds/'));
}

/** Goes to a page of the round by the navigation. */
export async function open(page: Page, name: string): Promise<void> {
  await page
    .getByRole('navigation')
    .getByRole('link', { name: new RegExp(`^${name}`, 'u') })
    .click();
  await page.getByRole('heading', { level: 1 }).waitFor();
}

export async function picture(page: Page, name: string): Promise<void> {
  mkdirSync(SCREENSHOTS, { recursive: true });
  await page.screenshot({ path: join(SCREENSHOTS, `${name}.png`) });
}

/** What axe finds on the page, one line each. */
export async function accessibilityProblems(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations.flatMap(({ id, nodes }) => nodes.map(({ target }) => `${id}: ${target.join(' ')}`));
}

export function close({ context }: { context: BrowserContext }): Promise<void> {
  return context.close();
}

function required(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set; the browser tests are started by npm test.`);
  return value;
}
