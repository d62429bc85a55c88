import Decimal from 'decimal.js';
import {
  type Acid,
  type Balance,
  ionsOf,
  sizeAssumed,
  type SizedIon,
  sizeOf,
} from '../../server/chem';

/**
 * CHEMISTRY.md §2 and §3 written out once more at 120 digits: charges summed species by species, the
 * root held between two values of opposite sign throughout. Slow, and nothing in common with the
 * engine but decimal.js's rounding and its table of ion sizes.
 */
export const Far = Decimal.clone({
  defaults: true,
  precision: 120,
  rounding: Decimal.ROUND_HALF_EVEN,
});

const zero = new Far(0);
const tenTo = (exponent: Decimal) => Far.pow(10, exponent);
const sumOf = (values: readonly Decimal[]) => values.reduce((sum, each) => sum.plus(each), zero);
const at = <T>(list: readonly T[], index: number): T => {
  const element = list[index];
  if (element === undefined) throw new Error(`There is no element ${index}.`);
  return element;
};

/** lg γ of an ion at an ionic strength. */
function lgGamma({ activity }: Balance, ion: SizedIon, I: Decimal): Decimal {
  const root = I.sqrt();
  const square = -(ion.charge ** 2);
  const A = new Far(activity.A);
  const size = new Far(ion.size ?? sizeOf(ion) ?? sizeAssumed).dividedBy(1000);
  switch (activity.model) {
    case 'ideal':
      return zero;
    case 'debye-huckel':
      return A.times(root).times(square);
    case 'guntelberg':
      return A.times(root).dividedBy(root.plus(1)).times(square);
    case 'davies':
      return root.dividedBy(root.plus(1)).minus(I.times(activity.linear)).times(A).times(square);
    case 'extended-debye-huckel':
      return A.times(root).dividedBy(root.times(activity.B).times(size).plus(1)).times(square);
    case 'specific-ion-interaction':
    case 'pitzer':
      throw new Error('By interactions: not here.');
  }
}

/** The root of a function that falls, between two values at which its sign differs (Illinois). */
function between(f: (x: Decimal) => Decimal, from: Decimal, to: Decimal): Decimal {
  let [low, high, atLow, atHigh] = [from, to, f(from), f(to)];
  if (!atLow.isPositive() || !atHigh.isNegative()) throw new Error('The oracle has no bracket.');
  for (let i = 0; i < 2000; i++) {
    const width = high.minus(low);
    if (width.lessThan(high.times('1e-105'))) return low;
    const secant = high.minus(atHigh.times(width).dividedBy(atHigh.minus(atLow)));
    const x = i % 4 === 3 ? low.plus(high).dividedBy(2) : secant;
    const y = f(x);
    if (y.isZero()) return x;
    if (y.isPositive()) [low, atLow, atHigh] = [x, y, i % 4 === 3 ? atHigh : atHigh.dividedBy(2)];
    else [high, atHigh, atLow] = [x, y, i % 4 === 3 ? atLow : atLow.dividedBy(2)];
  }
  throw new Error('The oracle does not end.');
}

/** A balance at one ionic strength: concentrations at u = 1/a(H⁺), in the order of `ionsOf`. */
function concentrationsAt(balance: Balance, I: Decimal) {
  const ions = ionsOf(balance);
  const lg = ions.map((ion) => lgGamma(balance, ion, I));
  let first = 2;
  const prepared = balance.acids.map((acid: Acid) => {
    const own = lg.slice(first, (first += acid.species.length));
    return {
      acid,
      K: acid.pKa.map((pKa, i) => {
        const kind = acid.kinds[i];
        if (kind === 'mixed') return tenTo(new Far(pKa).negated());
        if (kind === 'concentration') return tenTo(at(lg, 0).minus(pKa));
        return tenTo(
          at(own, i)
            .minus(at(own, i + 1))
            .minus(pKa),
        );
      }),
    };
  });
  const gammaH = tenTo(at(lg, 0));
  const hydroxide =
    balance.pKw === undefined ? zero : tenTo(zero.minus(balance.pKw).minus(at(lg, 1)));
  return (u: Decimal): Decimal[] => [
    balance.pKw === undefined ? zero : new Far(1).dividedBy(u.times(gammaH)),
    u.times(hydroxide),
    ...prepared.flatMap(({ acid, K }) => {
      const terms = [new Far(1)];
      for (const each of K)
        terms.push(
          at(terms, terms.length - 1)
            .times(each)
            .times(u),
        );
      const whole = acid.held ? at(terms, acid.reference) : sumOf(terms);
      return terms.map((term) => term.times(acid.amount).dividedBy(whole));
    }),
    ...balance.inert.map(({ concentration }) => new Far(concentration)),
  ];
}

export interface OracleState {
  readonly u: Decimal;
  readonly ionicStrength: Decimal;
  readonly concentrations: readonly Decimal[];
  readonly charge: (u: Decimal) => Decimal;
}

/** Charge over and ionic strength of concentrations in the order of `ionsOf`. */
export const chargeOf = (balance: Balance, concentrations: readonly Decimal[]) =>
  sumOf(ionsOf(balance).map(({ charge }, i) => at(concentrations, i).times(charge)));
export const strengthOf = (balance: Balance, concentrations: readonly Decimal[]) =>
  sumOf(ionsOf(balance).map(({ charge }, i) => at(concentrations, i).times(charge ** 2))).dividedBy(
    2,
  );

/** The root at one ionic strength: first its decade, then its digits. */
export function solvedAt(balance: Balance, I: Decimal): OracleState {
  const of = concentrationsAt(balance, I);
  const charge = (u: Decimal) => chargeOf(balance, of(u));
  let [low, high] = [-150, 150];
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (charge(new Far(`1e${middle}`)).isPositive()) low = middle;
    else high = middle;
  }
  const u = between(charge, new Far(`1e${low}`), new Far(`1e${high}`));
  const concentrations = of(u);
  return { u, ionicStrength: strengthOf(balance, concentrations), concentrations, charge };
}

/** The root whose ionic strength fits its composition, within a millionth of a given one. */
export function solvedNear(balance: Balance, I: string): OracleState & { I: Decimal } {
  const excess = (x: Decimal) => solvedAt(balance, x).ionicStrength.minus(x);
  const [low, high] = [new Far(I).times('0.999999'), new Far(I).times('1.000001')];
  const sign = excess(low).isPositive() ? 1 : -1;
  const found = between((x) => excess(x).times(sign), low, high);
  return { ...solvedAt(balance, found), I: found };
}
