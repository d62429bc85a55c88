import type Decimal from 'decimal.js';
import { type Context, contextOf } from '../decimals/contexts';
import { nth } from '../decimals/nth';
import { powerOfTen } from '../decimals/powers-of-ten';

/** What a system contributes at one precision, whatever the pH. */
export interface Factors {
  readonly context: Context;
  readonly one: Decimal;
  /** 10^−pKa_i. */
  readonly constants: readonly Decimal[];
  /** 10^(pKa_1 − pKa_i). */
  readonly spans: readonly Decimal[];
}

/** The factors of a system's constants with at least `precision` digits. */
export function factorsOf(pKa: readonly Decimal[], precision: number): Factors {
  const context = contextOf(precision);
  const first = nth(pKa, 0);
  return {
    context,
    one: new context(1),
    constants: pKa.map((constant) => powerOfTen(context, constant.negated())),
    spans: pKa.map((constant) => powerOfTen(context, first.minus(constant))),
  };
}

/** Terms t_j = Π_{i≤j} u·10^−pKa_i of species 1…n against species 0, u = 10^pH = 1/a(H⁺). */
function termsOfActivity({ constants }: Factors, u: Decimal): Decimal[] {
  const terms: Decimal[] = [];
  for (const constant of constants) {
    const ratio = u.times(constant);
    terms.push(terms.at(-1)?.times(ratio) ?? ratio);
  }
  return terms;
}

/** Terms of all species, species 0 with its 1 among them. */
export const allTermsOf = (factors: Factors, u: Decimal): Decimal[] => [
  factors.one,
  ...termsOfActivity(factors, u),
];

/** Terms t_1…t_n at a pH. */
export const termsAt = (factors: Factors, pH: Decimal): Decimal[] =>
  termsOfActivity(factors, powerOfTen(factors.context, pH));

/**
 * A system at one pH: t_0 = 1, α_j = t_j/Σ_k t_k. Products, sums and one quotient of positive
 * numbers, so that nothing cancels; `planFor` (plan.ts) counts their roundings.
 */
export class Composition {
  readonly precision: number;
  /** T_j = Σ_{k≥j} t_k for j = n…1. */
  private readonly tails: Decimal[] = [];
  private readonly first: Decimal;

  constructor(
    private readonly factors: Factors,
    private readonly terms: readonly Decimal[],
  ) {
    this.precision = factors.context.precision;
    let tail: Decimal | undefined;
    for (let j = terms.length; j > 0; j--) {
      const term = nth(terms, j - 1);
      tail = tail?.plus(term) ?? term;
      this.tails.push(tail);
    }
    this.first = factors.one.dividedBy(factors.one.plus(tail ?? 0));
  }

  /** α_j, j = 0…n. */
  fraction(j: number): Decimal {
    return j === 0 ? this.first : nth(this.terms, j - 1).times(this.first);
  }

  /** r_i = α_{i+1}/α_i = 10^(pH − pKa_{i+1}), i = 0…n − 1. */
  ratio(i: number): Decimal {
    const first = nth(this.terms, 0);
    return i === 0 ? first : first.times(nth(this.factors.spans, i));
  }

  /** Σ_j j α_j = Σ_{j≥1} T_j / Σ_k t_k. */
  protonsLost(): Decimal {
    return this.tails.reduce((sum, tail) => sum.plus(tail)).times(this.first);
  }
}
