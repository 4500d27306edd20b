import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  accessibilityProblems,
  close,
  inboxUrl,
  newPage,
  open,
  picture,
  signIn,
  startBrowser,
} from './browser';
import { quotePdf } from './quote-pdf';

const COORDINATOR = 'hanne.vos@marrowfen.example';
const ASSESSOR = 'jonas.prell@marrowfen.example';
const FINANCE_DIRECTOR = 'margit.sole@marrowfen.example';

let browser: Browser;

beforeAll(async () => {
  browser = await startBrowser();
});
afterAll(() => browser.close());

/** Signs in as somebody new to the browser, does what is asked, and must end without a complaint of the page. */
async function as(email: string, work: (page: Page) => Promise<void>) {
  const person = await newPage(browser);
  await signIn(person.page, email);
  await work(person.page);
  expect(person.complaints).toEqual([]);
  await close(person);
}

const LOOKS = [
  ['dark', { width: 1440, height: 900, dark: true }],
  ['narrow', { width: 390, height: 844 }],
] as const;

describe('a round, from a quote to an approved portfolio', () => {
  it('lets the coordinator upload a quote, enter its figures, see what it costs over its life, and keep it', () =>
    as(COORDINATOR, async (page) => {
      await open(page, 'Candidates');
      await page.getByLabel('Find a need').fill('contrast injector');
      await page.getByText('1–1 of 1').waitFor();
      await page.getByRole('link', { name: 'Dual-head contrast injector for CT' }).click();
      await page.getByRole('link', { name: 'Compare the quotes' }).click();
      await page.getByRole('heading', { level: 1, name: /contrast injector/iu }).waitFor();

      await page.getByLabel('Quotes to upload').setInputFiles({
        name: 'injector offer.pdf',
        mimeType: 'application/pdf',
        buffer: quotePdf('Quote Q-77 for one contrast injector'),
      });
      await page.getByText('injector offer.pdf').first().waitFor();
      await picture(page, 'journey-1-uploaded');
      await page.getByRole('button', { name: /Enter its figures/u }).click();

      const form = page.getByRole('dialog');
      await form.getByLabel('Vendor', { exact: true }).fill('Hollowmere Devices (demo)');
      await form.getByLabel('Quote number').fill('Q-77');
      await form.getByLabel('Date of the quote').fill('2026-11-20');
      await form.getByLabel('Valid until').fill('2027-05-31');
      await form.getByLabel('Price of one piece').fill('21 500,00');
      await form.getByLabel('Warranty').fill('2');
      await form.getByLabel('Service per year').fill('1 200');
      await form.getByLabel('Delivery time').fill('8');
      await form.getByRole('button', { name: 'Save the quote' }).click();
      await form.waitFor({ state: 'hidden' });
      await page
        .getByText(/Q-77 saved\. Life-cycle cost €[\d\s.]+/u)
        .first()
        .waitFor();
      await picture(page, 'journey-2-compared');
      expect(await accessibilityProblems(page)).toEqual([]);

      await page.getByRole('button', { name: 'Choose another' }).click();
      await page.getByRole('radio', { name: /Hollowmere/u }).check();
      await page.getByLabel('Reason').fill('Cheapest over its life, and answered within a day.');
      await page.getByRole('button', { name: 'Keep Hollowmere Devices (demo)' }).click();
      await page.getByText(/Hollowmere Devices \(demo\) Q-77 is kept by hand/u).waitFor();
      await picture(page, 'journey-3-kept');
    }));

  it('lets an assessor give the score that is still missing', () =>
    as(ASSESSOR, async (page) => {
      await page.getByRole('heading', { name: 'You have given 279 of 280 scores' }).waitFor();
      const empty = page.getByRole('gridcell', { name: /: no score$/u });
      await empty.focus();
      await page.keyboard.type('18');
      await page.keyboard.press('Enter');
      await page.getByRole('heading', { name: 'You have given 280 of 280 scores' }).waitFor();
      await page.getByText(/^Saved,/u).waitFor();
      await picture(page, 'journey-4-scored');
      expect(await accessibilityProblems(page)).toEqual([]);
      await page.reload();
      await page.getByRole('heading', { name: 'You have given 280 of 280 scores' }).waitFor();
    }));

  it('lets the coordinator close scoring, search, watch it improve, choose by slider and key, and submit', () =>
    as(COORDINATOR, async (page) => {
      await page.getByRole('button', { name: 'Close scoring' }).click();
      await page.getByRole('dialog').getByRole('button', { name: 'Close scoring' }).click();
      await page.getByRole('dialog').waitFor({ state: 'hidden' });

      await open(page, 'Frontier');
      await page.getByRole('button', { name: 'Start search' }).click();
      await page.getByText(/looked at, .* kept/u).waitFor();
      await picture(page, 'journey-5-searching');
      await page.getByRole('button', { name: 'Run again' }).waitFor();
      await page.getByText('Proven complete', { exact: true }).waitFor();
      await page.getByText(/no better portfolio exists at any cost$/u).waitFor();

      const slider = page.getByRole('slider', { name: /^Portfolio A/u });
      const box = await slider.boundingBox();
      if (!box) throw new Error('The slider cannot be seen.');
      await page.mouse.click(box.x + box.width * 0.5, box.y + box.height / 2);
      const byPointer = await slider.getAttribute('aria-valuetext');
      await slider.focus();
      await page.keyboard.press('ArrowRight');
      const byKey = await slider.getAttribute('aria-valuetext');
      expect(byPointer).toMatch(/^Portfolio A, .* points$/u);
      expect(byKey).not.toBe(byPointer);
      await picture(page, 'journey-6-chosen');
      expect(await accessibilityProblems(page)).toEqual([]);

      await page.getByRole('button', { name: 'Send A for approval' }).click();
      const dialog = page.getByRole('dialog');
      await dialog.getByLabel('Reason for this choice').fill('Most benefit for half of what is asked.');
      await dialog.getByRole('button', { name: 'Send for approval' }).click();
      await page.waitForURL(/\/approval$/u);
      await page.getByRole('heading', { level: 1, name: /^Purchase of equipment/u }).waitFor();
      expect(await page.getByRole('button', { name: /^Approve/u }).count()).toBe(0);
      await picture(page, 'journey-7-submitted');
    }));

  it('lets the finance director approve it, and both read it in the trail', () =>
    as(FINANCE_DIRECTOR, async (page) => {
      await open(page, 'Approval');
      await page.getByRole('button', { name: 'Return with comment' }).click();
      await page.getByText('Write a comment to return or decline').waitFor();
      await page.getByRole('button', { name: /^Approve/u }).click();
      await page.getByText('Approved', { exact: false }).first().waitFor();
      await page
        .getByText(/^Memo .* approved/u)
        .first()
        .waitFor();
      expect(await page.getByRole('button', { name: /^Approve/u }).count()).toBe(0);
      await picture(page, 'journey-8-approved');
      expect(await accessibilityProblems(page)).toEqual([]);
    }));

  it('tells the finance director of the submission and the coordinator of the decision by letter', async () => {
    const inbox = await newPage(browser);
    await inbox.page.goto(inboxUrl);
    await inbox.page.getByText(COORDINATOR).first().waitFor();
    const text = await inbox.page.locator('body').innerText();
    expect(text).toContain(FINANCE_DIRECTOR);
    expect(text).toMatch(/approv/iu);
    expect(text).toMatch(/\/rounds\/[0-9a-f-]+\/approval/u);
    await picture(inbox.page, 'journey-9-letters');
    await close(inbox);
  });

  it.each(LOOKS)('leaves pages that read well and pass axe, %s', async (look, options) => {
    const person = await newPage(browser, options);
    const { page } = person;
    await signIn(page, COORDINATOR);
    const round = page.url().replace(/\/[a-z]+$/u, '');
    for (const screen of ['scoring', 'frontier', 'approval']) {
      await page.goto(`${round}/${screen}`);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await page.waitForLoadState('networkidle');
      expect([screen, await accessibilityProblems(page)]).toEqual([screen, []]);
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(options.width);
      await picture(page, `decided-${screen}-${look}`);
    }
    expect(person.complaints).toEqual([]);
    await close(person);
  });
});
