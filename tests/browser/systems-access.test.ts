import { axeFaults } from '../support/axe';
import { startTestServer, type TestServer } from '../support/server';
import { open } from './curves-page';

jest.setTimeout(180_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

describe.each([320, 390, 1280])('at %i px', (width) => {
  test.each(['light', 'dark'])(
    'axe finds nothing in list, system and refusals, %s',
    async (scheme) => {
      const { page } = await open({
        width,
        height: 800,
        dark: scheme === 'dark',
        touch: width < 900,
      });
      const go = (path: string) => page.goto(`${server.url}${path}`);

      await go('/systems');
      await page.getByText('The first 50 systems are shown.').waitFor();
      expect(await axeFaults(page)).toEqual([]);

      await page.getByRole('searchbox', { name: 'Find a system' }).fill('unobtainium');
      await page.getByText('Nothing is called “unobtainium”').waitFor();
      expect(await axeFaults(page)).toEqual([]);

      await go('/systems/edta');
      await page.getByRole('slider', { name: 'pH cursor' }).waitFor();
      expect(await axeFaults(page)).toEqual([]);

      await go('/systems/phosphoric-acid');
      await page.getByRole('slider', { name: 'pH cursor' }).waitFor();
      expect(await axeFaults(page)).toEqual([]);

      await go('/systems/unobtainium');
      await page.getByText(/No system has the id/).waitFor();
      expect(await axeFaults(page)).toEqual([]);
    },
  );
});

test('each page has one title and one heading of the first level', async () => {
  for (const width of [390, 1024, 1440]) {
    const { page } = await open({ width, height: 800 });
    for (const [path, title] of [
      ['/systems', 'Systems'],
      ['/systems/tris', 'Tris'],
      ['/systems/unobtainium', 'No such system'],
    ] as const) {
      await page.goto(`${server.url}${path}`);
      await page.getByRole('heading', { level: 1, name: title, exact: true }).waitFor();
      expect(await page.getByRole('heading', { level: 1 }).count()).toBe(1);
      await page.waitForFunction((wanted) => document.title === wanted, `${title} · Stepwell`);
    }
  }
});
