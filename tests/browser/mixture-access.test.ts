import { axeFaults } from '../support/axe';
import { startTestServer, type TestServer } from '../support/server';
import { wide } from './curves-page';
import { openMixture, row } from './mixture-page';

jest.setTimeout(180_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

const full =
  'system=citric-acid&c=0.02&charge=0&name=Larkmoor+buffer&pKa=7.2&form=1&c=0.01' +
  '&salt=CaCl2&c=0.05&air=42.5565&T=37&model=specific-ion-interaction';

describe.each([320, 390, 1280])('at %i px', (width) => {
  test.each(['light', 'dark'])(
    'axe finds nothing in the flask and what comes of it, %s',
    async (scheme) => {
      const view = { width, height: 800, dark: scheme === 'dark', touch: width < 900 };
      const onRail = width >= 900;
      const { page } = await openMixture(server, view, full);
      for (const name of ['Show the numbers', 'What this was computed with', 'Before you mix']) {
        await page.getByRole('button', { name }).click();
      }
      expect(await axeFaults(page)).toEqual([]);

      await row(page, 'Citric acid').getByRole('textbox', { name: 'Concentration' }).fill('x');
      await page.getByText('Write 0.025 or 25 mmol/L.').waitFor();
      await page.getByRole('button', { name: 'Add a component' }).click();
      await page.getByRole('option', { name: 'Phosphoric acid' }).waitFor();
      expect(await axeFaults(page)).toEqual([]);
      await page.keyboard.press('Escape');

      await page.getByRole('button', { name: onRail ? 'Export' : 'Share' }).click();
      await page.getByRole('dialog').waitFor();
      expect(await axeFaults(page)).toEqual([]);
    },
  );
});

test('every Tab stop shows its focus', async () => {
  const { page } = await openMixture(server, wide);
  const seen: string[] = [];
  for (;;) {
    await page.keyboard.press('Tab');
    const stop = await page.evaluate(() => {
      const element = document.activeElement;
      if (!element || element === document.body) return undefined;
      const { outlineStyle, outlineWidth } = getComputedStyle(element);
      const { top, bottom, width } = element.getBoundingClientRect();
      return {
        name: `${element.getAttribute('role') ?? element.tagName} ${element.getAttribute('aria-label') ?? element.textContent}`,
        ringed: outlineStyle !== 'none' && parseFloat(outlineWidth) >= 2,
        inSight: bottom > 0 && top < window.innerHeight && width > 0,
      };
    });
    if (!stop || seen.length > 60) break;
    expect(stop).toEqual({ name: stop.name, ringed: true, inSight: true });
    seen.push(stop.name);
  }
  expect(seen.length).toBeGreaterThan(20);
  expect(seen.length).toBeLessThan(60);
});

test('the page has its title, one h1 and one figure with a sentence', async () => {
  const { page } = await openMixture(server, wide);
  expect(await page.title()).toBe('Mixture · Stepwell');
  expect(await page.getByRole('heading', { level: 1 }).count()).toBe(1);
  const figure = page.getByRole('img', { name: /^Buffer capacity of the mixture/ });
  expect(await figure.getAttribute('aria-label')).toMatch(
    /with the parts of Phosphoric acid\. pH 6\.88, ionic strength 0\.100 moles per litre/,
  );
});
