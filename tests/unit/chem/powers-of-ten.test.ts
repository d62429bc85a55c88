import Decimal from 'decimal.js';
import { contextOf, Exact } from '../../../server/chem/decimals/contexts';
import {
  powerOfTen,
  powerOfTenError,
  tenthRoot,
} from '../../../server/chem/decimals/powers-of-ten';

const Wide = Decimal.clone({ defaults: true, precision: 150, rounding: Decimal.ROUND_HALF_EVEN });
/** Relative difference in rounding units u = 5·10^−precision. */
const unitsOff = (value: Decimal, exact: Decimal, precision: number) =>
  new Wide(value)
    .minus(exact)
    .dividedBy(exact)
    .abs()
    .times(`2e${precision - 1}`)
    .toNumber();

describe('powers of ten', () => {
  test('10^x is exact for an integer x', () => {
    for (const x of ['0', '-0', '7', '-20', '40', '-5760', '7.000']) {
      const power = powerOfTen(contextOf(16), new Exact(x));
      expect(power.toString()).toBe(new Wide(`1e${new Wide(x).toFixed()}`).toString());
    }
  });

  test.each([
    ['0.5', 1],
    ['-0.5', 1],
    ['-2.148', 3],
    ['39.99', 2],
    [`-19.${'9'.repeat(60)}`, 60],
    [`0.${'0'.repeat(59)}1`, 60],
    [`63.${'123456789'.repeat(6)}123456`, 60],
  ])('10^%s is within its stated error', (x, decimals) => {
    for (const precision of [12, 32, 48, 96]) {
      const power = powerOfTen(contextOf(precision), new Exact(x));
      const off = unitsOff(power, Wide.pow(10, x), precision);
      expect(off).toBeLessThanOrEqual(powerOfTenError(decimals));
    }
  });

  test('10^0.5 squared is 10', () => {
    const root = powerOfTen(contextOf(48), new Exact('0.5'));
    expect(root.times(root).toSignificantDigits(46).toString()).toBe('10');
  });

  test('the tenth root is good to four rounding units at any precision', () => {
    for (const precision of [8, 16, 48, 128]) {
      const context = contextOf(precision);
      let a = new context(10);
      for (let place = 1; place <= 12; place++) {
        const root = tenthRoot(a);
        const exact = new Wide(a).ln().dividedBy(10).exp();
        expect(unitsOff(root, exact, context.precision)).toBeLessThanOrEqual(4);
        a = root;
      }
    }
  });

  test('precision has no ceiling at the digits of ln 10 that decimal.js keeps', () => {
    const power = powerOfTen(contextOf(2048), new Exact('0.1'));
    const residual = power.pow(10).minus(10).abs();
    expect(residual.lessThan('1e-2040')).toBe(true);
    expect(power.precision()).toBeGreaterThan(2000);
  });
});
