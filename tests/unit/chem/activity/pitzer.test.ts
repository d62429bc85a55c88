import type { Ion } from '../../../../server/chem/activity/ion';
import { pitzerAmong } from '../../../../server/chem/activity/pitzer';
import {
  electrostaticMixing,
  mixingIntegral,
  screening,
} from '../../../../server/chem/activity/pitzer-functions';
import { doubles } from '../../../../server/chem/decimals/arithmetic';

const ion = (name: string | undefined, charge: number): Ion => ({ name, charge });
const hydrogen = ion('H^+', 1);
const sodium = ion('Na^+', 1);
const calcium = ion('Ca^2+', 2);
const chloride = ion('Cl^-', -1);
const A = 0.51;
const Aphi = (A * Math.LN10) / 3;

/** Slope of a function at x by central difference: good to about 10⁻⁹ here. */
const slope = (f: (x: number) => number, x: number, h = 1e-5 * x) =>
  (f(x + h) - f(x - h)) / (2 * h);

describe('the functions of Pitzer’s equations', () => {
  test('g and g′: x = 1 by hand, and one is the slope of the other', () => {
    expect(screening(doubles, 1).value).toBeCloseTo(2 * (1 - 2 / Math.E), 15);
    const ofI = (I: number) => screening(doubles, 2 * Math.sqrt(I)).value;
    for (const I of [0.01, 0.3, 4]) {
      expect(screening(doubles, 2 * Math.sqrt(I)).slopeTimesI).toBeCloseTo(slope(ofI, I) * I, 7);
    }
  });

  /** J(x) = x/4 − 1 + (1/x) ∫₀^∞ (1 − exp(−(x/y) e^−y)) y² dy by Simpson's rule. */
  const integral = (x: number) => {
    const [steps, step] = [40_000, 60 / 40_000];
    let sum = 0;
    for (let i = 1; i < steps; i++) {
      const y = i * step;
      sum += (i % 2 === 0 ? 2 : 4) * -Math.expm1((-x / y) * Math.exp(-y)) * y ** 2;
    }
    return x / 4 - 1 + (sum * step) / 3 / x;
  };

  test('the closed J(x) stays within 1.5 % of the integral it stands for, x = 0.03…100', () => {
    for (const x of [0.03, 0.1, 0.3, 1, 3, 10, 30, 100]) {
      expect(Math.abs(mixingIntegral(doubles, x).J / integral(x) - 1)).toBeLessThan(0.015);
    }
  });

  test('x J′ and ᴱθ′ are slopes of J and ᴱθ', () => {
    for (const x of [0.1, 2, 30]) {
      const { xSlope } = mixingIntegral(doubles, x);
      expect(xSlope).toBeCloseTo(slope((one) => mixingIntegral(doubles, one).J, x) * x, 7);
    }
    const theta = (I: number) => electrostaticMixing(doubles, Aphi, I)(1, 3).theta;
    for (const I of [0.1, 1, 5]) {
      expect(electrostaticMixing(doubles, Aphi, I)(1, 3).slope).toBeCloseTo(slope(theta, I), 7);
    }
  });

  test('ions of one charge mix without ᴱθ, unlike ones of a sign repel it below 0', () => {
    expect(electrostaticMixing(doubles, Aphi, 1)(2, 2).theta).toBe(0);
    expect(electrostaticMixing(doubles, Aphi, 1)(1, 2).theta).toBeLessThan(0);
    expect(electrostaticMixing(doubles, Aphi, 1)(-1, -2)).toEqual(
      electrostaticMixing(doubles, Aphi, 1)(1, 2),
    );
  });
});

describe('Pitzer’s equations', () => {
  test('NaCl by hand: ln γ± = f + 2mB + m²·(3/2)Cφ', () => {
    // Pitzer & Mayorga (1973) for a 1-1 electrolyte, written out.
    const m = 2;
    const root = Math.sqrt(m);
    const f = -Aphi * (root / (1 + 1.2 * root) + (2 / 1.2) * Math.log(1 + 1.2 * root));
    const fading = (1 - (1 + 2 * root - 2 * m) * Math.exp(-2 * root)) / (2 * m);
    const ln = f + m * (2 * 0.0765 + 0.2664 * fading) + m ** 2 * 1.5 * 0.00127;
    const among = pitzerAmong([sodium, chloride]);
    for (const lg of among.lgGamma(doubles, A, [m, m])) {
      expect(lg * Math.LN10).toBeCloseTo(ln, 13);
    }
  });

  test('the parameters used are told, those of the mixture too', () => {
    const { used, missing } = pitzerAmong([hydrogen, sodium, chloride]);
    expect(used.map((row) => ('cation' in row ? [row.cation, row.anion] : row.among))).toEqual([
      ['H^+', 'Cl^-'],
      ['Na^+', 'Cl^-'],
      ['H^+', 'Na^+'],
    ]);
    expect(missing).toEqual([]);
  });

  test('pairs without parameters are named', () => {
    const ions = [hydrogen, ion(undefined, 2), chloride, ion('HPO4^2-', -2)];
    expect(pitzerAmong(ions).missing).toEqual([
      ['H^+', 'HPO4^2-'],
      ['2+', 'Cl^-'],
      ['2+', 'HPO4^2-'],
    ]);
  });

  test('θ enters twice: H⁺ gains 2·0.036 per mol/kg of Na⁺', () => {
    // Against a cation without a name, which has neither θ nor B and C with Cl⁻.
    const lnH = (other: Ion) =>
      (pitzerAmong([hydrogen, other, chloride]).lgGamma(doubles, A, [0, 1, 1])[0] ?? NaN) *
      Math.LN10;
    const slopeOfB = 0.2664 * screening(doubles, 2).slopeTimesI;
    const C = 0.00127 / 2;
    expect(lnH(sodium) - lnH(ion(undefined, 1))).toBeCloseTo(2 * 0.036 + slopeOfB + C, 14);
  });

  test('a neutral species is salted by λ, and salts back', () => {
    const acid = ion('H3PO4', 0);
    const among = pitzerAmong([sodium, chloride, acid]);
    const [na = NaN, , h3po4 = NaN] = among.lgGamma(doubles, A, [1, 1, 0.5]);
    const [alone = NaN] = pitzerAmong([sodium, chloride]).lgGamma(doubles, A, [1, 1]);
    expect(h3po4 * Math.LN10).toBeCloseTo(2 * -0.075, 14);
    expect((na - alone) * Math.LN10).toBeCloseTo(2 * -0.075 * 0.5, 14);
    const sugar = pitzerAmong([sodium, chloride, ion(undefined, 0)]);
    expect(sugar.lgGamma(doubles, A, [1, 1, 1])[2]).toBe(0);
  });

  test('β2 fades first: Ca²⁺ and OH⁻ are drawn together in dilute solution most', () => {
    const among = pitzerAmong([calcium, ion('OH^-', -1)]);
    expect(among.used).toEqual([expect.objectContaining({ beta2: '-5.72' })]);
    const [ca = NaN] = among.lgGamma(doubles, A, [0.02, 0.04]);
    const [caInChloride = NaN] = pitzerAmong([calcium, chloride]).lgGamma(doubles, A, [0.02, 0.04]);
    expect(ca).toBeLessThan(caInChloride);
  });

  test('pure water is ideal', () => {
    expect(pitzerAmong([sodium, chloride]).lgGamma(doubles, A, [0, 0])).toEqual([0, 0]);
  });
});
