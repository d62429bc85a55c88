import { bufferCapacityAnswer } from '../../shared/buffer-capacity';
import { startTestServer, type TestServer } from '../support/server';
import {
  fragmentIs,
  openCurves,
  phone,
  settled,
  sidewaysScroll,
  valueRow,
  wide,
} from './curves-page';

jest.setTimeout(120_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ withApp: true });
});
afterAll(() => server.close());

describe('conditions', () => {
  test('an ionic strength moves the constants, the plot says so and the address keeps it', async () => {
    const { page, complaints } = await openCurves(server, wide, 'system=citric-acid&pH=7.40');
    await page.getByRole('textbox', { name: 'Ionic strength' }).fill('100 mmol/L');
    const moved = page.getByRole('table', {
      name: 'Constants as given and under these conditions',
    });
    // By hand with A = 0.510: pK′₂ = 4.761 − 3 × 0.510 × (√0.1/(1 + √0.1) − 0.03) = 4.439.
    await moved
      .getByRole('row')
      .filter({ hasText: '4.761' })
      .filter({ hasText: '4.439' })
      .waitFor();
    await page.getByText('25 °C · I = 0.1 · Davies').first().waitFor();
    await fragmentIs(page, 'system=citric-acid&I=0.1&pH=7.40');
    await page.reload();
    await settled(page);
    expect(await page.getByRole('textbox', { name: 'Ionic strength' }).inputValue()).toBe('0.1');
    expect(complaints).toEqual([]);
  });

  test('a temperature in kelvin is read, and the constants are moved to it', async () => {
    const { page } = await openCurves(server, wide);
    const field = page.getByRole('textbox', { name: 'Temperature' });
    await field.fill('310.15 K');
    await fragmentIs(page, 'system=phosphoric-acid&T=37&pH=7.40');
    await field.press('Tab');
    expect(await field.inputValue()).toBe('37');
    await page.getByText('37 °C · I = 0 · ideal').first().waitFor();
  });

  test('what is beyond a model is refused at its field, and computed all the same when asked', async () => {
    const { page } = await openCurves(server, wide);
    const field = page.getByRole('textbox', { name: 'Ionic strength' });
    await field.fill('5');
    await page.getByText(/Davies’s equation is good to I = 0.5 mol\/L; here I = 5/).waitFor();
    expect(await field.getAttribute('aria-invalid')).toBe('true');
    // The curve that was drawn stays, under its own conditions.
    await page.getByText('25 °C · I = 0 · ideal').first().waitFor();
    await page.getByRole('button', { name: 'Compute all the same' }).click();
    await page.getByText('25 °C · I = 5 · Davies').first().waitFor();
    await page.getByText('Beyond the activity model’s range').waitFor();
    await fragmentIs(page, 'system=phosphoric-acid&I=5&beyond=compute&pH=7.40');
    await page.getByRole('checkbox', { name: 'Compute beyond range' }).click();
    await page.getByRole('button', { name: 'Compute all the same' }).waitFor();
  });

  test('constants of another medium are not moved: on a phone a notice says so', async () => {
    const { page } = await openCurves(server, phone, 'system=edta&pH=4.40');
    await page.getByText('I = 1, 0.1 · as given').first().waitFor();
    await page.getByRole('button', { name: /change the system/ }).tap();
    await page.getByRole('textbox', { name: 'Ionic strength' }).fill('0.5');
    await page.keyboard.press('Escape');
    await page.getByText('Not computed').waitFor();
    await page.getByRole('button', { name: 'Compute all the same' }).tap();
    await page.getByText('25 °C · I = 0.5 · Davies').first().waitFor();
  });
});

