import Decimal from 'decimal.js';
import { fractionPoints } from '../../../server/chem';
import { contextOf, Exact } from '../../../server/chem/decimals/contexts';

describe('contexts', () => {
  test('a context has at least the precision asked for, and rounds half-even', () => {
    for (const precision of [1, 4, 5, 47, 96, 97, 128, 129, 1000]) {
      expect(contextOf(precision).precision).toBeGreaterThanOrEqual(precision);
      expect(contextOf(precision).rounding).toBe(Decimal.ROUND_HALF_EVEN);
    }
  });

  test('near precisions share a context, so that tables are made once', () => {
    expect(contextOf(45)).toBe(contextOf(48));
    expect(contextOf(100)).toBe(contextOf(128));
    const made = new Set(Array.from({ length: 1024 }, (_, i) => contextOf(i + 1)));
    expect(made.size).toBeLessThan(32);
  });

  test('exact sums reach from 10^5,760 to 10^−17,000', () => {
    const sum = new Exact('1e5760').plus('1e-17000');
    expect(sum.minus('1e5760').toString()).toBe('1e-17000');
  });

  test('global decimal.js settings change no digit, and are not changed', () => {
    const ask = () =>
      fractionPoints(
        { fullyProtonatedCharge: 0, pKa: ['2.148', '7.198', '12.35'] },
        { kind: 'list', values: ['7.4'] },
        23,
      );
    const before = ask();
    const { precision, rounding, toExpNeg, toExpPos } = Decimal;
    Decimal.set({ precision: 2, rounding: Decimal.ROUND_UP, toExpNeg: 0, toExpPos: 1 });
    try {
      expect(ask()).toEqual(before);
      expect(contextOf(777).toExpNeg).toBe(-7);
      expect(Decimal.precision).toBe(2);
    } finally {
      Decimal.set({ precision, rounding, toExpNeg, toExpPos });
    }
  });
});
