import { execFile } from 'node:child_process';
import { readFile } from 'node:fs/promises';
import { promisify } from 'node:util';
import type { Page } from 'playwright-core';
import { mixtureAnswer } from '../../shared/mixtures';
import { startTestServer, type TestServer } from '../support/server';
import { fragmentIs, open, phone, sidewaysScroll, wide } from './curves-page';
import { add, answers, choose, openMixture, row } from './mixture-page';

jest.setTimeout(120_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

describe('a first visit', () => {
  test('answers at once, for the equimolal phosphate, and sends nothing of the address', async () => {
    const calls: string[] = [];
    const { page, complaints } = await openMixture(server, wide);
    page.on('request', (call) => calls.push(call.url()));
    // The reference buffer reads 6.865 at 25 °C (NIST; recalled). By Davies it is within 0.02 of
    // that, and the handbook's constants give 6.876 (tests/reference/ph-standards).
    await answers(page, '6.88');
    await row(page, 'Phosphoric acid').first().getByText('Brings 0.025 mol/L of').waitFor();
    await page
      .getByRole('img', { name: /^Buffer capacity of the mixture over pH 1 to 13/ })
      .waitFor();
    const table = page.getByRole('table', { name: 'Forms in the mixture' });
    // Both portions are one system: a head and its four forms.
    expect(await table.getByRole('row').count()).toBe(5);
    expect(calls.filter((url) => url.includes('#'))).toEqual([]);
    expect(complaints).toEqual([]);
  });

  test('on a phone the pH stays in sight, and nothing scrolls sideways at 320 px', async () => {
    const { page } = await openMixture(server, { width: 320, height: 640, touch: true });
    await answers(page, '6.88');
    const seen = await page.evaluate(() =>
      Array.from(document.querySelectorAll('[aria-hidden]'), (element) => ({
        text: element.textContent,
        bottom: element.getBoundingClientRect().bottom,
      })).filter(({ text }) => text.startsWith('pH 6.88')),
    );
    expect(seen.map(({ bottom }) => bottom > 0 && bottom <= 640)).toEqual([true]);
    expect(await sidewaysScroll(page)).toBe(0);
  });
});

describe('the flask', () => {
  test('is filled by keyboard alone, and stands in the address', async () => {
    const { page } = await openMixture(server, wide, 'T=25');
    await answers(page, '7.00');
    await page.getByRole('button', { name: 'Add a component' }).focus();
    await page.keyboard.press('Enter');
    await page.waitForFunction(() => document.activeElement?.getAttribute('role') === 'combobox');
    await page.keyboard.type('acetic');
    await page.getByRole('option', { name: /^Acetic acid/ }).waitFor();
    await page.keyboard.press('Enter');
    const acetic = row(page, 'Acetic acid');
    await acetic.getByRole('textbox', { name: 'Concentration' }).focus();
    await page.keyboard.type('100 mmol/L');
    await acetic.getByRole('combobox', { name: 'Weighed in as' }).focus();
    // Open, to the second form, take it.
    for (const key of ['Enter', 'ArrowDown', 'Enter']) await page.keyboard.press(key);
    await acetic.getByText('Brings 0.1 mol/L of').waitFor();
    // Sodium acetate, 0.1 mol/L: ½(13.995 + 4.756 − 1) = 8.88; by Davies pKₐ is 0.21 lower.
    await answers(page, '8.77');
    const fragment = 'system=acetic-acid&form=1&c=0.1&T=25';
    await fragmentIs(page, fragment);
    await page.reload();
    await answers(page, '8.77');
  });

  test('gives back what was taken out of it', async () => {
    const { page } = await openMixture(server, wide);
    await row(page, 'Phosphoric acid')
      .nth(1)
      .getByRole('button', { name: /^Take out/ })
      .click();
    await page.getByText('1 of 24 components').waitFor();
    await page.getByText('Phosphoric acid taken out of the mixture').waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByText('2 of 24 components').waitFor();
    await answers(page, '6.88');
  });

  test('takes salts, a strong acid, an ammonium salt, the air and constants of one’s own', async () => {
    const { page, complaints } = await openMixture(server, wide, 'T=25');
    // Water under today's air: rain has pH 5.6 (a common textbook value).
    await page.getByRole('checkbox', { name: 'Open to air' }).click();
    await answers(page, '5.60');
    await page.getByRole('checkbox', { name: 'Open to air' }).click();
    await page.getByRole('button', { name: 'Add a salt' }).click();
    await choose(row(page, 'NaCl'), 'Salt', /^Ca Cl2/);
    await row(page, 'CaCl2').getByRole('textbox', { name: 'Concentration' }).fill('0,05');
    await page.getByRole('textbox', { name: 'Strong acid' }).fill('10 mmol/L');
    const ions = page.getByRole('table', { name: /^Ions beside/ });
    // Chloride of both: 2 × 0.05 + 0.01.
    await ions.getByRole('row', { name: /Cl, charge minus 1 0\.110/ }).waitFor();

    await add(page, 'phosph', /^Phosphoric acid/);
    await choose(row(page, 'Phosphoric acid'), 'Weighed in as', /^Na2 H P O4/);
    await choose(row(page, 'Phosphoric acid'), 'Counter-ion', /N H4, charge plus 1/);
    const forms = page.getByRole('table', { name: 'Forms in the mixture' });
    await forms.getByText('Ammonia').first().waitFor();

    await page.getByRole('button', { name: 'Add a component' }).click();
    await page.getByRole('option', { name: /^Type your own constants/ }).click();
    const own = row(page, 'Your own constants');
    await own.getByRole('textbox', { name: 'pKa 1' }).fill('4,2');
    await forms.getByText('Your own constants').first().waitFor();
    expect(complaints).toEqual([]);
  });
});

describe('what cannot be computed', () => {
  test('malformed text is told beside its field, and the last answer stays', async () => {
    const { page } = await openMixture(server, wide);
    await answers(page, '6.88');
    await row(page, 'Phosphoric acid')
      .first()
      .getByRole('textbox', { name: 'Concentration' })
      .fill('25 mM');
    await page.getByText('Write 0.025 or 25 mmol/L.').waitFor();
    await page.getByRole('textbox', { name: 'Temperature' }).fill('500');
    await page.getByText('Write a value from 0 to 100 °C.').waitFor();
    await answers(page, '6.88');
  });

  test('what the service refuses stands beside what it is about, and may be overruled', async () => {
    const { page } = await openMixture(server, wide);
    await answers(page, '6.88');
    await add(page, 'edta', /^EDTA/);
    await row(page, 'EDTA')
      .getByText(/concentration constants for I/)
      .waitFor();
    await page.getByText('pH of the mixture before').waitFor();
    await page.getByRole('button', { name: 'Compute all the same' }).click();
    await page.getByText('pH of this mixture').waitFor();
    await page.waitForFunction(() => window.location.hash.endsWith('&beyond=compute'));
  });

  test('a system that nobody has is told beside it, and the others come once it is out', async () => {
    const { page } = await open(wide);
    await page.goto(`${server.url}/mixture#system=no-such-thing&c=0.1&system=tris&c=0.1&T=25`);
    await row(page, 'no-such-thing').getByText('No system has this id.').waitFor();
    await row(page, 'no-such-thing')
      .getByRole('button', { name: /^Take out/ })
      .click();
    await page.getByText('pH of this mixture').waitFor();
  });

  test('offline, the answer stays', async () => {
    const { page } = await openMixture(server, wide);
    await page.context().setOffline(true);
    await page.getByText('You are offline').waitFor();
    await page.getByRole('textbox', { name: 'Temperature' }).fill('37');
    await answers(page, '6.88');
    await page.context().setOffline(false);
    await page.getByText('You are offline').waitFor({ state: 'detached' });
    await page.getByText('37 °C').waitFor();
  });
});

async function download(page: Page, name: string) {
  const [file] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name }).click(),
  ]);
  return { name: file.suggestedFilename(), text: (await readFile(await file.path())).toString() };
}

