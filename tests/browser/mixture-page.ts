import type { Locator, Page } from 'playwright-core';
import type { TestServer } from '../support/server';
import { open } from './curves-page';

type View = Parameters<typeof open>[0];

/** The Mixture screen in a browser of its own, answered. */
export async function openMixture({ url }: TestServer, view: View, fragment = '') {
  const browser = await open(view);
  await browser.page.goto(fragment === '' ? `${url}/mixture` : `${url}/mixture#${fragment}`);
  await browser.page.getByText('pH of this mixture').waitFor();
  return browser;
}

/** Waits until the answer is this pH: it is said once the flask has rested. */
export const answers = (page: Page, pH: string): Promise<void> =>
  page
    .getByRole('status')
    .filter({ hasText: `pH ${pH}, ionic strength` })
    .first()
    .waitFor();

/** The fields and buttons of one component, salt or other row, by its name. */
export const row = (page: Page, name: string): Locator =>
  page.getByRole('group', { name, exact: true });

/** Chooses an option of a select, as it is said. */
export async function choose(within: Page | Locator, label: string, option: RegExp) {
  const box = within.getByRole('combobox', { name: label, exact: true });
  await box.click();
  await box.page().getByRole('option', { name: option }).click();
}

/** Adds a component from the handbook by the beginning of its name. */
export async function add(page: Page, typed: string, found: RegExp) {
  await page.getByRole('button', { name: 'Add a component' }).click();
  await page.getByRole('combobox', { name: 'New component' }).fill(typed);
  await page.getByRole('option', { name: found }).first().click();
}
