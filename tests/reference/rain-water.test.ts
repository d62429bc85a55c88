import { solved } from '../support/solutions';
import constants from './data/carbon-dioxide.json';
import published from './data/rain-water.json';

/**
 * Water in equilibrium with the carbon dioxide of air, which holds [CO₂] at K_H p. Sources of the pH:
 * data/rain-water.json, of the constants: Plummer and Busenberg 1982, data/carbon-dioxide.json, 25 °C.
 */
const { pKH, pK1, pK2 } = constants.rows.find(({ t_C }) => t_C === 25) ?? {};
const rowOf = (start: string) => published.rows.find((row) => row.case.startsWith(start));
const number = (written: string | undefined) => Number(written ?? NaN);

/** pH at a partial pressure given as −lg(p/atm); ideal, as the sources are. */
const inAir = (exponent: number, model: 'ideal' | 'davies' = 'ideal') => {
  const held = {
    pKa: [String(pK1), String(pK2)],
    z0: 0,
    c: 10 ** -((pKH ?? NaN) + exponent),
    names: ['CO2', 'HCO3^-', 'CO3^2-'],
    held: true,
  };
  const { pH, acids } = solved({ acids: [held], model });
  return { pH: Number(pH), species: acids[0]?.species ?? [] };
};
const ppm = (parts: number) => -Math.log10(parts * 1e-6);

test.each([
  ['400 ppm, 25 C', 400],
  ['316.2 ppm, 25 C', 316.2],
])('%s: the printed formula, less the OH⁻ that it neglects (computed)', (start, parts) => {
  const formula = number(rowOf(start)?.pH_computed);
  expect(((pKH ?? NaN) + (pK1 ?? NaN) + ppm(parts)) / 2).toBeCloseTo(formula, 3);
  // [H⁺]² = K₁[CO₂] + Kw: 10⁻¹⁴ beside 5 or 6 × 10⁻¹² lowers the pH by 0.0004.
  expect(inAir(ppm(parts)).pH).toBeCloseTo(formula - 0.0004, 3);
});

test('10^−3.5 atm: 5.65 (Stumm & Morgan, recalled) with its constants of one decimal', () => {
  // The book reckons with pK_H 1.5 and pK₁ 6.3; those of 1982 give 5.66.
  expect(Math.abs(inAir(3.5).pH - number(rowOf('pCO2')?.pH_printed))).toBeLessThanOrEqual(0.01);
});

test('[H₃O⁺] 2.0 × 10⁻⁶, pH 5.70 (OpenStax) belongs to air of 280 ppm, before 1900', () => {
  const printed = number(rowOf('air-saturated')?.pH_printed);
  expect(Math.abs(inAir(ppm(280)).pH - printed)).toBeLessThan(0.02);
});

test('rain without other acids lies between 5 and 6 (OpenStax), and activities hardly matter', () => {
  const { pH } = inAir(ppm(420));
  expect(pH).toBeGreaterThan(5);
  expect(pH).toBeLessThan(6);
  expect(Math.abs(inAir(ppm(420), 'davies').pH - pH)).toBeLessThan(0.001);
});

test('the gas holds dissolved carbon dioxide, whatever is dissolved beside it', () => {
  const { species } = inAir(ppm(400));
  expect(Number(species[0]?.concentration)).toBeCloseTo(10 ** -((pKH ?? NaN) + ppm(400)), 12);
  expect(Number(species[1]?.concentration)).toBeCloseTo(10 ** -5.6087, 8);
});