describe('what leaves the screen', () => {
  test('the table as CSV, digit for digit, and the figure with its conditions', async () => {
    const { page } = await openMixture(server, phone);
    await answers(page, '6.88');
    await page.getByRole('button', { name: 'Share' }).tap();
    const { name, text } = await download(page, 'Numbers (CSV)');
    expect(name).toBe('Mixture-pH-6-88.csv');
    const rows = text.split('\r\n');
    expect(rows[0]).toBe('component,species,c/(mol/L),fraction,activity coefficient');
    expect(rows[2]).toMatch(/^Phosphoric acid,H2PO4\^-,0\.0249994860319\d+,0\.49998972063991\d+,0/);
    const svg = (await download(page, 'Figure (SVG)')).text;
    expect(svg).toMatch(/25 °C · I = 0\.1 mol\/L from all ions · Davies/);
    expect(svg).toContain('Mixture, pH 6.88');
  });

  test('the request, which gives the pH on the screen', async () => {
    const { page } = await openMixture(server, wide);
    await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
    await page.getByRole('button', { name: 'Copy', exact: true }).click();
    await page.getByRole('status').filter({ hasText: 'copied' }).waitFor();
    const command = await page.evaluate(() => navigator.clipboard.readText());
    const { stdout } = await promisify(execFile)('sh', ['-c', command], {
      env: { ...process.env, STEPWELL_KEY: server.key },
    });
    const { pH } = mixtureAnswer.parse(JSON.parse(stdout));
    await answers(page, Number(pH).toFixed(2));
  });
});
