import { contextOf, Exact } from '../../server/chem/decimals/contexts';
import { debyeHuckel, debyeHuckelIn } from '../../server/chem/water/debye-huckel';
import { density } from '../../server/chem/water/density';
import { kelvinOf } from '../../server/chem/water/kelvin';
import { permittivity } from '../../server/chem/water/permittivity';
import print from './data/debye-huckel-constants.json';
import water from './data/water-permittivity-density.json';

const { manov1943, robinsonStokes, pitzerSlope } = print;
const context = contextOf(20);
const polynomial = (coefficients: readonly string[], t: number) =>
  coefficients.reduceRight((sum, each) => sum * t + Number(each), 0);

/** Permittivities that older tables of A and B rest on; both recalled (sure). */
const malmberg = (t: number) => polynomial(water.malmbergMaryott.coefficients, t);
const wyman = (t: number) =>
  Number(water.wyman.at25) * polynomial(water.wyman.coefficients, t - 25);

const kelvin = (t: number) => kelvinOf(String(t));
const rho = (t: number) => density(16, kelvin(t)).toNumber();
const epsilon = (t: number) => permittivity(16, kelvin(t)).toNumber();

/** Our relation with a permittivity of one's own; B in 1/Å as older tables have it. */
const withPermittivity = (t: number, eps: number, kilogramsPerCubicMetre: number) => {
  const { A, B } = debyeHuckelIn(context, kelvin(t), {
    permittivity: new Exact(String(eps)),
    density: new Exact(String(kilogramsPerCubicMetre)),
  });
  return { A: A.toNumber(), B: B.toNumber() / 10 };
};
const ours = (t: number) => {
  const { A, B } = debyeHuckel(12, kelvin(t));
  return { A: A.toNumber(), B: B.toNumber() / 10 };
};

describe('Debye–Hückel A and B by the physical constants', () => {
  /** Numerators of A (εT)^1.5/√ρ and B (εT)^½/√ρ, for ρ in g/cm³, at ε = 1 and T = 1 K. */
  const unit = debyeHuckelIn(context, new Exact(1), {
    permittivity: new Exact(1),
    density: new Exact(1000),
  });

  test('are 1.824812·10⁶ √ρ/(εT)^1.5 and 50.29037 √ρ/(εT)^½ per Å', () => {
    expect(unit.A.toPrecision(7)).toBe('1824812');
    expect(unit.B.dividedBy(10).toPrecision(7)).toBe('50.29037');
  });

  /**
   * Printed factors (recalled, sure): 1.82483·10⁶ and 50.2916. With the constants of 1963 (Cohen and
   * DuMond, electrostatic units; recalled, sure) the relation gives them to the last digit, so what
   * is left, 1·10⁻⁵ and 2.4·10⁻⁵ of the value, is fifty years of measuring e, k and N_A.
   */
  test('are the printed factors, when taken with the physical constants of their day', () => {
    const [e, k, avogadro] = [4.80298e-10, 1.38054e-16, 6.02252e23];
    const perCentimetre = Math.sqrt((8 * Math.PI * avogadro * e * e) / (1000 * k));
    const bjerrum = (e * e) / k;
    expect(((perCentimetre * bjerrum) / (2 * Math.LN10)).toPrecision(6)).toBe('1.82483e+6');
    expect((perCentimetre * 1e-8).toPrecision(6)).toBe('50.2916');
    expect(Math.abs(unit.A.toNumber() / 1.82483e6 - 1)).toBeLessThan(1.1e-5);
    expect(Math.abs(unit.B.toNumber() / 502.916 - 1)).toBeLessThan(2.5e-5);
  });

  test('give the A_φ of 1990 with its permittivity, 78.38', () => {
    // 78.38 is rounded by up to 0.005, and A goes with its power −1.5: within 4e-5.
    const slope = (withPermittivity(25, 78.38, rho(25)).A * Math.LN10) / 3;
    expect(Math.abs(slope - Number(pitzerSlope.A_phi))).toBeLessThan(4e-5);
  });
});

