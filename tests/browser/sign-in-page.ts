import type { Page } from 'playwright-core';
import { demoPassword } from '../../server/services/demo/demo-data';
import type { TestServer } from '../support/server';
import { open } from './curves-page';

export const email = (page: Page) => page.getByRole('textbox', { name: 'E-mail' });
export const password = (page: Page) => page.getByLabel('Password', { exact: true });
export const enter = (page: Page) => page.getByRole('button', { name: 'Sign in', exact: true });

/** Fills the form in and sends it. */
export async function send(page: Page, address: string, word = demoPassword): Promise<void> {
  await email(page).fill(address);
  await password(page).fill(word);
  await enter(page).click();
}

/** A browser in which somebody asked for an address, was led to the form, signed in and came back. */
export async function openSignedIn(
  server: TestServer,
  view: Parameters<typeof open>[0],
  address: string,
  path = '/keys',
) {
  const browser = await open(view);
  await browser.page.goto(`${server.url}${path}`);
  await send(browser.page, address);
  await browser.page.waitForURL(`${server.url}${path}`);
  return browser;
}

/** Opens the account on either layout. */
export async function openAccount(page: Page): Promise<void> {
  await page
    .getByRole('navigation', { name: 'Places' })
    .getByRole('button', { name: /^(Account|More|Demo )/ })
    .click();
  await page.getByRole('dialog').waitFor();
}
