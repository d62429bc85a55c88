import { axeFaults } from '../support/axe';
import { startTestServer, type TestServer } from '../support/server';
import { openCurves, wide } from './curves-page';

jest.setTimeout(180_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

const own = 'name=Larkmoor+buffer&charge=0&pKa=2.148,7.198,12.35&pH=7.40';

describe.each([320, 390, 1280])('at %i px', (width) => {
  describe.each(['light', 'dark'])('%s', (scheme) => {
    const view = { width, height: 800, dark: scheme === 'dark', touch: width < 900 };
    const onRail = width >= 900;

    test('axe finds nothing in the search for a system, found or not', async () => {
      const { page } = await openCurves(server, view, 'system=edta');
      if (!onRail) await page.getByRole('button', { name: /change the system/ }).click();
      const field = page.getByRole('combobox', { name: 'System' });
      await field.click();
      await page.getByRole('option', { name: 'Phosphoric acid' }).waitFor();
      expect(await axeFaults(page)).toEqual([]);
      await field.fill('citr');
      await page.getByRole('option', { name: /^Citric acid/ }).waitFor();
      expect(await axeFaults(page)).toEqual([]);
      await field.fill('no such thing');
      await page.getByText('Nothing is called “no such thing”.').first().waitFor();
      expect(await axeFaults(page)).toEqual([]);
    });

    test('axe finds nothing in the curve, its error, its dialog and its request', async () => {
      const { page } = await openCurves(server, view, own);
      await page.getByRole('button', { name: 'Show the numbers' }).click();
      await page.getByRole('table', { name: /Fraction of each form/ }).waitFor();
      expect(await axeFaults(page)).toEqual([]);

      if (!onRail) await page.getByRole('button', { name: /change the system/ }).click();
      await page.getByRole('textbox', { name: 'pKa 2' }).fill('x');
      await page.getByText('Write a number such as 7.20.').waitFor();
      expect(await axeFaults(page)).toEqual([]);
      await page.keyboard.press('Escape');

      await page.getByRole('button', { name: onRail ? 'Export' : 'Share' }).click();
      await page.getByRole('dialog').waitFor();
      expect(await axeFaults(page)).toEqual([]);
      await page.keyboard.press('Escape');

      if (onRail) {
        await page.getByRole('button', { name: 'Open' }).click();
        await page.getByRole('tabpanel', { name: 'curl' }).waitFor();
        expect(await axeFaults(page)).toEqual([]);
      }
    });

    test('axe finds nothing in the layers, a curve beside and a refusal', async () => {
      const beside = 'with=system%3Dglycine%26T%3D37%26I%3D0.15';
      const layers = 'layers=fractions,predominance,charge,capacity,lg-c,isoelectric-point';
      const fragment = `system=glycine&I=0.1&pH=6.00&view=capacity&${layers}&${beside}`;
      const { page } = await openCurves(server, view, fragment);
      await page.getByRole('table', { name: 'Maxima of buffer capacity' }).waitFor();
      await page.getByRole('table', { name: /^How far I 0\.15/ }).waitFor();
      expect(await axeFaults(page)).toEqual([]);

      if (!onRail) await page.getByRole('button', { name: /change the system/ }).click();
      await page.getByRole('textbox', { name: 'Ionic strength' }).fill('5');
      await page.getByRole('button', { name: 'Compute all the same' }).first().waitFor();
      await page.getByRole('button', { name: /^I 0\.15/ }).click();
      await page
        .getByRole('group', { name: /^Compared with/ })
        .getByText('Temperature')
        .waitFor();
      expect(await axeFaults(page)).toEqual([]);
    });
  });
});

test.each([
  ['wide', wide],
  ['on a phone', { width: 390, height: 844 }],
])('every Tab stop shows its focus, %s', async (_, view) => {
  const { page } = await openCurves(server, view, own);
  const seen: string[] = [];
  for (;;) {
    await page.keyboard.press('Tab');
    const stop = await page.evaluate(() => {
      const element = document.activeElement;
      if (!element || element === document.body) return undefined;
      const { outlineStyle, outlineWidth } = getComputedStyle(element);
      const { top, bottom, width } = element.getBoundingClientRect();
      const name = element.getAttribute('aria-label') ?? element.textContent;
      const labelled = document.getElementById(element.getAttribute('aria-labelledby') ?? '');
      return {
        name: `${element.getAttribute('role') ?? element.tagName} ${labelled?.textContent ?? name}`,
        ringed: outlineStyle !== 'none' && parseFloat(outlineWidth) >= 2,
        inSight: bottom > 0 && top < window.innerHeight && width > 0,
      };
    });
    if (!stop || seen.length > 60) break;
    expect(stop).toEqual({ name: stop.name, ringed: true, inSight: true });
    seen.push(stop.name);
  }
  expect(seen).toEqual(expect.arrayContaining(['slider pH cursor']));
  expect(new Set(seen).size).toBeGreaterThan(10);
  expect(seen.length).toBeLessThan(60);
});

test('the first figure is one image with a sentence, one h1, one status', async () => {
  const { page } = await openCurves(server, wide);
  expect(await page.title()).toBe('Phosphoric acid · Stepwell');
  expect(await page.getByRole('heading', { level: 1 }).count()).toBe(1);
  const figure = page.getByRole('img', { name: /^Fractions of the 4 forms of phosphoric acid/ });
  expect(await figure.count()).toBe(1);
  const { min, max, now, text } = await page.getByRole('slider').evaluate((slider) => ({
    min: slider.getAttribute('aria-valuemin'),
    max: slider.getAttribute('aria-valuemax'),
    now: slider.getAttribute('aria-valuenow'),
    text: slider.getAttribute('aria-valuetext'),
  }));
  expect({ min, max, now }).toEqual({ min: '0', max: '14', now: '7.4' });
  expect(text).toBe(
    'pH 7.40: H P O4, charge minus 2 predominates, fraction 0.614, mean charge minus 1.61',
  );
});
