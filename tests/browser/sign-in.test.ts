import request from 'supertest';
import { demoPassword } from '../../server/services/demo/demo-data';
import { startTestServer, type TestServer } from '../support/server';
import { open, openCurves, phone, wide } from './curves-page';
import { email, enter, openSignedIn, password, send } from './sign-in-page';

jest.setTimeout(60_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

const developer = 'developer@larkmoor.example';
const isFocused = (element: Element) => element === document.activeElement;

test('a visitor to Curves is asked for nothing and costs no call about a session', async () => {
  const calls: string[] = [];
  const { page, complaints } = await open(phone);
  page.on('request', (call) => calls.push(new URL(call.url()).pathname));
  await page.goto(server.url);
  await page.getByRole('button', { name: 'More' }).waitFor();
  await page.getByRole('slider', { name: 'pH cursor' }).waitFor();
  expect(calls.filter((path) => /account|session/.test(path) && path.startsWith('/v1'))).toEqual(
    [],
  );
  expect(complaints).toEqual([]);
});

test('by keyboard alone, signing in leads back to the curve it was left for', async () => {
  const { page } = await openCurves(server, wide, 'system=citric-acid&pH=5.00');
  const left = page.url();
  const link = page.getByRole('link', { name: 'Sign in' });
  do await page.keyboard.press('Tab');
  while (!(await link.evaluate(isFocused)));
  await page.keyboard.press('Enter');
  await email(page).waitFor();
  await page.waitForFunction(() => document.activeElement?.tagName === 'INPUT');
  expect(page.url()).toBe(`${server.url}/sign-in`);
  await page.keyboard.type(developer);
  await page.keyboard.press('Tab');
  await page.keyboard.type(demoPassword);
  await page.keyboard.press('Enter');
  await page.waitForURL(left);
  await page.getByRole('button', { name: 'Demo developer developer, Larkmoor Assay' }).waitFor();
  await page.getByRole('heading', { level: 1, name: /Citric acid/ }).waitFor();
  await page.locator('[role="slider"][aria-valuetext^="pH 5.00:"]').waitFor();
});

test('a wrong password is told in the service’s words, where the focus goes', async () => {
  const { page } = await open(phone);
  await page.goto(`${server.url}/sign-in`);
  await send(page, developer, 'four steps');
  const alert = page.getByRole('alert').filter({ hasText: 'Signing in did not work' });
  await alert.filter({ hasText: 'The e-mail address or the password is not right.' }).waitFor();
  expect(await alert.evaluate(isFocused)).toBe(true);
  expect(await email(page).inputValue()).toBe(developer);
  await password(page).fill(demoPassword);
  await enter(page).click();
  await page.waitForURL(`${server.url}/`);
});

test('after ten failures even the right password waits', async () => {
  const person = 'admin@tarnstreet.example';
  for (let i = 0; i < 10; i += 1) {
    await request(server.url)
      .post('/v1/sessions')
      .set('Origin', server.url)
      .send({ email: person, password: 'guess' })
      .expect(401);
  }
  const { page } = await open(phone);
  await page.goto(`${server.url}/sign-in`);
  await send(page, person);
  await page.getByText('Too many failed attempts. Wait a quarter of an hour.').waitFor();
});

test('a service out of reach is told, and the form stays as it was', async () => {
  const { page } = await open(phone);
  await page.goto(`${server.url}/sign-in`);
  await page.route('**/v1/sessions', (route) => route.abort());
  await send(page, developer);
  await page.getByRole('alert').filter({ hasText: 'The service cannot be reached' }).waitFor();
  expect(await password(page).inputValue()).toBe(demoPassword);
  await page.unroute('**/v1/sessions');
  await enter(page).click();
  await page.waitForURL(`${server.url}/`);
});

test('Enter pressed twice signs in once', async () => {
  const { page } = await open(wide);
  await page.goto(`${server.url}/sign-in`);
  await email(page).fill(developer);
  await password(page).fill(demoPassword);
  let sent = 0;
  let release = () => {};
  const held = new Promise<void>((resolve) => {
    release = resolve;
  });
  await page.route('**/v1/sessions', async (route) => {
    sent += 1;
    await held;
    await route.continue();
  });
  await password(page).press('Enter');
  await password(page).press('Enter');
  await page.getByRole('button', { name: 'Signing in …' }).click();
  release();
  await page.waitForURL(`${server.url}/`);
  expect(sent).toBe(1);
});

test('an empty field is named, and the focus goes to it', async () => {
  const { page } = await open(phone);
  await page.goto(`${server.url}/sign-in`);
  await enter(page).click();
  await page.getByText('Write your e-mail address.').waitFor();
  expect(await email(page).evaluate(isFocused)).toBe(true);
  await email(page).fill(developer);
  await enter(page).click();
  expect(await password(page).evaluate(isFocused)).toBe(true);
  expect(await password(page).getAttribute('aria-invalid')).toBe('true');
});

test('a password manager finds both fields, and the password can be shown', async () => {
  const { page } = await open(phone);
  await page.goto(`${server.url}/sign-in`);
  expect(await email(page).getAttribute('autocomplete')).toBe('username');
  expect(await password(page).getAttribute('autocomplete')).toBe('current-password');
  expect(await password(page).getAttribute('type')).toBe('password');
  await page.getByRole('button', { name: 'Show the password' }).click();
  expect(await password(page).getAttribute('type')).not.toBe('password');
  await page.getByRole('button', { name: 'Hide the password' }).click();
  expect(await password(page).getAttribute('type')).toBe('password');
});

test('whoever is signed in never sees the sign-in page on the way', async () => {
  const { page } = await openSignedIn(server, phone, developer);
  let release = () => {};
  const held = new Promise<void>((resolve) => {
    release = resolve;
  });
  await page.route('**/v1/account', async (route) => {
    await held;
    await route.continue();
  });
  await page.reload();
  await page.getByRole('status', { name: 'Looking who is signed in' }).waitFor();
  expect(page.url()).toBe(`${server.url}/keys`);
  expect(await email(page).count()).toBe(0);
  release();
  await page.getByText('Your keys that call for Larkmoor Assay.').waitFor();
  await page.goto(`${server.url}/sign-in`);
  await page.waitForURL(`${server.url}/`);
});
