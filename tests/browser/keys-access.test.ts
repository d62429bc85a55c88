import { demoOrganizations, demoPeople } from '../../server/services/demo/demo-data';
import { axeFaults } from '../support/axe';
import { startTestServer, type TestServer } from '../support/server';
import { open } from './curves-page';
import { issueOnScreen, keyEntry } from './keys-page';
import { openAccount, openSignedIn, send } from './sign-in-page';

jest.setTimeout(180_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
  const [larkmoor] = demoOrganizations;
  const { id, role } = demoPeople[0];
  const person = { personId: id, organizationId: larkmoor.id, role };
  const ask = { name: 'ends-soon', scopes: ['compute' as const], expiresInDays: 6 };
  await server.services.keyConsole.issue(person, ask);
  const { id: revoked } = await server.services.keyConsole.issue(person, { ...ask, name: 'gone' });
  await server.services.keyConsole.revoke(person, revoked);
});
afterAll(() => server.close());

describe.each([320, 390, 1280])('at %i px', (width) => {
  describe.each(['light', 'dark'])('%s', (scheme) => {
    const view = { width, height: 800, dark: scheme === 'dark', touch: width < 900 };

    test('axe finds nothing in signing in, also where it is refused', async () => {
      const { page } = await open(view);
      await page.goto(`${server.url}/sign-in`);
      await page.getByRole('slider', { name: 'pH cursor' }).waitFor();
      expect(await axeFaults(page)).toEqual([]);
      await page.getByRole('button', { name: 'Sign in', exact: true }).click();
      await page.getByText('Write your e-mail address.').waitFor();
      expect(await axeFaults(page)).toEqual([]);
      await send(page, `nobody-${width}-${scheme}@larkmoor.example`);
      await page.getByRole('alert').filter({ hasText: 'Signing in did not work' }).waitFor();
      expect(await axeFaults(page)).toEqual([]);
    });

    test('axe finds nothing in the keys, their dialogs, and the slip', async () => {
      const { page } = await openSignedIn(server, view, 'admin@larkmoor.example');
      await keyEntry(page, 'gone').waitFor();
      // At the end, where no target lies half under the dock.
      await page.evaluate(() => window.scrollTo(0, document.body.scrollHeight));
      expect(await axeFaults(page)).toEqual([]);
      await openAccount(page);
      expect(await axeFaults(page)).toEqual([]);
      await page.keyboard.press('Escape');
      await page.getByRole('button', { name: 'Issue a key' }).click();
      await page.getByRole('button', { name: 'Issue the key' }).click();
      await page.getByText('Name the program that will call').waitFor();
      expect(await axeFaults(page)).toEqual([]);
      await page.keyboard.press('Escape');
      await issueOnScreen(page, `${width}-${scheme}`);
      expect(await axeFaults(page)).toEqual([]);
      await page.keyboard.press('Escape');
      await page.getByRole('button', { name: 'Leave without it' }).waitFor();
      expect(await axeFaults(page)).toEqual([]);
      await page.getByRole('button', { name: 'Leave without it' }).click();
      await page.getByRole('button', { name: 'Revoke ends-soon' }).click();
      await page.getByRole('dialog', { name: 'Revoke ends-soon' }).waitFor();
      expect(await axeFaults(page)).toEqual([]);
    });

    test('axe finds nothing where there are no keys, none for a scientist, and no session', async () => {
      const empty = await openSignedIn(server, view, 'admin@tarnstreet.example');
      await empty.page.getByText('No keys yet').waitFor();
      expect(await axeFaults(empty.page)).toEqual([]);
      await server.database.query('UPDATE sessions SET ended_at = now() WHERE ended_at IS NULL');
      await empty.page.getByRole('button', { name: 'Issue a key' }).click();
      await empty.page.getByRole('textbox', { name: 'Name' }).fill('too-late');
      await empty.page.getByRole('button', { name: 'Issue the key' }).click();
      await empty.page.getByRole('alert').filter({ hasText: 'Nobody is signed in' }).waitFor();
      await empty.page.keyboard.press('Escape');
      await empty.page.getByText('You are signed out').waitFor();
      expect(await axeFaults(empty.page)).toEqual([]);
      const scientist = await openSignedIn(server, view, 'scientist@larkmoor.example');
      await scientist.page.getByText('As scientist you need no key').waitFor();
      expect(await axeFaults(scientist.page)).toEqual([]);
    });
  });
});

test('what the keyboard reaches on a phone lies neither under the dock nor under the bar', async () => {
  const view = { width: 390, height: 700 };
  const { page } = await openSignedIn(server, view, 'admin@larkmoor.example');
  await keyEntry(page, 'gone').waitFor();
  const reached: string[] = [];
  for (;;) {
    await page.keyboard.press('Tab');
    const stop = await page.evaluate(() => {
      const element = document.activeElement;
      if (!element || element === document.body) return undefined;
      const { left, top, width, height } = element.getBoundingClientRect();
      const hit = document.elementFromPoint(left + width / 2, top + height / 2);
      const name = element.getAttribute('aria-label') ?? element.textContent;
      return { name, isSeen: element.contains(hit) };
    });
    if (!stop || reached.includes(stop.name)) break;
    reached.push(stop.name);
    expect(stop).toEqual({ name: stop.name, isSeen: true });
  }
  expect(reached).toEqual(expect.arrayContaining(['Revoke ends-soon', 'Issue a key', 'Curves']));
});
