import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  accessibilityProblems,
  close,
  newPage,
  open,
  picture,
  productUrl,
  signIn,
  startBrowser,
} from './browser';

const SCREENS = ['Overview', 'Candidates', 'Quotes', 'Limits', 'Scoring', 'Frontier', 'Approval'];
const COORDINATOR = 'callum.reed@brindlecombe.example';
const ASSESSOR = 'sian.mercer@brindlecombe.example';

let browser: Browser;

beforeAll(async () => {
  browser = await startBrowser();
});
afterAll(() => browser.close());

describe.each([
  ['light', { width: 1440, height: 900 }],
  ['dark', { width: 1440, height: 900, dark: true }],
  ['narrow', { width: 390, height: 844 }],
])('every screen, %s', (look, options) => {
  it('passes axe, fits its width and complains of nothing', async () => {
    const person = await newPage(browser, options);
    const { page } = person;
    await page.goto(`${productUrl}/sign-in`);
    await page.getByRole('button', { name: 'Sign in' }).waitFor();
    const problems: [screen: string, found: string[]][] = [['Sign in', await accessibilityProblems(page)]];
    await picture(page, `screen-sign-in-${look}`);
    await signIn(page, COORDINATOR);
    for (const screen of SCREENS) {
      if (options.width < 768) await page.getByRole('button', { name: /menu/iu }).first().click();
      await open(page, screen);
      await page.waitForLoadState('networkidle');
      problems.push([screen, await accessibilityProblems(page)]);
      expect([screen, await page.evaluate(() => document.documentElement.scrollWidth)]).toEqual([
        screen,
        options.width,
      ]);
      await picture(page, `screen-${screen.toLowerCase()}-${look}`);
    }
    expect(problems.filter(([, found]) => found.length > 0)).toEqual([]);
    expect(person.complaints).toEqual([]);
    await close(person);
  });
});

describe('two organisations in two browsers', () => {
  it('show nothing of each other, not even that a page exists', async () => {
    const mine = await newPage(browser);
    await signIn(mine.page, COORDINATOR);
    const address = mine.page.url();
    const other = await newPage(browser);
    await signIn(other.page, 'hanne.vos@marrowfen.example');
    await other.page.goto(address);
    const foreign = await other.page.locator('main').innerText();
    await other.page.goto(address.replace(/[0-9a-f]{8}-[0-9a-f]{4}/u, '00000000-0000'));
    const unknown = await other.page.locator('main').innerText();
    const withoutIds = (text: string) => text.replace(/[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}/gu, 'id');
    expect(withoutIds(foreign)).toBe(withoutIds(unknown));
    expect(foreign).not.toContain('Brindlecombe');
    await close(mine);
    await close(other);
  });

  it('show a member only the screens of the role', async () => {
    const person = await newPage(browser);
    await signIn(person.page, ASSESSOR);
    await person.page.getByRole('heading', { level: 1 }).waitFor();
    await open(person.page, 'Candidates');
    expect(await person.page.getByRole('button', { name: 'Add candidate' }).count()).toBe(0);
    await close(person);
  });
});
