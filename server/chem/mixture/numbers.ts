import type Decimal from 'decimal.js';
import { type Found, settleAll, significant } from '../decimals/settle-all';
import { nth } from '../decimals/nth';
import { lostNearZero } from '../forms/doubles';
import type { Acid, Balance } from './balance';
import { ionicStrength } from '../activity/ionic-strength';
import { ionsOf } from './balance';
import { spreadOf } from '../forms/spread';
import type { DoubleSolution } from './double-balance';
import type { Root, SolvedBalance } from './solve';

/** A species of the solution. */
interface SpeciesNumbers {
  readonly concentration: string;
  /** Of its system’s total. */
  readonly fraction: string;
  readonly activityCoefficient: string;
}

/** Every number of a solved balance, to so many significant digits. */
export interface BalanceNumbers {
  readonly pH: string;
  /** −lg of the concentration of H⁺. */
  readonly pHOfConcentration: string;
  readonly hydrogen: string;
  readonly hydroxide: string;
  readonly hydrogenActivityCoefficient: string;
  readonly hydroxideActivityCoefficient: string;
  readonly ionicStrengthUsed: string;
  readonly ionicStrengthOfComposition: string;
  readonly bufferCapacity: string;
  readonly acids: readonly {
    readonly total: string;
    readonly species: readonly SpeciesNumbers[];
  }[];
  readonly inert: readonly {
    readonly concentration: string;
    readonly activityCoefficient: string;
  }[];
  readonly iterations: number;
  /** Bound on what the charge balance is off by, mol/L. */
  readonly residual: string;
}

/** Digits that a pH near 0, of the activity or of the concentration, takes. */
const lostOf = ({ lnU, molalities: [hydrogen = 1] }: DoubleSolution) =>
  Math.max(lostNearZero(lnU), lostNearZero(Math.log(hydrogen)));

/** All values of a solved balance in a fixed order; amounts and strengths as given are exact. */
function valuesOf(problem: Balance, { balance, u, at, state }: SolvedBalance) {
  const { context, arithmetic } = balance;
  const molalities = balance.molalities(u, at);
  const [hydrogen, hydroxide] = [nth(molalities, 0), nth(molalities, 1)];
  const composition = ionicStrength(arithmetic, ionsOf(problem), molalities);
  const asked = problem.activity.ionicStrength;
  const used =
    asked !== 'self-consistent'
      ? new context(asked)
      : state.length === 1
        ? nth(state, 0)
        : composition;
  let first = 2;
  const acids = balance.acidsAt(u, at).map((one, k) => {
    const acid = nth(problem.acids, k);
    const gammas = at.gamma.slice(first, first + acid.species.length);
    first += acid.species.length;
    return { ...one, acid, gammas };
  });
  const capacity = acids
    .reduce(
      (sum, { acid, fractions, total }) =>
        sum.plus(spreadOf(fractions, acid.held ? acid.reference : undefined).times(total)),
      hydrogen.plus(hydroxide),
    )
    .times(new context(10).ln());
  const given = (value: Decimal) => ({ value, exact: true });
  const solved = (value: Decimal) => ({ value, exact: false });
  return [
    solved(u.log(10)),
    solved(hydrogen.log(10).negated()),
    solved(hydrogen),
    solved(hydroxide),
    solved(nth(at.gamma, 0)),
    solved(nth(at.gamma, 1)),
    { value: used, exact: asked !== 'self-consistent' },
    solved(composition),
    solved(capacity),
    ...acids.flatMap(({ acid, fractions, gammas, total }) => [
      { value: total, exact: !acid.held },
      ...fractions.flatMap((one, j) => [
        // A gas holds this very concentration.
        acid.held && j === acid.reference
          ? given(new context(acid.amount))
          : solved(one.times(total)),
        solved(one),
        solved(nth(gammas, j)),
      ]),
    ]),
    ...problem.inert.flatMap((_, i) => [
      given(nth(molalities, first + i)),
      solved(nth(at.gamma, first + i)),
    ]),
  ];
}

/** Reads numbers off in the order in which `valuesOf` lists them. */
function read(problem: Balance, written: readonly string[]) {
  let place = 0;
  const next = () => nth(written, place++);
  const species = (): SpeciesNumbers => ({
    concentration: next(),
    fraction: next(),
    activityCoefficient: next(),
  });
  return {
    pH: next(),
    pHOfConcentration: next(),
    hydrogen: next(),
    hydroxide: next(),
    hydrogenActivityCoefficient: next(),
    hydroxideActivityCoefficient: next(),
    ionicStrengthUsed: next(),
    ionicStrengthOfComposition: next(),
    bufferCapacity: next(),
    acids: problem.acids.map((acid: Acid) => ({
      total: next(),
      species: acid.species.map(species),
    })),
    inert: problem.inert.map(() => ({ concentration: next(), activityCoefficient: next() })),
  };
}

/**
 * Every number of a root, all digits right: pH and concentrations to `digits` (1–60) significant
 * digits, rounded half-even.
 */
export function numbersOf(problem: Balance, root: Root, digits: number): BalanceNumbers {
  const loss = root.loss + 2 + lostOf(root.near);
  let last: SolvedBalance | undefined;
  const at = (precision: number): Found[] => {
    last = root.solvedTo(precision);
    return valuesOf(problem, last).map((one) => ({ ...one, form: significant(digits) }));
  };
  const written = settleAll({ digits, loss, at });
  return {
    ...read(problem, written),
    iterations: last?.iterations ?? 0,
    residual: `1e${Math.ceil(Math.log10(root.near.scale)) - digits - 5}`,
  };
}

/** pH and ionic strength alone, of a root beside the one that is answered. */
export function stateNumbers(root: Root, digits: number): { pH: string; ionicStrength: string } {
  const loss = root.loss + 2 + lostOf(root.near);
  const [pH = '', ionic = ''] = settleAll({
    digits,
    loss,
    at: (precision) => {
      const { u, state } = root.solvedTo(precision);
      return [u.log(10), nth(state, 0)].map((value) => ({ value, form: significant(digits) }));
    },
  });
  return { pH, ionicStrength: ionic };
}
