import type { Page } from 'playwright-core';
import { startTestServer, type TestServer } from '../support/server';
import { cursorAt, fragmentIs, openCurves, phone, settled, showsValue, wide } from './curves-page';

jest.setTimeout(60_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

const own = 'name=Larkmoor+buffer&charge=0&pKa=2.148,7.198,12.35&pH=7.40';
const constant = (page: Page, number: number) =>
  page.getByRole('textbox', { name: `pKa ${number}`, exact: true });

/** Pastes as the browser does: the event first, and the text only where nobody took it. */
const paste = (page: Page, number: number, text: string) =>
  constant(page, number).evaluate((input, pasted) => {
    const clipboardData = new DataTransfer();
    clipboardData.setData('text', pasted);
    const event = new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true });
    return input.dispatchEvent(event);
  }, text);

describe('a system of one’s own', () => {
  test('begins from the one that is drawn', async () => {
    const { page, complaints } = await openCurves(server, wide);
    await page.getByRole('button', { name: 'Change these constants' }).click();
    await fragmentIs(page, 'name=phosphoric+acid&charge=0&pKa=2.148,7.198,12.35&pH=7.40');
    expect(await constant(page, 3).inputValue()).toBe('12.35');
    await showsValue(page, 'H A, charge minus 2', '0.614');
    expect(complaints).toEqual([]);
  });

  test.each([
    ['commas', '2.35, 9.78'],
    ['lines', '2.35\n9.78\n'],
    ['tabs', '2.35\t9.78'],
    ['decimal commas', '2,35; 9,78'],
  ])('constants parted by %s fill the rows', async (_, text) => {
    const { page } = await openCurves(server, wide, own);
    expect(await paste(page, 1, text)).toBe(false);
    await constant(page, 3).waitFor({ state: 'detached' });
    await page.waitForFunction(() => /pKa=2\.35,9\.78&/.test(window.location.hash));
    await showsValue(page, 'H A, charge minus 1', '0.996');
  });

  test('a single value is pasted into its field as usual', async () => {
    const { page } = await openCurves(server, wide, own);
    expect(await paste(page, 1, '2.2')).toBe(true);
  });

  test('a malformed constant is said beside its field, and the old curve stays', async () => {
    const { page } = await openCurves(server, wide, own);
    await constant(page, 2).fill('7.1.98');
    await page.getByText('Write a number such as 7.20.').waitFor();
    const message = await constant(page, 2).getAttribute('aria-describedby');
    expect(await page.locator(`[id="${message}"]`).textContent()).toBe(
      'Write a number such as 7.20.',
    );
    await cursorAt(page, '7.40');
    await showsValue(page, 'H A, charge minus 2', '0.614');
    await fragmentIs(page, own);
    await constant(page, 2).fill('6.4');
    await page.getByText('Write a number such as 7.20.').waitFor({ state: 'detached' });
    await showsValue(page, 'H A, charge minus 2', '0.909');
  });

  test('a constant can be added and removed by keyboard alone', async () => {
    const { page } = await openCurves(server, wide, own);
    await constant(page, 3).press('Enter');
    await page.waitForFunction(
      () => document.activeElement?.getAttribute('aria-label') === 'pKa 4',
    );
    await page.keyboard.type('13.1');
    await page.waitForFunction(() => window.location.hash.includes('12.35,13.1'));
    await page.getByRole('button', { name: 'Remove pKa 4' }).press('Enter');
    await fragmentIs(page, own);
  });

  test('an example puts it away, and one press brings it back', async () => {
    const { page } = await openCurves(server, wide, own);
    await page.getByRole('combobox', { name: 'System' }).click();
    await page.getByRole('option', { name: /Acetic acid/ }).click();
    await fragmentIs(page, 'system=acetic-acid&pH=7.40');
    await page.getByRole('button', { name: 'Undo' }).click();
    await fragmentIs(page, own);
  });

  test('inverted constants are computed, and said to be', async () => {
    const { page } = await openCurves(server, wide, 'charge=0&pKa=9,4&pH=7.40');
    await page.getByText('Computed as given').waitFor();
    await page.getByText(/species 1 never predominates/).waitFor();
  });

  test('64 constants are drawn, and only the common forms are listed', async () => {
    const pKa = Array.from({ length: 64 }, (_, i) => (2 + i * 0.14).toFixed(2)).join(',');
    const { page, complaints } = await openCurves(server, phone, `charge=10&pKa=${pKa}&pH=6.00`);
    const table = page.getByRole('table', { name: 'Forms at the cursor' });
    expect(await table.getByRole('row').count()).toBeLessThan(20);
    await page.getByRole('button', { name: 'Show all 65 forms' }).tap();
    await table.getByRole('row').nth(65).waitFor();
    expect(complaints).toEqual([]);
  });
});

