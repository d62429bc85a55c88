import type { Page } from 'playwright-core';
import { startTestServer, type TestServer } from '../support/server';
import {
  cursorAt,
  fragmentIs,
  open,
  openCurves,
  phone,
  settled,
  showsValue,
  wide,
} from './curves-page';

jest.setTimeout(60_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

const field = (page: Page) => page.getByRole('combobox', { name: 'System' });
const option = (page: Page, name: string | RegExp) => page.getByRole('option', { name });
const drawn = (page: Page, name: string) =>
  page.getByRole('heading', { level: 1, name: new RegExp(name) }).waitFor();

/** Sends the focus to the field, whose text is then selected as a whole. */
async function enterField(page: Page): Promise<void> {
  await field(page).focus();
  await page.waitForFunction(() => {
    const input = document.activeElement;
    if (!(input instanceof HTMLInputElement)) return false;
    return input.selectionStart === 0 && input.selectionEnd === input.value.length;
  });
}

/** Waits until the option that the keys are at is this one, as a screen reader follows them. */
const keysAt = async (page: Page, name: string): Promise<void> => {
  await page.waitForFunction((wanted) => {
    const input = document.activeElement;
    const id = input?.getAttribute('aria-activedescendant');
    const active = id ? document.getElementById(id) : null;
    return input?.getAttribute('role') === 'combobox' && active?.textContent.startsWith(wanted);
  }, name);
};

describe('a system is found', () => {
  test.each([
    ['name', 'citric', 'Citric acid', 'citric-acid'],
    ['alias', 'tromethamine', 'Tris', 'tris'],
    ['formula of a form', 'H2PO4', 'Phosphoric acid', 'phosphoric-acid'],
    ['CAS number', '56-40-6', 'Glycine', 'glycine'],
  ])('by %s', async (_, text, name, id) => {
    const { page, complaints } = await openCurves(server, wide, 'system=edta&pH=7.40');
    await field(page).fill(text);
    await option(page, new RegExp(`^${name}`)).click();
    await drawn(page, name);
    await fragmentIs(page, `system=${id}&pH=7.40`);
    expect(complaints).toEqual([]);
  });

  test('each option shows formula and constants', async () => {
    const { page } = await openCurves(server, wide);
    await field(page).fill('77-92-9');
    await option(page, 'Citric acid').waitFor();
    expect(await option(page, 'Citric acid').textContent()).toContain(
      'C6H8O7 · 3.128, 4.761, 6.396',
    );
  });
});

describe('the search by keyboard', () => {
  test('opens, goes round its options, takes one, and keeps the focus', async () => {
    const { page } = await openCurves(server, wide);
    await field(page).focus();
    expect(await field(page).getAttribute('aria-expanded')).toBe('false');
    await page.keyboard.press('ArrowDown');
    await keysAt(page, 'Phosphoric acid');
    await page.keyboard.press('ArrowUp');
    await keysAt(page, 'Type your own constants');
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('ArrowDown');
    await keysAt(page, 'Citric acid');
    await page.keyboard.press('Enter');
    await drawn(page, 'Citric acid');
    await field(page).and(page.locator('[aria-expanded="false"]')).waitFor();
    expect(await field(page).inputValue()).toBe('Citric acid');
    expect(await field(page).evaluate((input) => input === document.activeElement)).toBe(true);
  });

  test('typing replaces what is chosen and stands at the best match', async () => {
    const { page } = await openCurves(server, wide);
    await enterField(page);
    await page.keyboard.type('glycine');
    await keysAt(page, 'Glycine');
    expect(await field(page).inputValue()).toBe('glycine');
    await page.keyboard.press('Enter');
    await fragmentIs(page, 'system=glycine&pH=7.40');
  });

  test('Enter before the list is there takes the best match once it has come', async () => {
    const { page } = await openCurves(server, wide);
    let release: () => void = () => undefined;
    const held = new Promise<void>((resolve) => {
      release = resolve;
    });
    await page.route(/public\/systems\?/, async (route) => {
      await held;
      await route.continue();
    });
    await enterField(page);
    await page.keyboard.type('boric');
    await page.keyboard.press('Enter');
    release();
    await fragmentIs(page, 'system=boric-acid&pH=7.40');
  });

  test('Escape closes the list, and leaving the field keeps the system', async () => {
    const { page } = await openCurves(server, wide);
    await enterField(page);
    await page.keyboard.type('citric');
    await option(page, /^Citric acid/).waitFor();
    await page.keyboard.press('Escape');
    await page.getByRole('listbox').waitFor({ state: 'detached' });
    await page.keyboard.press('Tab');
    expect(await field(page).inputValue()).toBe('Phosphoric acid');
    await drawn(page, 'Phosphoric acid');
  });

  test('on a phone Escape closes the list first, then the dialog', async () => {
    const { page } = await openCurves(server, phone);
    await page.getByRole('button', { name: /change the system/ }).click();
    await field(page).click();
    await option(page, 'Tris').waitFor();
    await page.keyboard.press('Escape');
    await page.getByRole('listbox').waitFor({ state: 'detached' });
    expect(await page.getByRole('dialog').isVisible()).toBe(true);
    await page.keyboard.press('Escape');
    await page.getByRole('dialog').waitFor({ state: 'detached' });
  });
});

describe('where nothing is found', () => {
  test('it says so, and one’s own constants are offered', async () => {
    const { page } = await openCurves(server, wide);
    await field(page).fill('unobtainium');
    await page
      .getByRole('status')
      .filter({ hasText: 'Nothing is called “unobtainium”.' })
      .waitFor();
    await option(page, 'Type your own constants').click();
    await page.getByRole('textbox', { name: 'pKa 3' }).waitFor();
    await fragmentIs(page, 'name=phosphoric+acid&charge=0&pKa=2.148,7.198,12.35&pH=7.40');
  });

  test('offline it says that the handbook cannot be searched, and goes on afterwards', async () => {
    const { page } = await openCurves(server, wide);
    await page.context().setOffline(true);
    await page.getByText('You are offline', { exact: true }).waitFor();
    await field(page).fill('citric');
    await page
      .getByRole('status')
      .filter({ hasText: 'You are offline: the handbook cannot be searched now.' })
      .waitFor();
    await option(page, 'Type your own constants').waitFor();
    await page.context().setOffline(false);
    await option(page, /^Citric acid/).waitFor();
  });

  test('an id that no system has gives way to phosphoric acid, and is named', async () => {
    const { page } = await openCurves(server, wide, 'system=unobtainium&pH=6.00');
    await page.getByText('No system has the id unobtainium').waitFor();
    await drawn(page, 'Phosphoric acid');
    await cursorAt(page, '6.00');
    await fragmentIs(page, 'system=phosphoric-acid&pH=6.00');
    await field(page).fill('acetic');
    await option(page, /^Acetic acid/).click();
    await page.getByText('No system has the id unobtainium').waitFor({ state: 'detached' });
  });
});

describe('what is drawn by id', () => {
  test('comes with one call, its constants and their provenance with it', async () => {
    const { page } = await open(wide);
    const calls: string[] = [];
    page.on('request', (request) => {
      const { pathname } = new URL(request.url());
      if (pathname.startsWith('/v1/')) calls.push(`${request.method()} ${pathname}`);
    });
    await page.goto(`${server.url}/#system=citric-acid&pH=5.00`);
    await cursorAt(page, '5.00');
    expect(calls[0]).toBe('POST /v1/public/fractions');
    await settled(page);
    // The second one is the exact answer at the cursor; the layer of capacity has its own.
    expect(calls.filter((call) => call.endsWith('/fractions'))).toHaveLength(2);
    expect(calls.toSorted()).toEqual([
      'POST /v1/public/buffer-capacity',
      ...Array.from({ length: 2 }, () => 'POST /v1/public/fractions'),
    ]);
    const constants = page.getByRole('table', { name: 'Constants' });
    await constants.getByRole('row').filter({ hasText: '4.761' }).waitFor();
    await page.getByText('J. Phys. Chem. Ref. Data 31, 231 (2002)').waitFor();
    await page.getByText('Recalled', { exact: true }).waitFor();
  });

  test('a revision can be named', async () => {
    const { page } = await openCurves(server, wide, 'system=tris@1&pH=8.10');
    await drawn(page, 'Tris');
    await cursorAt(page, '8.10');
  });

  test('constants of a medium and estimates are said beside the figure', async () => {
    const { page } = await openCurves(server, phone, 'system=egta&pH=7.40');
    await page.getByText('Constants of their own medium').waitFor();
    await page.getByText(/used as given, for an ionic strength of 0\.1 mol\/L/).waitFor();
    await page.getByRole('button', { name: /EGTA/ }).waitFor();
    await page.evaluate(() => {
      window.location.hash = 'system=hydrochloric-acid&pH=7.40';
    });
    await page.getByText('An estimate', { exact: true }).waitFor();
    await page.getByText(/pKa 1 \(\u22126\.0\): an estimate, not a measurement/).waitFor();
  });

  test('its constants can be changed, and lead to all that is known of them', async () => {
    const { page } = await openCurves(server, wide, 'system=glycine&pH=7.40');
    await page.getByRole('link', { name: 'All that is known of them' }).click();
    await page.waitForURL(`${server.url}/systems/glycine`);
    await page.goBack();
    await drawn(page, 'Glycine');
    await page.getByRole('button', { name: 'Change these constants' }).click();
    await fragmentIs(page, 'name=glycine&charge=1&pKa=2.351,9.78&pH=7.40');
    await showsValue(page, 'H A', '0.996');
  });
});