/** Read in a public copy of the source's table; molal. */
describe('table of Manov, Bates, Hamer and Acree (1943)', () => {
  test.each(manov1943.rows.map((row) => [row.t_C, row] as const))(
    '%d °C: with the permittivity of 1938 our relation gives its A and B',
    (t, { A, B }) => {
      const then = withPermittivity(t, wyman(t), rho(t));
      // Half a unit of print, and 0.0001 for the physical constants of 1943 and the recalled formula.
      expect(Math.abs(then.A - A)).toBeLessThanOrEqual(0.00015);
      // 0.3262 at 15 °C leaves the smooth course of its neighbours, 0.3258 and 0.3273: a slip.
      expect(Math.abs(then.B - B)).toBeLessThanOrEqual(t === 15 ? 0.0004 : 0.0001);
    },
  );

  test('our A lies 0.0012 to 0.0029 above it, as the lower permittivity makes it', () => {
    for (const { t_C: t, A } of manov1943.rows) {
      const departure = ours(t).A - A;
      expect(departure).toBeGreaterThan(0.0012);
      expect(departure).toBeLessThan(0.0029);
      const expected = A * ((wyman(t) / epsilon(t)) ** 1.5 - 1);
      expect(Math.abs(departure - expected)).toBeLessThan(0.00015);
    }
  });

  test('our B is within 0.001 of it', () => {
    for (const { t_C, B } of manov1943.rows) expect(Math.abs(ours(t_C).B - B)).toBeLessThan(0.001);
  });
});

/** Recalled: sure at 0, 25, 50, 100 °C; the others within 0.0003 by its own note. Per litre. */
describe('table of Robinson and Stokes (1965)', () => {
  test.each(robinsonStokes.rows.map((row) => [row.t_C, row] as const))(
    '%d °C: with its own permittivity our relation gives its A and B',
    (t, { A, B }) => {
      // Per litre: ρ drops out. What the next test explains: the factor of its day, 0.0117 % below
      // ours, T from 273.16 K, and 0.00006 of print.
      const explained = A * (1.17e-4 + (1.5 * 0.01) / (t + 273.15));
      const then = withPermittivity(t, malmberg(t), 1000);
      expect(Math.abs(then.A - A)).toBeLessThanOrEqual(explained + 0.00006);
      expect(Math.abs(then.B - B)).toBeLessThanOrEqual(0.00006);
    },
  );

  test('its A is 1.8246·10⁶/(εT)^1.5 and its B 50.29/(εT)^½, factors of its day, T from 273.16', () => {
    // Factors recalled (sure). Half a unit of print and a unit of the sixth decimal.
    for (const { t_C, A, B } of robinsonStokes.rows) {
      const product = malmberg(t_C) * (t_C + 273.16);
      expect(Math.abs(1.8246e6 / product ** 1.5 - A)).toBeLessThanOrEqual(0.00006);
      expect(Math.abs(50.29 / Math.sqrt(product) - B)).toBeLessThanOrEqual(0.00006);
    }
  });

  const molal = robinsonStokes.rows.map(({ t_C: t, A, B }) => {
    const root = Math.sqrt(rho(t) / 1000);
    return { t, A: A * root, B: B * root };
  });

  test('per kilogram of water, our A is within 0.001 of it from 25 to 65 °C, our B everywhere', () => {
    for (const { t, A, B } of molal) {
      if (t >= 25 && t <= 65) expect(Math.abs(ours(t).A - A)).toBeLessThan(0.001);
      expect(Math.abs(ours(t).B - B)).toBeLessThan(0.001);
    }
  });

  test('elsewhere A departs, by −0.0013 at 0 °C and +0.0032 at 100 °C, as the permittivity makes it', () => {
    for (const { t, A } of molal) {
      const departure = ours(t).A - A;
      const expected = A * ((malmberg(t) / epsilon(t)) ** 1.5 - 1);
      expect(Math.abs(departure - expected)).toBeLessThan(0.00016);
    }
    expect(ours(0).A - (molal[0]?.A ?? NaN)).toBeCloseTo(-0.0013, 4);
    expect(ours(100).A - (molal.at(-1)?.A ?? NaN)).toBeCloseTo(0.0032, 4);
  });

  test('at 25 °C per kilogram it is 0.5107, ours 0.5098: the permittivity decides the third decimal', () => {
    const at25 = molal.find(({ t }) => t === 25);
    expect(at25?.A.toFixed(4)).toBe('0.5107');
    expect(at25?.B.toFixed(4)).toBe('0.3286');
    expect(ours(25).A.toFixed(4)).toBe('0.5098');
    expect(ours(25).B.toFixed(4)).toBe('0.3284');
  });
});
