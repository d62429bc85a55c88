import Decimal from 'decimal.js';

/** The formula of CHEMISTRY.md §1 as a textbook has it, at a precision. */
export function textbookOf(precision: number, pKa: readonly string[]) {
  const Number = Decimal.clone({ defaults: true, precision });
  const indices = Array.from({ length: pKa.length + 1 }, (_, j) => j);

  /** 10^(j·pH − Σ_{i≤j} pKa_i). */
  const term = (j: number, pH: Decimal) =>
    Number.pow(
      10,
      pKa.slice(0, j).reduce((exponent, constant) => exponent.minus(constant), pH.times(j)),
    );
  const sum = (values: readonly Decimal[]) =>
    values.reduce((total, value) => total.plus(value), new Number(0));

  return {
    /** pH values of an even grid from 0. */
    grid: (step: string, count: number) =>
      Array.from({ length: count }, (_, i) => new Number(step).times(i)),
    /** Each fraction by its own formula: term over the sum of terms. */
    literal: (pH: Decimal) =>
      indices.map((j) => term(j, pH).dividedBy(sum(indices.map((k) => term(k, pH))))),
    /** The same with each term computed once a point. */
    shared: (pH: Decimal) => {
      const terms = indices.map((j) => term(j, pH));
      const total = sum(terms);
      return terms.map((each) => each.dividedBy(total));
    },
    /** 10^(pH − pKa_i). */
    ratios: (pH: Decimal) => pKa.map((constant) => Number.pow(10, pH.minus(constant))),
    /** Σ (z₀ − j) α_j. */
    meanCharge: (fractions: readonly Decimal[], charge: number) =>
      sum(fractions.map((fraction, j) => fraction.times(charge - j))),
  };
}
