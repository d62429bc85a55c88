import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { demoOrganizations, demoPeople } from '../../server/services/demo/demo-data';
import { startTestServer, type TestServer } from '../support/server';
import { phone, sidewaysScroll, wide } from './curves-page';
import {
  allowClipboard,
  clipboard,
  issueOnScreen,
  keyEntry,
  keyStands,
  shownCall,
} from './keys-page';
import { openSignedIn } from './sign-in-page';

jest.setTimeout(90_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

const [larkmoor] = demoOrganizations;
const [admin, developer] = demoPeople;
const run = promisify(execFile);
/** What a terminal prints for a command as it was copied. */
const paste = async (command: string): Promise<unknown> =>
  JSON.parse((await run('sh', ['-c', `${command} --silent`])).stdout);
const issue = (person: typeof admin | typeof developer, name: string, expiresInDays = 90) =>
  server.services.keyConsole.issue(
    { personId: person.id, organizationId: larkmoor.id, role: person.role },
    { name, scopes: ['compute'], expiresInDays },
  );

test('on a phone a key is issued, calls as pasted, is revoked in two taps, and calls no more', async () => {
  const { page, complaints } = await openSignedIn(server, phone, admin.email);
  await allowClipboard(page, server.url);
  await issueOnScreen(page, 'lims-nightly');
  const call = await shownCall(page);
  await page.getByRole('button', { name: 'Copy the call' }).tap();
  await page.getByRole('status').filter({ hasText: 'Call copied at' }).waitFor();
  expect(await clipboard(page)).toBe(call);
  expect(await paste(call)).toMatchObject({ points: [{ pH: '7.4', predominant: 2 }] });

  await page.getByRole('button', { name: 'Done' }).tap();
  await page.reload();
  await keyEntry(page, 'lims-nightly').filter({ hasText: 'Last used just now' }).waitFor();
  const secret = /Bearer (\S+)"/.exec(call)?.[1] ?? '';
  expect(await page.content()).not.toContain(secret.slice(-59));

  await page.getByRole('button', { name: 'Revoke lims-nightly' }).tap();
  await page.getByText('lims-nightly stops at its next call. Last used just now.').waitFor();
  await page.getByRole('dialog').getByRole('button', { name: 'Revoke', exact: true }).tap();
  await keyStands(page, 'lims-nightly', 'Revoked');
  expect(await page.getByRole('button', { name: 'Revoke lims-nightly' }).count()).toBe(0);
  expect(await keyEntry(page, 'lims-nightly').evaluate((e) => e === document.activeElement)).toBe(
    true,
  );
  expect(await paste(call)).toMatchObject({ status: 401 });
  expect(complaints).toEqual([]);
});

test('by keyboard alone, on a wide screen, from the issue to the revocation', async () => {
  const { page } = await openSignedIn(server, wide, developer.email);
  await allowClipboard(page, server.url);
  const reach = async (name: string) => {
    const target = page.getByRole('button', { name, exact: true });
    do await page.keyboard.press('Tab');
    while (!(await target.evaluate((element) => element === document.activeElement)));
    await page.keyboard.press('Enter');
  };
  await keyEntry(page, 'first-call').waitFor();
  await reach('Issue a key');
  await page.getByRole('dialog', { name: 'Issue a key' }).waitFor();
  await page.keyboard.type('plate-reader');
  await page.keyboard.press('Tab');
  await page.keyboard.press('Tab');
  await page.keyboard.press('Space');
  const checked = page.getByRole('checkbox', { checked: true });
  expect(await checked.allTextContents()).toHaveLength(2);
  await reach('Issue the key');
  await page.getByRole('dialog', { name: 'plate-reader is issued' }).waitFor();
  await reach('Copy the whole key');
  await page.getByText('Key copied at').waitFor();
  expect(await clipboard(page)).toMatch(/^stepwell_[a-z0-9]{12}_[a-z0-9]{59}$/);
  await reach('Done');
  await reach('Revoke plate-reader');
  await page.getByRole('dialog', { name: 'Revoke plate-reader' }).waitFor();
  await reach('Revoke');
  await keyStands(page, 'plate-reader', 'Revoked');
});

test('a key that was not copied is not left without a word', async () => {
  const { page } = await openSignedIn(server, wide, developer.email);
  await page.getByRole('link', { name: 'API' }).click();
  await page.getByRole('navigation').getByRole('link', { name: 'Keys' }).click();
  await issueOnScreen(page, 'forgotten');
  const slip = page.getByRole('dialog', { name: 'forgotten is issued' });
  const warning = page.getByText('You have not copied the key');
  await page.keyboard.press('Escape');
  await warning.waitFor();
  await page.getByRole('button', { name: 'Stay' }).click();
  await warning.waitFor({ state: 'detached' });
  await page.evaluate(() => window.history.back());
  await warning.waitFor();
  expect(new URL(page.url()).pathname).toBe('/keys');
  const asked = page.waitForEvent('dialog');
  const reload = page.evaluate(() => window.location.reload());
  const question = await asked;
  expect(question.type()).toBe('beforeunload');
  await question.dismiss();
  await reload;
  await page.getByRole('button', { name: 'Leave without it' }).click();
  await slip.waitFor({ state: 'detached' });
  expect(await page.content()).not.toMatch(/stepwell_[a-z0-9]{12}_/);
});

test('a developer sees own keys, an admin everybody’s and by whom', async () => {
  await issue(developer, 'of-the-developer');
  await issue(admin, 'of-the-admin');
  const own = await openSignedIn(server, wide, developer.email);
  await keyEntry(own.page, 'of-the-developer').waitFor();
  expect(await keyEntry(own.page, 'of-the-admin').count()).toBe(0);
  const all = await openSignedIn(server, wide, admin.email);
  await keyEntry(all.page, 'of-the-admin').filter({ hasText: admin.name }).waitFor();
  await keyEntry(all.page, 'of-the-developer').filter({ hasText: developer.name }).waitFor();
});

test('a key says when it ends soon and when it has ended', async () => {
  await issue(admin, 'ends-soon', 6);
  const ended = await issue(admin, 'ended');
  await server.database.query(
    `UPDATE api_keys SET created_at = now() - interval '100 days',
       expires_at = now() - interval '10 days' WHERE id = $1`,
    [ended.id],
  );
  const { page } = await openSignedIn(server, wide, admin.email);
  await keyStands(page, 'ends-soon', 'Ends in 6 days');
  const row = keyEntry(page, 'ended').filter({ hasText: 'Expired' });
  await row.filter({ hasText: '10 days ago' }).waitFor();
  expect(await row.getByRole('button').count()).toBe(0);
});

test('a head sorts the table, says so, and turns at the second press', async () => {
  const { page } = await openSignedIn(server, wide, admin.email);
  const head = page.getByRole('columnheader', { name: 'Key' });
  await head.getByRole('button').click();
  expect(await head.getAttribute('aria-sort')).toBe('ascending');
  const names = async () =>
    page.locator('tbody tr').evaluateAll((rows) => rows.map((row) => row.textContent));
  const up = await names();
  expect(up).toEqual([...up].sort());
  await head.getByRole('button').click();
  expect(await head.getAttribute('aria-sort')).toBe('descending');
  expect(await names()).toEqual(up.reverse());
});

test('faults stand at their fields, and what the service refuses above them', async () => {
  const { page } = await openSignedIn(server, phone, developer.email);
  await page.getByRole('button', { name: 'Issue a key' }).tap();
  await page.getByRole('checkbox', { name: 'compute' }).tap();
  await page.getByRole('button', { name: 'Issue the key' }).tap();
  await page.getByText('Name the program that will call, such as lims-nightly.').waitFor();
  await page.getByText('Choose at least one: a key that may do nothing is none.').waitFor();
  await page.getByRole('textbox', { name: 'Name' }).fill('unlucky');
  await page.getByRole('checkbox', { name: 'compute' }).tap();
  await page.route('**/v1/keys', (route) => route.abort());
  await page.getByRole('button', { name: 'Issue the key' }).tap();
  await page.getByRole('alert').filter({ hasText: 'The service cannot be reached' }).waitFor();
  await page.unroute('**/v1/keys');
  await page.getByRole('button', { name: 'Issue the key' }).tap();
  await page.getByRole('dialog', { name: 'unlucky is issued' }).waitFor();
});

test('a revocation that does not reach the service is told, and the key still works', async () => {
  const { key } = await issue(developer, 'unreachable');
  const { page } = await openSignedIn(server, phone, developer.email);
  await page.route('**/revocation', (route) => route.abort());
  await page.getByRole('button', { name: 'Revoke unreachable' }).tap();
  await page.getByRole('dialog').getByRole('button', { name: 'Revoke', exact: true }).tap();
  await page.getByRole('alert').filter({ hasText: 'The service cannot be reached' }).waitFor();
  await page.getByRole('button', { name: 'Keep it' }).tap();
  await keyStands(page, 'unreachable', 'Working');
  expect((await server.services.keys.authenticate(key)).ok).toBe(true);
});

test('offline it is said once, and the list stays', async () => {
  const { page } = await openSignedIn(server, phone, developer.email);
  await keyEntry(page, 'first-call').waitFor();
  await page.context().setOffline(true);
  await page.getByRole('status').filter({ hasText: 'You are offline' }).waitFor();
  expect(await keyEntry(page, 'first-call').count()).toBe(1);
  await page.context().setOffline(false);
  await page.getByRole('status').filter({ hasText: 'You are offline' }).waitFor({
    state: 'detached',
  });
});

test('a list that cannot be fetched is asked for again at a press', async () => {
  const { page } = await openSignedIn(server, phone, developer.email);
  await keyEntry(page, 'first-call').waitFor();
  const problem = { type: 'about:blank', title: 'Something went wrong here', status: 500 };
  await page.route('**/v1/keys', (route) =>
    route.fulfill({ status: 500, json: { ...problem, requestId: 'found-in-the-logs' } }),
  );
  await page.reload();
  const alert = page.getByRole('alert').filter({ hasText: 'found-in-the-logs' });
  await alert.waitFor();
  await page.unroute('**/v1/keys');
  await alert.getByRole('button', { name: 'Try again' }).tap();
  await keyEntry(page, 'first-call').waitFor();
});

test.each([320, 390])(
  'more than a page is shown at a press; nothing scrolls sideways at %i px',
  async (width) => {
    const [, , , stranger] = demoPeople;
    const person = {
      personId: stranger.id,
      organizationId: stranger.organizationId,
      role: stranger.role,
    };
    const name = `one-of-many-${'and-with-a-name-as-long-as-a-name-may-be'.repeat(2)}`.slice(0, 80);
    const missing =
      60 - (await server.services.keyConsole.list(person, { limit: 100 })).items.length;
    for (let i = 0; i < missing; i += 1) {
      await server.services.keyConsole.issue(person, {
        name,
        scopes: ['compute'],
        expiresInDays: 30,
      });
    }
    const { page } = await openSignedIn(server, { ...phone, width, height: 700 }, stranger.email);
    await page.getByText('The newest 50 keys are shown.').waitFor();
    expect(await sidewaysScroll(page)).toBe(0);
    await page.getByRole('button', { name: 'Show more' }).tap();
    await page.getByText('All 60 are shown.').waitFor();
    expect(await keyEntry(page, 'one-of-many').count()).toBe(60);
    await issueOnScreen(page, `${width} px wide`);
    expect(await sidewaysScroll(page)).toBe(0);
    await page.keyboard.press('Escape');
    await page.getByText('You have not copied the key').waitFor();
    expect(await sidewaysScroll(page)).toBe(0);
    await page.getByRole('button', { name: 'Leave without it' }).tap();
    await server.database.query('DELETE FROM api_keys WHERE name LIKE $1', ['% px wide']);
  },
);
