import { execFile } from 'node:child_process';
import { readFile } from 'node:fs/promises';
import { promisify } from 'node:util';
import type { Page } from 'playwright-core';
import { fractionsAnswer } from '../../shared/fractions';
import { startTestServer, type TestServer } from '../support/server';
import { cursorAt, openCurves, phone, showsValue, wide } from './curves-page';

jest.setTimeout(120_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

async function download(page: Page, name: string) {
  const [file] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name }).click(),
  ]);
  return { name: file.suggestedFilename(), bytes: await readFile(await file.path()) };
}

async function copied(page: Page, button: string) {
  await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
  await page.getByRole('button', { name: button, exact: true }).click();
  await page.getByRole('status').filter({ hasText: 'copied' }).waitFor();
  return page.evaluate(() => navigator.clipboard.readText());
}

describe('what leaves the screen', () => {
  test('the CSV is the curve as it was fetched', async () => {
    const { page } = await openCurves(server, wide);
    await page.getByRole('table', { name: 'Maxima of buffer capacity' }).waitFor();
    await page.getByRole('button', { name: 'Export' }).click();
    const { name, bytes } = await download(page, 'Numbers (CSV)');
    expect(name).toBe('Phosphoric-acid.csv');
    const rows = bytes.toString().split('\r\n');
    expect(rows[0]).toBe(
      'pH,H3PO4,H2PO4^-,HPO4^2-,PO4^3-,mean charge,total/(mol/L),buffer capacity/(mol/L per pH),' +
        'temperature/°C,ionic strength/(mol/L),activity model',
    );
    expect(rows).toHaveLength(1 + 701 + 1);
    // β = ln 10·(c(H⁺) + c(OH⁻) + c·v), v from the fractions of the row.
    expect(rows.find((row) => row.startsWith('7.40,'))).toBe(
      '7.40,0.00000215937,0.385768,0.614223,0.00000689170,-1.614235,0.05,0.0272827,25,0,ideal',
    );
  });

  test('the SVG stands alone: title, conditions, source, fonts, no link outwards', async () => {
    const { page, complaints } = await openCurves(server, phone, 'system=edta&pH=4.40');
    await page.getByRole('button', { name: 'Share' }).tap();
    const { bytes } = await download(page, 'Figure (SVG)');
    const svg = bytes.toString();
    // In a page of its own, as the file would be opened.
    const blank = await page.context().newPage();
    const read = await blank.evaluate((text) => {
      const { documentElement: root } = new DOMParser().parseFromString(text, 'image/svg+xml');
      return {
        root: root.nodeName,
        words: Array.from(root.querySelectorAll('text'), (node) => node.textContent),
        classes: root.querySelectorAll('[class]').length,
      };
    }, svg);
    expect(read.root).toBe('svg');
    expect(read.words).toEqual(
      expect.arrayContaining(['EDTA', '25 °C · I = 1, 0.1 · as given', '4.40']),
    );
    expect(read.words.join(' ')).toMatch(/Quantitative Chemical Analysis.* Recalled: sure\./);
    expect(read.classes).toBe(0);
    expect(svg.match(/@font-face/g)?.length).toBeGreaterThanOrEqual(5);
    expect(svg.match(/url\((?!data:)/g)).toBeNull();
    expect(complaints).toEqual([]);
  });

  test('the PNG has three pixels for each one on the screen', async () => {
    const { page, complaints } = await openCurves(server, wide);
    await page.getByRole('button', { name: 'Export' }).click();
    const { bytes } = await download(page, 'Figure (PNG)');
    expect(bytes.subarray(1, 4).toString()).toBe('PNG');
    expect(bytes.readUInt32BE(16)).toBeGreaterThan(1800);
    expect(complaints).toEqual([]);
  });

  test('the read-out is copied with every digit', async () => {
    const { page } = await openCurves(server, wide);
    expect((await copied(page, 'Copy all digits')).split('\n')).toContain(
      'HPO4^2-\t-2\t0.6142230366163610',
    );
  });
});

/** Runs a command as a reader would, with the key in the variable that it names. */
const inShell = (command: string) =>
  promisify(execFile)('sh', ['-c', command], {
    env: { ...process.env, STEPWELL_KEY: server.key },
    maxBuffer: 64_000_000,
  });

describe('the request', () => {
  const hostile = `name=${encodeURIComponent(`O'Neill "x" $HOME \\ é`)}&charge=1&pKa=2.351,9.78`;

  test('the copied curl gives the curve on the screen', async () => {
    const { page } = await openCurves(server, wide, `${hostile}&pH=7.40`);
    const { stdout } = await inShell(await copied(page, 'Copy'));
    const answer = fractionsAnswer.parse(JSON.parse(stdout));
    expect(answer.points).toHaveLength(701);
    expect(answer.name).toBe(`O'Neill "x" $HOME \\ é`);
    const shown = answer.points.find(({ pH }) => pH === '7.40')?.fractions[1] ?? '';
    await showsValue(page, 'H A', Number(shown).toFixed(3));
  });

  test('asks for a system of the handbook by its id', async () => {
    const { page } = await openCurves(server, wide, 'system=citric-acid&pH=5.00');
    const command = await copied(page, 'Copy');
    expect(command).toContain('"system": { "id": "citric-acid" }');
    const answer = fractionsAnswer.parse(JSON.parse((await inShell(command)).stdout));
    const shown = answer.points.find(({ pH }) => pH === '5.00')?.fractions[2] ?? '';
    await showsValue(page, 'C6 H6 O7, charge minus 2', Number(shown).toFixed(3));
  });

  test('is shown in four languages, without a key', async () => {
    const { page } = await openCurves(server, wide);
    await page.getByRole('button', { name: 'Open' }).click();
    await page.getByRole('tab', { name: 'curl' }).focus();
    for (const language of ['Python', 'TypeScript', 'R']) {
      await page.keyboard.press('ArrowRight');
      const code = page.getByRole('tabpanel', { name: language });
      await code.getByText('STEPWELL_KEY').waitFor();
      expect(await code.textContent()).toContain(`${server.url}/v1/fractions`);
    }
    await cursorAt(page, '7.40');
    await page.getByRole('button', { name: 'Close' }).click();
    await page.getByText('POST /v1/fractions').waitFor();
  });
});
