import type Decimal from 'decimal.js';
import type { Context } from '../decimals/contexts';
import { toDigits } from '../decimals/right-digits';

/** lg K = a + b T + c/T + d lg T + e/T², T in K. */
const coefficients = {
  a: '108.3865',
  b: '0.01985076',
  c: '-6919.53',
  d: '-40.45154',
  e: '669365.0',
};

function henryIn(context: Context, kelvin: Decimal): Decimal {
  const { a, b, c, d, e } = coefficients;
  const T = new context(kelvin);
  const inverse = new context(1).dividedBy(T);
  return T.times(b)
    .plus(inverse.times(c))
    .plus(T.log(10).times(d))
    .plus(inverse.times(inverse).times(e))
    .plus(a)
    .negated();
}

/**
 * pK_H = −lg K_H of carbon dioxide in water, K_H = m(CO₂)/p in mol/(kg atm), to `precision` right
 * digits; 1.468 at 25 °C. L. N. Plummer, E. Busenberg, Geochim. Cosmochim. Acta 46, 1011 (1982).
 * 0–90 °C, at the vapour pressure of water; good to about 0.01. CO₂ stands for CO₂(aq) + H₂CO₃.
 */
export const henryExponent = (precision: number, kelvin: Decimal): Decimal =>
  // Loss: the terms sum to 250 in absolute value, each with at most 5 roundings: 1,300u.
  toDigits({ in: (context) => henryIn(context, kelvin), loss: 4 }, precision);
