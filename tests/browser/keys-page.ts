import type { Page } from 'playwright-core';

/** What stands for a key in the list: a card on a phone, a row on a wide screen. */
export const keyEntry = (page: Page, name: string) =>
  page
    .locator('main')
    .getByRole((page.viewportSize()?.width ?? 0) < 900 ? 'listitem' : 'row')
    .filter({ hasText: name });

/** Waits until the list says that a key stands so: Working, Revoked … */
export const keyStands = (page: Page, name: string, word: string): Promise<void> =>
  keyEntry(page, name).filter({ hasText: word }).waitFor();

/** Issues a key on screen and leaves its slip open. */
export async function issueOnScreen(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name: 'Issue a key' }).click();
  await page.getByRole('textbox', { name: 'Name' }).fill(name);
  await page.getByRole('button', { name: 'Issue the key' }).click();
  await page.getByRole('dialog', { name: `${name} is issued` }).waitFor();
}

/** The first call that the slip shows, as it would be pasted. */
export const shownCall = async (page: Page): Promise<string> =>
  (await page.getByText(/^curl /).textContent()) ?? '';

/** Lets pages of this origin use the clipboard without a question. */
export const allowClipboard = (page: Page, origin: string): Promise<void> =>
  page.context().grantPermissions(['clipboard-read', 'clipboard-write'], { origin });

export const clipboard = (page: Page): Promise<string> =>
  page.evaluate(() => navigator.clipboard.readText());
