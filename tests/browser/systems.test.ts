import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import type { Page } from 'playwright-core';
import { fractionsAnswer } from '../../shared/fractions';
import { demoPeople } from '../../server/services/demo/demo-data';
import { startTestServer, type TestServer } from '../support/server';
import {
  cursorAt,
  fragmentIs,
  open,
  phone,
  settled,
  showsValue,
  sidewaysScroll,
  wide,
} from './curves-page';
import { allowClipboard, clipboard } from './keys-page';
import { openSignedIn } from './sign-in-page';

jest.setTimeout(90_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

const [, developer, scientist] = demoPeople;
const search = (page: Page) => page.getByRole('searchbox', { name: 'Find a system' });
const link = (page: Page, name: string) => page.getByRole('link', { name, exact: true });
const title = (page: Page, name: string) =>
  page.getByRole('heading', { level: 1, name, exact: true }).waitFor();

async function openSystems(view: Parameters<typeof open>[0], path = '/systems') {
  const browser = await open(view);
  await browser.page.goto(`${server.url}${path}`);
  return browser;
}

test('a scientist reads citric acid at pH 5.0 off a phone', async () => {
  const { page, complaints } = await openSignedIn(server, phone, scientist.email);
  await page.goto(`${server.url}/systems`);
  await search(page).fill('citric');
  await link(page, 'Citric acid').tap();
  await title(page, 'Citric acid');
  await link(page, 'Use in Curves').tap();
  await page.getByRole('textbox', { name: 'pH' }).fill('5.0');
  await cursorAt(page, '5.00');
  await settled(page);
  // α₂ of pKa 3.128, 4.761, 6.396 at pH 5, by the textbook sum.
  await showsValue(page, 'C6 H6 O7, charge minus 2', '0.616');
  await fragmentIs(page, 'system=citric-acid&pH=5.00');
  expect(complaints).toEqual([]);
});

test('a developer finds a system by CAS number and calls it by its id', async () => {
  const { page } = await openSignedIn(server, wide, developer.email);
  await page.goto(`${server.url}/systems`);
  await allowClipboard(page, server.url);
  await search(page).fill('77-86-1');
  await page.getByText('1 system matches 77-86-1.').waitFor();
  await link(page, 'Tris').click();
  await title(page, 'Tris');
  await page.getByRole('button', { name: 'Copy id' }).click();
  await page.getByRole('status').filter({ hasText: 'Id copied' }).waitFor();
  expect(await clipboard(page)).toBe('tris');
  await page.getByRole('button', { name: 'Copy the call' }).click();
  await page.getByRole('status').filter({ hasText: 'Call copied' }).waitFor();
  const { stdout } = await promisify(execFile)('sh', ['-c', await clipboard(page)], {
    env: { ...process.env, STEPWELL_KEY: server.key },
  });
  const answer = fractionsAnswer.parse(JSON.parse(stdout));
  expect(answer.model.constantsUsed[0]?.system).toEqual({ id: 'tris', revision: 1 });
  expect(answer.points[0]).toMatchObject({ pH: '7.4', predominant: 0 });
});

describe('a system', () => {
  test('shows each constant with what it stands on', async () => {
    const { page, complaints } = await openSystems(wide, '/systems/phosphoric-acid');
    await title(page, 'Phosphoric acid');
    expect(await page.title()).toBe('Phosphoric acid · Stepwell');
    const preferred = page.getByRole('table', { name: 'The preferred constants' });
    const second = preferred.getByRole('row').filter({ hasText: '7.198' });
    expect((await second.textContent())?.replace(/\s/g, ' ')).toContain('3.6\u2212230.0');
    for (const words of [
      'orthophosphoric acid',
      '7664-38-2',
      'Thermodynamic (all activities, at ionic strength 0), at 25 °C, I = 0',
      'J. Phys. Chem. Ref. Data 31, 231 (2002)',
      'No uncertainty is stated.',
      'revision 1',
    ]) {
      await page.getByText(words).first().waitFor();
    }
    await page.getByText('Recalled', { exact: true }).waitFor();
    await page.getByRole('heading', { name: 'Another determination' }).waitFor();
    await page.getByRole('table', { name: /listed as phosphoric acid \(CRC\)/ }).waitFor();
    await page.getByRole('img', { name: /^Fractions of the 4 forms of phosphoric acid/ }).waitFor();
    expect(complaints).toEqual([]);
  });

  test('flags an estimate, and says which constants hold in which medium', async () => {
    const { page } = await openSystems(phone, '/systems/hydrochloric-acid');
    await page.getByText('estimate, not measured').waitFor();
    await page.goto(`${server.url}/systems/edta`);
    await page.getByText('Kind of 1 to 4').waitFor();
    await page.getByText(/at 25\s°C, I = 0\.1\smol\/L/).waitFor();
  });

  test('that was opened by its address has a way up on a phone', async () => {
    const { page } = await openSystems(phone, '/systems/glycine');
    await title(page, 'Glycine');
    await page.getByRole('main').getByRole('link', { name: 'Systems' }).tap();
    await page.waitForURL(`${server.url}/systems`);
    await title(page, 'Systems');
  });

  test.each(['unobtainium', 'Citric%20acid'])(
    'that does not exist (%s) is said so, with a way back',
    async (id) => {
      const { page } = await openSystems(phone, `/systems/${id}`);
      await title(page, 'No such system');
      await page.getByRole('link', { name: 'Find a system' }).tap();
      await title(page, 'Systems');
    },
  );

  test('is found among the places: the place it is in is current', async () => {
    const { page } = await openSystems(wide, '/systems/glycine');
    await page
      .getByRole('navigation', { name: 'Places' })
      .locator('[aria-current="page"]', { hasText: 'Systems' })
      .waitFor();
  });
});

describe('the list', () => {
  test('shows more until all are shown, and the focus goes to the first of what came', async () => {
    const { page } = await openSystems(phone);
    const more = page.getByRole('button', { name: 'Show more' });
    await page.getByText('The first 50 systems are shown.').waitFor();
    const cards = page.getByRole('main').getByRole('listitem');
    expect(await cards.count()).toBe(50);
    await more.press('Enter');
    await page.getByText('The first 100 systems are shown.').waitFor();
    const fresh = await cards.nth(50).getByRole('link').textContent();
    await page.waitForFunction((name) => document.activeElement?.textContent === name, fresh);
    while (await more.isVisible()) {
      const before = await cards.count();
      await more.press('Enter');
      await page.waitForFunction(
        (count) => document.querySelectorAll('main [role="listitem"]').length > count,
        before,
      );
    }
    const { items } = (await (await fetch(`${server.url}/v1/public/systems?limit=100`)).json()) as {
      items: unknown[];
    };
    expect(items.length).toBe(100);
    const names = await cards.getByRole('link').allTextContents();
    expect(new Set(names).size).toBe(names.length);
    await page.getByText(`All ${names.length} systems are shown.`).waitFor();
  });

  test('keeps what was searched for: after a reload, and on the way back', async () => {
    const { page } = await openSystems(phone);
    await search(page).fill('phosph');
    await page.waitForURL(`${server.url}/systems#find=phosph`);
    await page.reload();
    await link(page, 'Phosphoric acid').tap();
    await title(page, 'Phosphoric acid');
    await page.goBack();
    await title(page, 'Systems');
    expect(await search(page).inputValue()).toBe('phosph');
    await link(page, 'Phosphoric acid').waitFor();
    expect(server.logs.join('')).not.toContain('#find');
  });

  test('is where it was on the way back; a system begins at its top, read before or not', async () => {
    const { page } = await openSystems(phone);
    const stands = (y: number) => page.waitForFunction((wanted) => window.scrollY === wanted, y);
    await link(page, 'Acetic acid').scrollIntoViewIfNeeded();
    await page.waitForFunction(() => window.scrollY > 1000);
    const before = await page.evaluate(() => window.scrollY);
    for (const visit of ['first', 'second']) {
      await link(page, 'Acetic acid').tap();
      await title(page, 'Acetic acid');
      await page.getByRole('slider', { name: 'pH cursor' }).waitFor();
      expect([visit, await page.evaluate(() => window.scrollY)]).toEqual([visit, 0]);
      await page.goBack();
      await title(page, 'Systems');
      await stands(before);
    }
    await page.getByRole('navigation').getByRole('link', { name: 'API' }).tap();
    await page.waitForURL(`${server.url}/api`);
    await page.getByRole('navigation').getByRole('link', { name: 'Systems' }).tap();
    await title(page, 'Systems');
    await stands(0);
  });

  test('stays beside the system on a wide screen, where the focus goes', async () => {
    const { page } = await openSystems(wide);
    await search(page).fill('phosph');
    await link(page, 'Phosphoric acid').focus();
    await page.keyboard.press('Enter');
    await title(page, 'Phosphoric acid');
    await page.waitForFunction(
      () => document.activeElement?.getAttribute('aria-label') === 'System',
    );
    await page.locator('[aria-current="page"]', { hasText: 'Phosphoric acid' }).waitFor();
    expect(await search(page).inputValue()).toBe('phosph');
    // The whole row is the target, its constants too.
    await page
      .getByRole('row', { name: /^Phosphorous acid/ })
      .click({ position: { x: 300, y: 20 } });
    await title(page, 'Phosphorous acid');
  });

  test('that finds nothing offers one’s own constants', async () => {
    const { page } = await openSystems(phone);
    await search(page).fill('unobtainium');
    await page.getByText('Nothing is called “unobtainium”').waitFor();
    await page.getByRole('link', { name: 'Type your own constants in Curves' }).tap();
    await fragmentIs(page, 'charge=0&pKa=7&pH=7.40');
    await title(page, 'Your constants: change the system or its conditions');
  });

  test('offline says so, keeps what is there, and goes on afterwards', async () => {
    const { page } = await openSystems(wide);
    await page.getByText('The first 50 systems are shown.').waitFor();
    await page.context().setOffline(true);
    await page.getByText('You are offline').waitFor();
    await search(page).fill('citric');
    await link(page, '1,10-phenanthroline').waitFor();
    await page.context().setOffline(false);
    await page.getByText('2 systems match citric.').waitFor();
  });
});

test.each(['/systems', '/systems/edta', '/systems/2-amino-2-methyl-1-3-propanediol', '/systems/x'])(
  'nothing scrolls sideways at 320 px: %s',
  async (path) => {
    const { page } = await openSystems({ ...phone, width: 320, height: 640 }, path);
    await page.getByRole('heading', { level: 1 }).waitFor();
    await page.waitForLoadState('networkidle');
    expect(await sidewaysScroll(page)).toBe(0);
  },
);
