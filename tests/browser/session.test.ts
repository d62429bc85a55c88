import type { Page } from 'playwright-core';
import { demoOrganizations, demoPeople } from '../../server/services/demo/demo-data';
import { startTestServer, type TestServer } from '../support/server';
import { phone, wide } from './curves-page';
import { email, openAccount, openSignedIn, password, send } from './sign-in-page';

jest.setTimeout(60_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

const [larkmoor, tarn] = demoOrganizations;
const [admin, developer, scientist] = demoPeople;
const places = (page: Page) => page.getByRole('navigation', { name: 'Places' });
const signedOut = (page: Page) =>
  page.getByRole('status').filter({ hasText: 'You are signed out' });

test('signing out ends the session here and is told, once, in another tab', async () => {
  const { page } = await openSignedIn(server, wide, developer.email);
  const other = await page.context().newPage();
  await other.goto(`${server.url}/keys`);
  await other.getByText('first-call').waitFor();

  await openAccount(page);
  await page.getByRole('button', { name: 'Sign out' }).click();
  await page.waitForURL(`${server.url}/sign-in`);
  await email(page).waitFor();

  await signedOut(other).waitFor();
  expect(await other.getByText('first-call').count()).toBe(1);
  await other.getByRole('button', { name: 'Not now' }).click();
  await signedOut(other).waitFor({ state: 'detached' });
  expect(await other.getByText('first-call').count()).toBe(1);
  await other.reload();
  await other.waitForURL(`${server.url}/sign-in`);
});

test('a session that ends while working leaves the screen, and signing in comes back to it', async () => {
  const { page } = await openSignedIn(server, phone, developer.email);
  const left = `${server.url}/#system=glycine&pH=9.00`;
  await page.goto(left);
  await places(page).getByRole('link', { name: 'Keys' }).waitFor();
  await server.database.query('UPDATE sessions SET ended_at = now() WHERE person_id = $1', [
    developer.id,
  ]);
  await places(page).getByRole('link', { name: 'Keys' }).click();
  await signedOut(page).waitFor();
  await page.goBack();
  await page.waitForURL(left);
  await page.getByRole('link', { name: 'Sign in again' }).click();
  expect(await email(page).inputValue()).toBe(developer.email);
  await password(page).fill('three steps down to water');
  await page.keyboard.press('Enter');
  await page.waitForURL(left);
  await page.getByRole('heading', { level: 1, name: /Glycine/ }).waitFor();
});

test('signing out that does not reach the service says so, and one is still signed in', async () => {
  const { page } = await openSignedIn(server, phone, developer.email);
  await page.route('**/v1/sessions/current', (route) => route.abort());
  await openAccount(page);
  await page.getByRole('button', { name: 'Sign out' }).click();
  await page.getByRole('alert').filter({ hasText: 'The service cannot be reached' }).waitFor();
  await page.unroute('**/v1/sessions/current');
  await page.getByRole('button', { name: 'Sign out' }).click();
  await page.waitForURL(`${server.url}/sign-in`);
});

test('who works in another organization sees its places and its keys, in every tab', async () => {
  await server.database.query(`INSERT INTO memberships VALUES ($1, $2, 'scientist')`, [
    admin.id,
    tarn.id,
  ]);
  const { page, complaints } = await openSignedIn(server, wide, admin.email);
  await page.getByText('first-call').waitFor();
  const other = await page.context().newPage();
  await other.goto(`${server.url}/keys`);
  await other.getByText('first-call').waitFor();

  await openAccount(page);
  await page.getByRole('button', { name: `Work in ${tarn.name}` }).click();
  for (const tab of [page, other]) {
    await tab.getByRole('heading', { name: 'As scientist you need no key' }).waitFor();
    expect(await tab.getByText('first-call').count()).toBe(0);
    expect(await places(tab).getByRole('link', { name: 'Keys' }).count()).toBe(0);
  }
  await page.getByRole('button', { name: `Demo admin scientist, ${tarn.name}` }).click();
  await page.getByRole('button', { name: `Work in ${larkmoor.name}` }).click();
  for (const tab of [page, other]) await tab.getByText('first-call').waitFor();
  expect(complaints).toEqual([]);
});

test('a scientist finds no keys among the places, and reads whom to ask', async () => {
  const { page, complaints } = await openSignedIn(server, phone, scientist.email);
  await page.getByRole('heading', { name: 'As scientist you need no key' }).waitFor();
  await page.getByText('Ask an admin of Larkmoor Assay.').waitFor();
  expect(await places(page).getByRole('link', { name: 'Keys' }).count()).toBe(0);
  expect(complaints).toEqual([]);
});

test('another person who signs in sees nothing of the one before', async () => {
  const { page } = await openSignedIn(server, wide, admin.email);
  await page.getByText('first-call').waitFor();
  await openAccount(page);
  await page.getByRole('button', { name: 'Sign out' }).click();
  await email(page).waitFor();
  expect(await email(page).inputValue()).toBe('');
  await page.goto(`${server.url}/keys`);
  await send(page, 'admin@tarnstreet.example');
  await page.getByText('No keys yet').waitFor();
  expect(await page.getByText('first-call').count()).toBe(0);
});
