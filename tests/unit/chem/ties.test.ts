import { Exact } from '../../../server/chem/decimals/contexts';
import { exponentsAt, fractionIs, meanChargeIs, vanishes } from '../../../server/chem/forms/ties';

const decimals = (...values: (string | number)[]) => values.map((value) => new Exact(value));
const at = (pH: string, ...pKa: string[]) => {
  const sums = [new Exact(0)];
  for (const constant of pKa) sums.push((sums.at(-1) ?? new Exact(0)).plus(constant));
  return exponentsAt(sums, new Exact(pH));
};
const tiny = `0.${'0'.repeat(59)}1`;

describe('sums of powers of ten', () => {
  test('vanish when each class modulo one does', () => {
    expect(vanishes(decimals(10, -1), decimals('0.3', '1.3'))).toBe(true);
    expect(vanishes(decimals(10, -1, '0.1', -1), decimals('0.3', '1.3', 0, -1))).toBe(true);
    expect(vanishes(decimals(100, -1), decimals('-1.5', '0.5'))).toBe(true);
  });

  test('do not vanish across classes, however near zero', () => {
    expect(vanishes(decimals(1, -1), decimals(0, tiny))).toBe(false);
    expect(vanishes(decimals(1, '-3.1622776601683793319988935'), decimals('0.5', 0))).toBe(false);
  });

  test('do not vanish for a remainder of 10^−5,000', () => {
    expect(vanishes(decimals(1, -1), decimals(0, 0))).toBe(true);
    expect(vanishes(decimals(1, -1, 1), decimals(0, 0, -5000))).toBe(false);
  });
});

describe('rational fractions and charges', () => {
  test('eight equal species are 1/8 each', () => {
    const exponents = at('7', ...Array<string>(7).fill('7'));
    expect(fractionIs(new Exact('0.125'), 3, exponents)).toBe(true);
    expect(fractionIs(new Exact('0.1250000000001'), 3, exponents)).toBe(false);
  });

  test('a fraction is irrational unless all species differ by integer powers of ten', () => {
    expect(fractionIs(new Exact('0.25'), 0, at('7', '7', '7', '7'))).toBe(true);
    expect(fractionIs(new Exact('0.25'), 0, at('7', '7', '7', `7${tiny.slice(1)}`))).toBe(false);
  });

  test('the charge halfway between two constants is an integer although fractions are irrational', () => {
    expect(meanChargeIs(new Exact(-1), 0, at('7', '6.7', '7.3'))).toBe(true);
    expect(meanChargeIs(new Exact(1), 2, at('7', '6.7', '7.3'))).toBe(true);
    expect(meanChargeIs(new Exact(-1), 0, at('7', '6.7', '7.31'))).toBe(false);
  });

  test('base and acid at 1:10 carry −1/11, not −0.09', () => {
    expect(meanChargeIs(new Exact('-0.09'), 0, at('6', '7'))).toBe(false);
  });
});
