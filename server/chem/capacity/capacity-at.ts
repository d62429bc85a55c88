import type Decimal from 'decimal.js';
import { contextOf, Exact } from '../decimals/contexts';
import { powerOfTen } from '../decimals/powers-of-ten';
import { allTermsOf, factorsOf } from '../forms/composition';
import { spreadOf } from '../forms/spread';
import { constantsOf } from '../forms/system';
import type { BufferSolution } from './solution';

/** Buffer capacity of a solution and its parts, mol/L per pH. */
export interface Capacity {
  readonly total: Decimal;
  readonly water: Decimal;
  readonly components: readonly Decimal[];
}

/** What a solution contributes at one precision, whatever the pH. */
export function preparedAt({ components, water }: BufferSolution, precision: number) {
  const context = contextOf(precision);
  return {
    context,
    /** [H⁺] at u = 1. */
    hydrogen: powerOfTen(context, new Exact(water.hydrogen)),
    /** [OH⁻] at u = 1. */
    hydroxide: powerOfTen(context, new Exact(water.hydroxide).negated()),
    parts: components.map(({ system, concentration }) => ({
      factors: factorsOf(constantsOf(system), precision),
      concentration: new context(concentration),
    })),
  };
}

/**
 * β = ln 10 ([H⁺] + [OH⁻] + Σ_k c_k v_k) at constant ionic strength, v_k the variance of the protons
 * lost (D. D. Van Slyke, J. Biol. Chem. 52, 525 (1922)), as a function of u = 1/a(H⁺), computed with
 * at least `precision` digits.
 */
export function capacityAt(solution: BufferSolution, precision: number): (u: Decimal) => Capacity {
  const { context, hydrogen, hydroxide, parts } = preparedAt(solution, precision);
  const ln10 = new context(10).ln();
  return (u) => {
    const ofWater = hydrogen.dividedBy(u).plus(hydroxide.times(u)).times(ln10);
    const ofComponents = parts.map(({ factors, concentration }) => {
      const terms = allTermsOf(factors, u);
      const sum = terms.reduce((all, term) => all.plus(term));
      const fractions = terms.map((term) => term.dividedBy(sum));
      return spreadOf(fractions).times(concentration).times(ln10);
    });
    return {
      total: ofComponents.reduce((all, one) => all.plus(one), ofWater),
      water: ofWater,
      components: ofComponents,
    };
  };
}

/** The same at each pH, made once for each precision. */
export function capacityAtPH(solution: BufferSolution) {
  const made = new Map<number, ReturnType<typeof capacityAt>>();
  return (pH: Decimal, precision: number): Capacity => {
    let at = made.get(precision);
    if (at === undefined) made.set(precision, (at = capacityAt(solution, precision)));
    return at(powerOfTen(contextOf(precision), pH));
  };
}

/** Digits that rounding takes from a capacity at most: sums, products, and what a spread cancels. */
export const capacityLoss = ({ components }: BufferSolution): number =>
  7 + Math.ceil(Math.log10(Math.max(1, ...components.map(({ system }) => system.pKa.length))));
