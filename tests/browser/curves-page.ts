import type { Locator, Page } from 'playwright-core';
import { openBrowser, type OpenBrowser } from '../support/browser';
import type { TestServer } from '../support/server';

type View = Parameters<typeof openBrowser>[0];

export const phone: View = { width: 390, height: 844, touch: true };
export const wide: View = { width: 1440, height: 900 };

const opened: OpenBrowser[] = [];

/** A browser that is closed when its test has ended, whichever way. */
export async function open(view: View): Promise<OpenBrowser> {
  const browser = await openBrowser(view);
  opened.push(browser);
  return browser;
}

afterEach(async () => {
  await Promise.all(opened.splice(0).map((browser) => browser.close()));
});

/** The Curves screen in a browser of its own, drawn and read. */
export async function openCurves({ url }: TestServer, view: View, fragment = '') {
  const browser = await open(view);
  await browser.page.goto(fragment === '' ? `${url}/` : `${url}/#${fragment}`);
  await settled(browser.page);
  return browser;
}

export const cursor = (page: Page): Locator => page.getByRole('slider', { name: 'pH cursor' });

/** Waits until the cursor stands at a pH, as written. */
export const cursorAt = (page: Page, pH: string): Promise<void> =>
  page.locator(`[role="slider"][aria-valuetext^="pH ${pH}:"]`).waitFor();

/** Waits until the exact answer for the cursor's pH is on the screen. */
export const settled = (page: Page): Promise<void> =>
  page
    .locator('[role="button"]:not([aria-disabled="true"])', { hasText: 'Copy all digits' })
    .waitFor();

/** The read-out's row of a form, by its formula as it is said. */
export const formRow = (page: Page, spoken: string): Locator =>
  page
    .getByRole('table', { name: 'Forms at the cursor' })
    .getByRole('row')
    .filter({ has: page.getByRole('img', { name: spoken, exact: true }) });

/** Waits until a row shows a value. */
export const showsValue = (page: Page, spoken: string, value: string): Promise<void> =>
  formRow(page, spoken).filter({ hasText: value }).waitFor();

/** The read-out's row of a single figure, with its value. */
export const valueRow = (page: Page, label: RegExp, value: string): Locator =>
  page
    .getByRole('table', { name: 'Mean charge and ratio at the cursor' })
    .getByRole('row')
    .filter({ hasText: label })
    .filter({ hasText: value });

/** Waits until the address's fragment is this. */
export const fragmentIs = async (page: Page, fragment: string): Promise<void> => {
  await page.waitForFunction((wanted) => window.location.hash === `#${wanted}`, fragment);
};

/** The middle of the plot's height and the x of a pH on it, for a range from 0 to 14. */
export async function placeOf(page: Page, pH: number) {
  const box = await page.getByRole('img', { name: /^Fractions of the/ }).boundingBox();
  const slider = await cursor(page).boundingBox();
  const now = Number(await cursor(page).getAttribute('aria-valuenow'));
  if (!box || !slider) throw new Error('There is no figure.');
  const inset =
    (page.viewportSize()?.width ?? 0) >= 900 ? { left: 36, right: 14 } : { left: 16, right: 16 };
  const pxPerUnit = (box.width - inset.left - inset.right) / 14;
  const x = box.x + inset.left + pH * pxPerUnit;
  // The tab hangs at the cursor: a check that the two agree about the axis.
  const off = slider.x + slider.width / 2 - (box.x + inset.left + now * pxPerUnit);
  if (Math.abs(off) > 1) throw new Error(`The tab is ${off} px from its pH.`);
  return { x, y: box.y + box.height * 0.4 };
}

/** How far the document can be scrolled sideways, px. */
export const sidewaysScroll = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
