import Decimal from 'decimal.js';
import type { AcidBaseSystem, FractionPoint } from '../../server/chem';

/**
 * The relations of CHEMISTRY.md §1 written out with `Decimal.pow` at 260 digits: slow, and nothing
 * in common with the engine but decimal.js's rounding.
 */
export const Wide = Decimal.clone({
  defaults: true,
  precision: 260,
  rounding: Decimal.ROUND_HALF_EVEN,
});

const tenTo = (exponent: Decimal) =>
  exponent.isInteger() ? new Wide(`1e${exponent.toFixed()}`) : Wide.pow(10, exponent);

export const sumOf = (values: readonly Decimal[]) =>
  values.reduce((sum, each) => sum.plus(each), new Wide(0));

/** j·pH − Σ_{i≤j} pKa_i. */
export function exponents({ pKa }: AcidBaseSystem, pH: string): Decimal[] {
  let exponent = new Wide(0);
  return [exponent, ...pKa.map((constant) => (exponent = exponent.plus(pH).minus(constant)))];
}

/** Half-even to places after the point, without the sign of zero. */
const plain = (value: Decimal, places: number) => value.toFixed(places).replace(/^-(?=[0.]*$)/, '');

/** One point, every number rounded from 260 digits. */
export function recomputed(system: AcidBaseSystem, pH: string, digits: number): FractionPoint {
  const powers = exponents(system, pH);
  const terms = powers.map(tenTo);
  const total = sumOf(terms);
  const fractions = terms.map((term) => term.dividedBy(total));
  const largest = Wide.max(...powers);
  return {
    pH,
    fractions: fractions.map((fraction) => fraction.toPrecision(digits)),
    neighbourRatios: system.pKa.map((constant) =>
      tenTo(new Wide(pH).minus(constant)).toPrecision(digits),
    ),
    meanCharge: plain(
      sumOf(fractions.map((each, lost) => each.times(system.fullyProtonatedCharge - lost))),
      digits,
    ),
    predominant: powers.findIndex((power) => power.equals(largest)),
  };
}

/** Half a unit in the last of `digits` significant digits: what rounding may have moved a number. */
export const halfUnit = (written: string, digits: number) =>
  new Wide(`5e${new Wide(written).e - digits}`);
