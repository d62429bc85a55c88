import type Decimal from 'decimal.js';
import type { Context } from '../decimals/contexts';
import { densityIn } from './density';
import { type Relation, toDigits } from '../decimals/right-digits';

/** Waters around the two ions. */
const coordination = 6;
/** With T in K and the density in g/cm³. */
const alpha = ['-0.864671', '8659.19', '-22786.2'] as const;
const beta = ['0.642044', '-56.8534', '-0.375754'] as const;
/** Coefficients of T^0 … T^−3 of pKw in the ideal gas. */
const gamma = ['0.61415', '48251.33', '-67707.93', '10102100'];
/** kg/mol. */
const molarMass = '0.018015268';

/** The release's relation evaluated in a context, density in kg/m³; error as in `loss`. */
function ionProductIn(context: Context, kelvin: Decimal, density: Decimal): Decimal {
  const inverse = new context(1).dividedBy(kelvin);
  const rho = new context(density).times('1e-3');
  const exponent = inverse
    .times(alpha[1])
    .plus(inverse.times(inverse).times(alpha[2]).times(rho.times(rho).cbrt()))
    .plus(alpha[0]);
  const z = exponent.exp().times(rho);
  const hydrated = z.plus(1);
  const linear = inverse.times(beta[1]).plus(rho.times(beta[2])).plus(beta[0]);
  const bound = z.dividedBy(hydrated).times(rho).times(linear);
  const gas = gamma.reduceRight((sum, each) => sum.times(inverse).plus(each), new context(0));
  return hydrated
    .log(10)
    .minus(bound)
    .times(-2 * coordination)
    .plus(gas)
    .plus(new context(molarMass).log(10).times(2));
}

/**
 * Loss: ln Z, at most 40 and good to 200u with a density good to 20u, enters 5.3 times; pKw of the
 * gas, at most 210, is good to 6u of that; the sums beside them to a few units of 200: 3,000u.
 */
const loss = 5;

export const ionProductRelation = (kelvin: Decimal): Relation => ({
  in: (context) => ionProductIn(context, kelvin, densityIn(context, kelvin)),
  loss,
});

/**
 * pKw = −lg Kw of water, molal ((mol/kg)²), I = 0, at T and a density in kg/m³, to `precision` right
 * digits: pKw = −2n [lg(1 + Z) − Z/(1 + Z)·ρ (β₀ + β₁/T + β₂ρ)] + pKw(gas) + 2 lg M,
 * Z = ρ exp(α₀ + α₁/T + α₂ ρ^⅔/T²), n = 6. IAPWS R11-07(2019); A. V. Bandura, S. N. Lvov,
 * J. Phys. Chem. Ref. Data 35, 15 (2006). 0–800 °C, 0–1.25 g/cm³; near 25 °C good to 0.01. The same
 * equation with six coefficients fitted anew, R11-24, moves pKw of the liquid at 0.1 MPa by less than
 * 0.0003 up to 50 °C and 0.002 up to 100 °C.
 */
export const ionProductExponentAt = (
  precision: number,
  kelvin: Decimal,
  density: Decimal,
): Decimal =>
  toDigits({ in: (context) => ionProductIn(context, kelvin, density), loss }, precision);

/** The same for the liquid at 0.1 MPa, 0–100 °C, density by Kell 1975: 13.995 at 25 °C. */
export const ionProductExponent = (precision: number, kelvin: Decimal): Decimal =>
  toDigits(ionProductRelation(kelvin), precision);
