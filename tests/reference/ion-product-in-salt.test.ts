import { solved } from '../support/solutions';
import published from './data/ion-product-in-salt.json';

/**
 * −lg [H⁺][OH⁻] at 25 °C in salts: `source` of data/ion-product-in-salt.json, recalled to 0.02. Ours is
 * that of the model: molalities stand for mol/L, and the activity of water counts 1; the rest of the
 * way is gone in activity-coefficients.test.ts.
 */
const printedAt = (I: number) =>
  Number(published.rows.find((row) => Number(row.I) === I)?.pKw_c ?? NaN);

const inSalt = (model: 'davies' | 'specific-ion-interaction', cation: string, m: number) => {
  const { hydrogen, hydroxide } = solved({ ions: { [cation]: m, 'Cl^-': m }, model });
  return -Math.log10(Number(hydrogen) * Number(hydroxide));
};

test('without salt it is pKw', () => {
  expect(Math.abs(inSalt('davies', 'Na^+', 0) - printedAt(0))).toBeLessThan(0.003);
});

test.each([
  ['NaCl', 'Na^+', 0.1],
  ['NaCl', 'Na^+', 0.5],
  ['KCl', 'K^+', 0.1],
  ['KCl', 'K^+', 0.5],
] as const)(
  '%s: specific ion interaction is within the 0.02 of print, %s at %d mol/L',
  (_, cation, m) => {
    // Chlorides; the table mixes media, of which its one value is said to be good to 0.02.
    expect(Math.abs(inSalt('specific-ion-interaction', cation, m) - printedAt(m))).toBeLessThan(
      0.02,
    );
  },
);

test('Davies knows of no medium, and is within 0.02 as far as it goes', () => {
  for (const m of [0.1, 0.5]) {
    expect(Math.abs(inSalt('davies', 'Na^+', m) - printedAt(m))).toBeLessThan(0.02);
  }
});

test('1 mol/L NaCl: 13.75 by specific ion interaction, between the 13.71 and 13.79 of two media', () => {
  // `medium` of the row: NaCl 13.71, NaClO₄ and KNO₃ 13.77 to 13.79.
  expect(inSalt('specific-ion-interaction', 'Na^+', 1)).toBeCloseTo(13.747, 3);
  expect(printedAt(1)).toBe(13.79);
});

test('3 mol/L NaClO₄ is out of reach: no ε of perchlorate, and three times the range', () => {
  expect(published.rows.at(-1)).toMatchObject({ medium: 'NaClO4', pKw_c: '14.2' });
});
