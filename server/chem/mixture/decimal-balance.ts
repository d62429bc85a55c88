import type Decimal from 'decimal.js';
import type { Coefficients } from '../activity/coefficients';
import { type Arithmetic, decimals } from '../decimals/arithmetic';
import { type Context, contextOf, Exact } from '../decimals/contexts';
import { nth } from '../decimals/nth';
import { powerOfTen } from '../decimals/powers-of-ten';
import { type Acid, type Balance, leftoverCharge } from './balance';

/** What an acid contributes at one precision, whatever pH and activity coefficients. */
interface PreparedAcid {
  readonly acid: Acid;
  readonly amount: Decimal;
  /** 10^−pKa_i of the constants as given. */
  readonly constants: readonly Decimal[];
  /** Index of its first species in the list of ions. */
  readonly first: number;
}

/** A balance at one state of its activity coefficients. */
export interface AtState {
  /** γ of every ion. */
  readonly gamma: readonly Decimal[];
  /** K′_i of every acid, on the scale of a(H⁺) and concentrations. */
  readonly constants: readonly (readonly Decimal[])[];
}

/**
 * A charge balance in decimals of at least `precision` digits. Terms and shares are products, sums
 * and quotients of positive numbers; only the charges of opposite sign cancel, in `over`.
 */
export class DecimalBalance {
  readonly context: Context;
  readonly arithmetic: Arithmetic<Decimal>;
  private readonly acids: readonly PreparedAcid[];
  private readonly leftover: Decimal;
  private readonly inert: readonly Decimal[];
  private readonly ionProduct: Decimal | undefined;

  constructor(
    balance: Balance,
    private readonly coefficients: Coefficients,
    precision: number,
  ) {
    this.context = contextOf(precision);
    this.arithmetic = decimals(precision);
    const power = (exponent: string) => powerOfTen(this.context, new Exact(exponent).negated());
    let first = 2;
    this.acids = balance.acids.map((acid) => {
      const prepared = {
        acid,
        amount: new this.context(acid.amount),
        constants: acid.pKa.map(power),
        first,
      };
      first += acid.species.length;
      return prepared;
    });
    this.leftover = new this.context(leftoverCharge(balance));
    this.inert = balance.inert.map(({ concentration }) => new this.context(concentration));
    this.ionProduct = balance.pKw === undefined ? undefined : power(balance.pKw);
  }

  /** Activity coefficients and constants K′ at a state. */
  at(state: readonly Decimal[]): AtState {
    const ofClass = this.coefficients
      .lgGamma(this.arithmetic, state)
      .map((lg) => this.arithmetic.powerOfTen(lg));
    const gamma = this.coefficients.classOf.map((one) => nth(ofClass, one));
    return { gamma, constants: this.acids.map((prepared) => effective(prepared, gamma)) };
  }

  /** [H⁺] and [OH⁻] at u = 1/a(H⁺). */
  water(u: Decimal, { gamma }: AtState): [Decimal, Decimal] {
    const none = new this.context(0);
    if (this.ionProduct === undefined) return [none, none];
    return [
      new this.context(1).dividedBy(u.times(nth(gamma, 0))),
      u.times(this.ionProduct).dividedBy(nth(gamma, 1)),
    ];
  }

  /** Charge over at u, mol/L: 0 at the root. */
  over(u: Decimal, at: AtState): Decimal {
    const [hydrogen, hydroxide] = this.water(u, at);
    return this.acids.reduce((sum, { acid, amount }, k) => {
      const { terms, total } = termsOf(u, nth(at.constants, k), acid);
      const weighted = terms.reduce(
        (charge, term, j) =>
          j === acid.reference ? charge : charge.plus(term.times(acid.reference - j)),
        new this.context(0),
      );
      return sum.plus(amount.times(weighted).dividedBy(total));
    }, this.leftover.plus(hydrogen).minus(hydroxide));
  }

  /** Total of every acid and the fraction of it that each species is. */
  acidsAt(u: Decimal, at: AtState): { total: Decimal; fractions: Decimal[] }[] {
    return this.acids.map(({ acid, amount }, k) => {
      const { terms, total } = termsOf(u, nth(at.constants, k), acid);
      const sum = acid.held ? terms.reduce((all, term) => all.plus(term)) : total;
      return {
        total: acid.held ? amount.times(sum).dividedBy(total) : amount,
        fractions: terms.map((term) => term.dividedBy(sum)),
      };
    });
  }

  /** Concentrations of all ions and neutral species, in the order of `ionsOf`. */
  molalities(u: Decimal, at: AtState): Decimal[] {
    return [
      ...this.water(u, at),
      ...this.acids.flatMap(({ acid, amount }, k) => {
        const { terms, total } = termsOf(u, nth(at.constants, k), acid);
        const share = amount.dividedBy(total);
        return terms.map((term) => term.times(share));
      }),
      ...this.inert,
    ];
  }

  /** What the composition at u makes of the state. */
  stateOf(u: Decimal, at: AtState): Decimal[] {
    return this.coefficients.stateOf(this.arithmetic, this.molalities(u, at));
  }
}

/** K′_i = K_i γ_{i−1}/γ_i of thermodynamic, K_i γ(H⁺) of concentration, K_i of mixed constants. */
function effective({ acid, constants, first }: PreparedAcid, gamma: readonly Decimal[]): Decimal[] {
  return constants.map((constant, i) => {
    const kind = acid.kinds[i];
    if (kind === 'thermodynamic') {
      return constant.times(nth(gamma, first + i)).dividedBy(nth(gamma, first + i + 1));
    }
    return kind === 'concentration' ? constant.times(nth(gamma, 0)) : constant;
  });
}

/** Terms of an acid’s species against species 0, and what they are shares of. */
function termsOf(
  u: Decimal,
  constants: readonly Decimal[],
  { held, reference }: Acid,
): { terms: Decimal[]; total: Decimal } {
  const terms = [u.times(0).plus(1)];
  for (const constant of constants)
    terms.push(
      nth(terms, terms.length - 1)
        .times(constant)
        .times(u),
    );
  const total = held ? nth(terms, reference) : terms.reduce((sum, term) => sum.plus(term));
  return { terms, total };
}
