import { type Coefficients, coefficientsOf } from '../activity/coefficients';
import { doubles } from '../decimals/arithmetic';
import { nth } from '../decimals/nth';
import { fallingRoot, lnOfTen, lnTerms, sharesOfTerms } from '../forms/doubles';
import { type Acid, type Balance, ionsOf, leftoverCharge } from './balance';

/** Beyond these pH no double tells [H⁺] or [OH⁻] from nothing or everything. */
const farthest = 290 * lnOfTen;

interface Evaluated {
  /** Charge over, mol/L: falls with pH. */
  readonly value: number;
  /** d value/d ln u, negative. */
  readonly slope: number;
  /** Sum of the absolute parts of `value`. */
  readonly scale: number;
}

/** A solved balance in doubles. */
export interface DoubleSolution extends Evaluated {
  /** ln of u = 1/a(H⁺). */
  readonly lnU: number;
  readonly molalities: readonly number[];
}

/** Constants ln K′ summed up, for given lg γ of the ions of this acid and of H⁺. */
function lnSumsOf(acid: Acid, lgGamma: readonly number[], lgGammaH: number): number[] {
  const sums = [0];
  acid.pKa.forEach((constant, i) => {
    const kind = acid.kinds[i];
    const shift =
      kind === 'thermodynamic'
        ? nth(lgGamma, i + 1) - nth(lgGamma, i)
        : kind === 'concentration'
          ? -lgGammaH
          : 0;
    sums.push(nth(sums, i) + (Number(constant) + shift) * lnOfTen);
  });
  return sums;
}

/** Shares of an acid’s species: of its total, or against the one that a gas holds. */
function sharesOf({ held, reference }: Acid, lnSums: readonly number[], lnU: number): number[] {
  const terms = lnTerms({ lnSums }, lnU);
  if (held) return terms.map((term) => Math.exp(term - nth(terms, reference)));
  return sharesOfTerms(terms);
}

/** A charge balance in double precision: where the digits of an answer are to be looked for. */
export class DoubleBalance {
  readonly coefficients: Coefficients;
  private readonly leftover: number;
  private readonly amounts: readonly number[];
  private readonly inert: readonly number[];
  private readonly lnKw: number | undefined;

  constructor(private readonly balance: Balance) {
    this.coefficients = coefficientsOf(ionsOf(balance), balance.activity);
    this.leftover = Number(leftoverCharge(balance));
    this.amounts = balance.acids.map(({ amount }) => Number(amount));
    this.inert = balance.inert.map(({ concentration }) => Number(concentration));
    this.lnKw = balance.pKw === undefined ? undefined : -Number(balance.pKw) * lnOfTen;
  }

  /** lg γ of every ion for a state. */
  private lgGamma(state: readonly number[]): number[] {
    const ofClass = this.coefficients.lgGamma(doubles, state);
    return this.coefficients.classOf.map((one) => nth(ofClass, one));
  }

  /** The root at one state of the activity coefficients. */
  solve(state: readonly number[], start?: number): DoubleSolution {
    const lgGamma = this.lgGamma(state);
    const sums = this.lnSums(lgGamma);
    const at = (lnU: number) => this.evaluate(lnU, sums, lgGamma);
    const lnU = bracketed(at, start);
    return { ...at(lnU), lnU, molalities: this.molalities(lnU, sums, lgGamma) };
  }

  /** What the composition at a state makes of the state. */
  next(state: readonly number[], start?: number): { state: number[]; solution: DoubleSolution } {
    const solution = this.solve(state, start);
    return { state: this.coefficients.stateOf(doubles, solution.molalities), solution };
  }

  private lnSums(lgGamma: readonly number[]): number[][] {
    let from = 2;
    return this.balance.acids.map((acid) => {
      const own = lgGamma.slice(from, from + acid.species.length);
      from += acid.species.length;
      return lnSumsOf(acid, own, nth(lgGamma, 0));
    });
  }

  /** [H⁺] and [OH⁻]. */
  private water(lnU: number, lgGamma: readonly number[]): [number, number] {
    if (this.lnKw === undefined) return [0, 0];
    return [
      Math.exp(-lnU - nth(lgGamma, 0) * lnOfTen),
      Math.exp(lnU + this.lnKw - nth(lgGamma, 1) * lnOfTen),
    ];
  }

  private evaluate(lnU: number, sums: number[][], lgGamma: readonly number[]): Evaluated {
    const [hydrogen, hydroxide] = this.water(lnU, lgGamma);
    let value = this.leftover + hydrogen - hydroxide;
    let slope = -hydrogen - hydroxide;
    let scale = Math.abs(this.leftover) + hydrogen + hydroxide;
    this.balance.acids.forEach((acid, k) => {
      const amount = nth(this.amounts, k);
      const shares = sharesOf(acid, nth(sums, k), lnU);
      let first = 0;
      let absolute = 0;
      shares.forEach((share, j) => {
        first += (acid.reference - j) * share;
        absolute += Math.abs(acid.reference - j) * share;
      });
      value += amount * first;
      scale += amount * absolute;
      // About the mean, where nothing cancels; a gas holds its species apart from the total.
      const about = acid.held ? 0 : first;
      slope -=
        amount * shares.reduce((sum, x, j) => sum + (acid.reference - j - about) ** 2 * x, 0);
    });
    return { value, slope, scale };
  }

  private molalities(lnU: number, sums: number[][], lgGamma: readonly number[]): number[] {
    return [
      ...this.water(lnU, lgGamma),
      ...this.balance.acids.flatMap((acid, k) =>
        sharesOf(acid, nth(sums, k), lnU).map((share) => nth(this.amounts, k) * share),
      ),
      ...this.inert,
    ];
  }
}

/** The root of the balance: the bracket grows around the start until the sign differs. */
function bracketed(at: (lnU: number) => Evaluated, start = 7 * lnOfTen): number {
  const here = at(start).value;
  if (here === 0) return start;
  const direction = here > 0 ? 1 : -1;
  let near = start;
  for (let step = 0.5; ; step *= 2) {
    const far = Math.max(-farthest, Math.min(farthest, start + direction * step));
    if (Math.abs(far) >= farthest || at(far).value * direction <= 0) {
      return fallingRoot(at, Math.min(near, far), Math.max(near, far));
    }
    near = far;
  }
}