describe('layers', () => {
  test('buffer capacity is the API’s at the cursor and at its maxima', async () => {
    const { page } = await openCurves(server, wide, 'system=acetic-acid&pH=4.76&c=0.1');
    const answer = await fetch(`${server.url}/v1/public/buffer-capacity`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({
        components: [{ system: { id: 'acetic-acid' }, concentration: '0.1' }],
        pH: '4.76',
      }),
    });
    const { points, maxima } = bufferCapacityAnswer.parse(await answer.json());
    const shown = (total = '') => (1000 * Number(total)).toPrecision(3);
    await valueRow(page, /capacity/, shown(points[0]?.total)).waitFor();
    await page
      .getByRole('table', { name: 'Maxima of buffer capacity' })
      .getByText(shown(maxima[0]?.total))
      .waitFor();
    await page.getByRole('textbox', { name: 'Total concentration' }).fill('0.05 mol/L');
    await valueRow(page, /capacity/, '28.8').waitFor();
  });

  test('lg c has the forms and the ions of water', async () => {
    const { page } = await openCurves(server, wide, 'system=acetic-acid&pH=7.00&layers=lg-c');
    const table = page.getByRole('table', {
      name: 'Logarithms of the concentrations at the cursor',
    });
    // I = 0 and 25 °C: c(H⁺) = 10⁻⁷, c(OH⁻) = 10^(7 − 13.995); α(HA) = 10^(4.756 − 7) nearly.
    await table.getByRole('row').filter({ hasText: '\u22127.00' }).first().waitFor();
    expect(
      (await table.getByRole('row').allInnerTexts()).map((row) => row.split('\n').at(-1)),
    ).toEqual(['\u22123.55', '\u22121.30', '\u22127.00', '\u22126.99']);
  });

  test('the isoelectric point is marked, and where there is none the box says why', async () => {
    const { page } = await openCurves(server, wide, 'system=glycine&pH=7.40');
    await page.getByRole('checkbox', { name: /Isoelectric point/ }).click();
    // (2.351 + 9.78)/2
    await valueRow(page, /isoelectric point/, '6.07').waitFor();
    await page.getByRole('img', { name: /Isoelectric point: pH 6\.07\./ }).waitFor();
    await page.evaluate(() => {
      window.location.hash = 'system=acetic-acid';
    });
    const box = page.getByRole('checkbox', { name: /Isoelectric point.*charge ≤ 0/ });
    await box.waitFor();
    expect(await box.getAttribute('aria-disabled')).toBe('true');
  });

  test('a strong acid is drawn around its constant', async () => {
    const { page } = await openCurves(server, wide, 'system=hydrochloric-acid');
    await page.locator('[role="slider"][aria-valuemin^="-"]').waitFor();
  });

  test('on a phone each has a view, and the plot stays above the fold at 360 × 640', async () => {
    const small = { width: 360, height: 640, touch: true };
    const { page, complaints } = await openCurves(server, small);
    for (const tab of ['Capacity', 'lg c']) {
      await page.getByRole('tab', { name: tab }).tap();
      await page.getByRole('textbox', { name: 'Total concentration' }).waitFor();
      const figure = await page.getByRole('img', { name: /^Fractions of the/ }).boundingBox();
      const dock = await page.getByRole('textbox', { name: 'pH', exact: true }).boundingBox();
      expect((figure?.y ?? 0) + (figure?.height ?? 0)).toBeLessThanOrEqual((dock?.y ?? 0) + 1);
      expect(await sidewaysScroll(page)).toBe(0);
    }
    expect(complaints).toEqual([]);
  });
});

describe('compare', () => {
  test('how far the curves move from I = 0 to 0.15 mol/L at 37 °C', async () => {
    const { page, complaints } = await openCurves(server, wide, 'system=phosphoric-acid&T=37');
    await page.getByRole('button', { name: 'Compare with…' }).click();
    const moves = page.getByRole('table', { name: 'How far I 0.15 moves the curves' });
    // By hand with A = 0.521 at 37 °C: (2z − 1)·A·(√I/(1 + √I) − 0.3 I) for z = 0, −1, −2.
    await moves.getByRole('row').filter({ hasText: '\u22120.122' }).waitFor();
    await moves.getByRole('row').filter({ hasText: '\u22120.366' }).waitFor();
    await moves.getByRole('row').filter({ hasText: '\u22120.610' }).waitFor();
    await page.getByRole('img', { name: /Compared with: I 0\.15\.$/ }).waitFor();
    await fragmentIs(
      page,
      'system=phosphoric-acid&T=37&pH=7.40&with=system%3Dphosphoric-acid%26T%3D37%26I%3D0.15',
    );
    await page.getByRole('button', { name: 'Remove I 0.15' }).click();
    await moves.waitFor({ state: 'detached' });
    expect(complaints).toEqual([]);
  });

  test('of another system the forms at the cursor are read beside', async () => {
    const { page } = await openCurves(
      server,
      phone,
      'system=phosphoric-acid&pH=7.40&with=system%3Dcitric-acid',
    );
    await page.getByRole('table', { name: 'Forms of Citric acid at the cursor' }).waitFor();
    await page.getByRole('button', { name: /change the system/ }).tap();
    await page.getByRole('group', { name: 'Compared with Citric acid' }).waitFor();
  });
});