describe('the address', () => {
  test('a reload gives the same screen', async () => {
    const { page } = await openCurves(server, wide);
    await page.getByRole('combobox', { name: 'System' }).click();
    await page.getByRole('option', { name: /Glycine/ }).click();
    await page.getByRole('textbox', { name: 'pH' }).fill('9.5');
    await page.getByRole('checkbox', { name: 'Mean charge' }).click();
    const fragment = 'system=glycine&pH=9.50&layers=fractions,predominance,capacity';
    await fragmentIs(page, fragment);
    await page.reload();
    await settled(page);
    await cursorAt(page, '9.50');
    await page.getByRole('heading', { level: 1, name: 'Glycine' }).waitFor();
    expect(
      await page.getByRole('checkbox', { name: 'Mean charge' }).getAttribute('aria-checked'),
    ).toBe('false');
    await fragmentIs(page, fragment);
  });

  test('a copied link gives the same screen on another device', async () => {
    const { page } = await openCurves(server, wide, own);
    await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
    await page.getByRole('button', { name: 'Copy link' }).click();
    await page.getByText('Link copied').waitFor();
    const link = await page.evaluate(() => navigator.clipboard.readText());
    expect(link).toBe(`${server.url}/#${own}`);
    const other = await openCurves(server, { ...phone, dark: true }, link.split('#')[1]);
    await cursorAt(other.page, '7.40');
    await other.page.getByRole('heading', { level: 1, name: /Larkmoor buffer/ }).waitFor();
    await showsValue(other.page, 'H A, charge minus 2', '0.614');
  });

  test('the fragment is never sent to the server', async () => {
    const { page } = await openCurves(server, wide, own);
    await settled(page);
    expect(server.logs.join('')).not.toContain('Larkmoor');
  });

  test('what cannot be used is said, and something is drawn', async () => {
    const { page, complaints } = await openCurves(server, wide, 'charge=0&pKa=%E0%A4%A&pH=soon');
    await page.getByText('Part of this address could not be used').waitFor();
    await cursorAt(page, '7.40');
    await showsValue(page, 'H P O4, charge minus 2', '0.614');
    expect(complaints).toEqual([]);
  });

  test('an address that is changed by hand is followed', async () => {
    const { page } = await openCurves(server, wide, own);
    await page.evaluate(() => {
      window.location.hash = 'system=edta&pH=4.40';
    });
    await page.getByRole('heading', { level: 1, name: 'EDTA' }).waitFor();
    await cursorAt(page, '4.40');
  });

  test('leaving and coming back gives the same screen, by link and by history', async () => {
    const { page } = await openCurves(server, wide);
    await page.getByRole('textbox', { name: 'pH' }).fill('6.1');
    await fragmentIs(page, 'system=phosphoric-acid&pH=6.10');
    await page.getByRole('link', { name: 'Notes' }).click();
    await page.waitForURL(`${server.url}/notes`);
    await page.goBack();
    await cursorAt(page, '6.10');
    await page.goForward();
    await page.waitForURL(`${server.url}/notes`);
    await page.getByRole('link', { name: /^Curves/ }).click();
    await cursorAt(page, '6.10');
    await fragmentIs(page, 'system=phosphoric-acid&pH=6.10');
    await page.goBack();
    await page.waitForURL(`${server.url}/notes`);
  });
});
