import { differenceName, haveSameForms, shiftOf } from '../../../components/curves/comparison';
import { firstConditions } from '../../../components/curves/curve-conditions';
import type { DrawnCurve } from '../../../components/curves/drawn-curve';

/** Acetic acid with its constant moved: two forms over the pH of a grid. */
const grid = Array.from({ length: 141 }, (_, i) => i / 10);
const acid = (pKa: number, conditions = {}, name = 'acetic acid'): DrawnCurve => {
  const share = grid.map((pH) => 1 / (1 + 10 ** (pH - pKa)));
  return {
    asked: {
      choice: { kind: 'stored', id: 'acetic-acid' },
      conditions: { ...firstConditions, ...conditions },
    },
    system: { name, fullyProtonatedCharge: 0, pKa: ['4.756'] },
    answer: { effectivePKa: [String(pKa)] },
    formulas: ['C2H4O2', 'C2H3O2^-'],
    curve: { pH: grid, fractions: [share, share.map((alpha) => 1 - alpha)] },
  } as unknown as DrawnCurve;
};
const inSalt = { ionicStrength: '0.15', activityModel: 'davies' };
const first = acid(4.756);
const beside = acid(4.54, inSalt);

describe('two curves over each other', () => {
  test('the shift of a constant is pK′ beside less pK′ of the first', () => {
    expect(shiftOf(first, beside).constants).toEqual(['\u22120.216']);
    expect(shiftOf(beside, first).constants).toEqual(['+0.216']);
    expect(shiftOf(first, first).constants).toEqual(['0.000']);
  });

  test('a fraction differs most midway between the two constants', () => {
    const { largest } = shiftOf(first, beside);
    // tanh(ln 10·Δ/4), at (4.756 + 4.54)/2 = 4.65: of two logistic curves Δ apart.
    expect(largest.pH).toBeCloseTo(4.65, 0);
    expect(Math.abs(largest.change)).toBeCloseTo(Math.tanh((Math.LN10 * 0.216) / 4), 2);
  });

  test('forms that are the same are compared, others are not', () => {
    expect(haveSameForms(first, beside)).toBe(true);
    expect(haveSameForms(first, { ...beside, formulas: ['A', 'B'] })).toBe(false);
  });

  test('the name says what differs and nothing else', () => {
    expect(differenceName(first, beside)).toBe('I 0.15');
    expect(differenceName(first, acid(4.7, { ...inSalt, temperature: '37' }))).toBe(
      'I 0.15 · 37 °C',
    );
    expect(differenceName(beside, first)).toBe('I 0');
    expect(differenceName(beside, acid(4.6, { ...inSalt, activityModel: 'guntelberg' }))).toBe(
      'Güntelberg',
    );
    expect(differenceName(first, { ...acid(4.6, {}, 'formic acid'), formulas: ['A'] })).toBe(
      'Formic acid',
    );
    expect(differenceName(first, first)).toBe('Acetic acid, the same');
  });
});
