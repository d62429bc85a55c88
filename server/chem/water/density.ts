import type Decimal from 'decimal.js';
import { type Context, Exact } from '../decimals/contexts';
import { zeroCelsius } from './kelvin';
import { type Relation, toDigits } from '../decimals/right-digits';

/** Coefficients of t^0 … t^5 in the numerator, kg/m³ and °C; of t in the denominator. */
const numerator = [
  '999.83952',
  '16.945176',
  '-7.9870401e-3',
  '-46.170461e-6',
  '105.56302e-9',
  '-280.54253e-12',
];
const denominator = '16.879850e-3';

/** Numerator and denominator; in `Exact` they are exact. */
function parts(context: Context, kelvin: Decimal): [Decimal, Decimal] {
  const t = new context(kelvin).minus(zeroCelsius);
  const above = numerator.reduceRight((sum, each) => sum.times(t).plus(each), new context(0));
  return [above, t.times(denominator).plus(1)];
}

/** Kell's relation evaluated in a context: relative error at most 20u. */
export function densityIn(context: Context, kelvin: Decimal): Decimal {
  const [above, below] = parts(context, kelvin);
  return above.dividedBy(below);
}

/**
 * Loss: the terms' absolute values sum to 1.2 times the numerator, each with at most 12 roundings;
 * then the quotient: 20u of 1,000 kg/m³ is 10^5·10^−p. A quotient of decimals may be a tie.
 */
export const densityRelation = (kelvin: Decimal): Relation => ({
  in: (context) => densityIn(context, kelvin),
  loss: 6,
  is: (tie) => {
    const [above, below] = parts(Exact, kelvin);
    return tie.times(below).equals(above);
  },
});

/**
 * Density of liquid water at 0.1 MPa in kg/m³, 0–100 °C, to `precision` right digits: a quintic in
 * t over 1 + 0.01687985 t. G. S. Kell, J. Chem. Eng. Data 20, 97 (1975); good to about 10 ppm (the
 * maximum, 999.972, is 999.975 by later work). t is of the 1968 scale there, and is taken as that of
 * 1990: at most 0.026 K apart, 20 ppm at 100 °C.
 */
export const density = (precision: number, kelvin: Decimal): Decimal =>
  toDigits(densityRelation(kelvin), precision);
