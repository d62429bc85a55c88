import type { Page } from 'playwright-core';
import { startTestServer, type TestServer } from '../support/server';
import {
  cursor,
  cursorAt,
  openCurves,
  phone,
  placeOf,
  settled,
  showsValue,
  sidewaysScroll,
  wide,
} from './curves-page';

jest.setTimeout(60_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

const hydrogenPhosphate = 'H P O4, charge minus 2';

/** A finger's path, as the browser gets it from a touch screen. */
async function swipe(page: Page, path: readonly { x: number; y: number }[]) {
  const session = await page.context().newCDPSession(page);
  const [start, ...rest] = path;
  const at = (point: { x: number; y: number }) => [{ x: point.x, y: point.y }];
  if (!start) return;
  await session.send('Input.dispatchTouchEvent', { type: 'touchStart', touchPoints: at(start) });
  for (const point of rest) {
    await session.send('Input.dispatchTouchEvent', { type: 'touchMove', touchPoints: at(point) });
  }
  await session.send('Input.dispatchTouchEvent', { type: 'touchEnd', touchPoints: [] });
}

const line = (from: { x: number; y: number }, dx: number, dy: number) =>
  Array.from({ length: 9 }, (_, i) => ({ x: from.x + (dx * i) / 8, y: from.y + (dy * i) / 8 }));

describe('on a phone, by touch', () => {
  test('phosphoric acid at pH 7.40 is read at once', async () => {
    const { page, complaints } = await openCurves(server, phone);
    await cursorAt(page, '7.40');
    await showsValue(page, hydrogenPhosphate, '0.614');
    await showsValue(page, 'H2 P O4, charge minus 1', '0.386');
    const figure = await page.getByRole('img', { name: /^Fractions of the/ }).boundingBox();
    const dock = await page.getByRole('textbox', { name: 'pH' }).boundingBox();
    expect((figure?.y ?? 0) + (figure?.height ?? 0)).toBeLessThan(dock?.y ?? 0);
    expect(complaints).toEqual([]);
  });

  test('a tap moves the cursor there', async () => {
    const { page } = await openCurves(server, phone);
    const { x, y } = await placeOf(page, 2.15);
    await page.touchscreen.tap(x, y);
    await page.locator('[role="slider"][aria-valuetext^="pH 2.1"]').waitFor();
  });

  test('a sideways drag moves the cursor and not the page', async () => {
    const { page } = await openCurves(server, phone);
    const from = await placeOf(page, 7.4);
    const to = await placeOf(page, 10);
    await swipe(page, line(from, to.x - from.x, 0));
    await page.waitForFunction(() => {
      const now = Number(document.querySelector('[role="slider"]')?.getAttribute('aria-valuenow'));
      return Math.abs(now - 10) < 0.1;
    });
    expect(await page.evaluate(() => window.scrollY)).toBe(0);
    await settled(page);
    await showsValue(page, hydrogenPhosphate, '0.99');
  });

  test('an upward swipe over the plot scrolls the page and leaves the cursor', async () => {
    const { page } = await openCurves(server, phone);
    await swipe(page, line(await placeOf(page, 3), 0, -180));
    await page.waitForFunction(() => window.scrollY > 50);
    expect(await cursor(page).getAttribute('aria-valuenow')).toBe('7.4');
  });

  test('minus and plus step by 0.01', async () => {
    const { page } = await openCurves(server, phone);
    await page.getByRole('button', { name: 'Raise the pH by 0.01' }).tap();
    await cursorAt(page, '7.41');
    await page.getByRole('button', { name: 'Lower the pH by 0.01' }).tap();
    await cursorAt(page, '7.40');
  });

  test('the charge has a view of its own, which the address keeps', async () => {
    const { page } = await openCurves(server, phone);
    await page.getByRole('tab', { name: 'Charge' }).tap();
    await page.waitForFunction(() => window.location.hash.includes('view=charge'));
    await page.reload();
    await settled(page);
    expect(await page.getByRole('tab', { name: 'Charge' }).getAttribute('aria-selected')).toBe(
      'true',
    );
  });

  test('another system is two taps away', async () => {
    const { page } = await openCurves(server, phone);
    await page.getByRole('button', { name: /change the system/ }).tap();
    await page.getByRole('combobox', { name: 'System' }).tap();
    await page.getByRole('option', { name: /Citric acid/ }).tap();
    await page.getByRole('heading', { level: 1, name: /Citric acid/ }).waitFor();
    await showsValue(page, 'C6 H5 O7, charge minus 3', '0.910');
  });

  test.each([320, 360, 390])('nothing scrolls sideways at %i px', async (width) => {
    const { page } = await openCurves(server, { ...phone, width, height: 640 });
    expect(await sidewaysScroll(page)).toBe(0);
    await page.getByRole('button', { name: 'Share' }).tap();
    await page.getByRole('dialog').waitFor();
    expect(await sidewaysScroll(page)).toBe(0);
  });
});

describe('on a wide screen', () => {
  test('the mouse drags the cursor anywhere on the plot', async () => {
    const { page, complaints } = await openCurves(server, wide);
    const from = await placeOf(page, 4);
    const to = await placeOf(page, 12);
    await page.mouse.move(from.x, from.y);
    await page.mouse.down();
    await page.mouse.move(to.x, to.y + 300, { steps: 8 });
    await page.locator('[role="slider"][aria-valuetext^="pH 12.0"]').waitFor();
    await page.mouse.up();
    await page.mouse.move(from.x, from.y);
    await page.locator('[role="slider"][aria-valuetext^="pH 12.0"]').waitFor();
    expect(complaints).toEqual([]);
  });

  test('keys move the cursor by 0.01, 0.1 and 0.5, and to either end', async () => {
    const { page } = await openCurves(server, wide);
    await cursor(page).focus();
    for (const [key, pH] of [
      ['ArrowRight', '7.41'],
      ['ArrowLeft', '7.40'],
      ['Shift+ArrowUp', '7.50'],
      ['Shift+ArrowDown', '7.40'],
      ['PageUp', '7.90'],
      ['PageDown', '7.40'],
      ['End', '14.00'],
      ['ArrowRight', '14.00'],
      ['Home', '0.00'],
    ] as const) {
      await page.keyboard.press(key);
      await cursorAt(page, pH);
    }
  });

  test('a typed pH is read to every digit, and steps keep what was typed', async () => {
    const { page } = await openCurves(server, wide);
    const field = page.getByRole('textbox', { name: 'pH' });
    await field.fill('7.198');
    await cursorAt(page, '7.198');
    await settled(page);
    await showsValue(page, hydrogenPhosphate, '0.500');
    await field.press('ArrowUp');
    await cursorAt(page, '7.208');
    await field.press('PageDown');
    await cursorAt(page, '6.708');
  });

  test('a pH that is none is said beside the field, and the cursor stays', async () => {
    const { page } = await openCurves(server, wide);
    const field = page.getByRole('textbox', { name: 'pH' });
    await field.fill('77');
    await page.getByText('Write a pH from 0 to 14.').waitFor();
    expect(await field.getAttribute('aria-invalid')).toBe('true');
    await cursorAt(page, '7.40');
    await field.fill('7,5');
    await cursorAt(page, '7.50');
    expect(await field.getAttribute('aria-invalid')).toBeNull();
  });

  test('layers can be taken away and brought back', async () => {
    const { page } = await openCurves(server, wide);
    for (const name of ['Fractions', 'Predominance', 'Mean charge', 'Buffer capacity']) {
      await page.getByRole('checkbox', { name }).click();
    }
    await page.getByText('Nothing is drawn').waitFor();
    await page.getByRole('checkbox', { name: 'Mean charge' }).press(' ');
    await cursorAt(page, '7.40');
    await page.waitForFunction(() => window.location.hash.includes('layers=charge'));
  });

  test('the numbers behind the figure are a table', async () => {
    const { page } = await openCurves(server, wide);
    await page.getByRole('button', { name: 'Show the numbers' }).click();
    const table = page.getByRole('table', { name: /Fraction of each form/ });
    await table.waitFor();
    expect(await table.getByRole('row').count()).toBe(30);
    await table.getByRole('row', { name: /^7\.50 .*0\.667/ }).waitFor();
  });
});
