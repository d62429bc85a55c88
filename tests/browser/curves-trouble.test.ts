import { startTestServer, type TestServer } from '../support/server';
import { limits } from '../../shared/limits';
import { cursorAt, openCurves, showsValue, wide } from './curves-page';

jest.setTimeout(120_000);

let server: TestServer;
let running: boolean;
beforeEach(async () => {
  server = await startTestServer({ withApp: true });
  running = true;
});
// After the browsers are closed, whose connections the server would wait for.
afterEach(async () => {
  if (running) await server.close();
});

const own = 'charge=0&pKa=2.148,7.198,12.35&pH=7.40';

test('offline, what is drawn stays and can still be read; new curves come afterwards', async () => {
  const { page } = await openCurves(server, wide, own);
  await page.context().setOffline(true);
  await page.getByText('You are offline').waitFor();
  await page.getByRole('slider').press('PageUp');
  await cursorAt(page, '7.90');
  await showsValue(page, 'H A, charge minus 2', '0.834');
  await page.getByRole('textbox', { name: 'pKa 2' }).fill('6.2');
  await showsValue(page, 'H A, charge minus 2', '0.834');
  await page.context().setOffline(false);
  await page.getByText('You are offline').waitFor({ state: 'detached' });
  await showsValue(page, 'H A, charge minus 2', '0.980');
});

test('too many calls: it says when they are made again, and what is drawn stays', async () => {
  const { page } = await openCurves(server, wide, own);
  const call = () =>
    fetch(`${server.url}/v1/public/fractions`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ system: { fullyProtonatedCharge: 0, pKa: ['7'] }, pH: '7' }),
    });
  // A window of the limit may end while it is filled: fill it until one call is refused.
  for (let statuses: number[] = []; !statuses.includes(429);) {
    const answers = await Promise.all(Array.from({ length: limits.publicCallsPerMinute }, call));
    statuses = answers.map(({ status }) => status);
  }
  await page.getByRole('textbox', { name: 'pKa 2' }).fill('6.2');
  await page.getByText('Too many curves at once').waitFor();
  await page.getByText(/It is tried again by itself in \d+ s\./).waitFor();
  await showsValue(page, 'H A, charge minus 2', '0.614');
});

test('a service that has stopped is said to be out of reach, and what is drawn stays', async () => {
  const { page } = await openCurves(server, wide, own);
  running = false;
  await server.close();
  await page.getByRole('textbox', { name: 'pKa 2' }).fill('6.2');
  await page.getByText('The service cannot be reached').waitFor();
  await showsValue(page, 'H A, charge minus 2', '0.614');
  await page.getByRole('button', { name: 'Try again' }).waitFor();
});
