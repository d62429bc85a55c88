import type { Arithmetic } from '../decimals/arithmetic';

/** A function of I by way of √I, and what its derivative to I is, multiplied by I. */
export interface Screening<N> {
  readonly value: N;
  readonly slopeTimesI: N;
}

/**
 * How the part β of a second virial coefficient fades with x = α√I > 0 (Pitzer 1973):
 *
 *     g(x) = 2 (1 − (1 + x) e^−x)/x²,   I dg/dI = −2 (1 − (1 + x + x²/2) e^−x)/x²
 *
 * Towards x = 0 both lose digits to cancellation as x² does, and a molality that small multiplies
 * them: what they add to lg γ stays within a rounding unit.
 */
export function screening<N>(arithmetic: Arithmetic<N>, x: N): Screening<N> {
  const { of, plus, minus, times, over, exp } = arithmetic;
  const fading = exp(minus(of(0), x));
  const square = times(x, x);
  const scale = over(of(2), square);
  const linear = plus(of(1), x);
  return {
    value: times(scale, minus(of(1), times(linear, fading))),
    slopeTimesI: times(scale, minus(times(plus(linear, times(of('0.5'), square)), fading), of(1))),
  };
}

/**
 * J(x), x > 0, of the electrostatic mixing of unlike charges of one sign, and x dJ/dx, in the closed
 * form J = x/(4 + 4.581 x^−0.7237 exp(−0.0120 x^0.528)): K. S. Pitzer, J. Solution Chem. 4, 249
 * (1975), eq. 47, recalled. It approximates an integral; here it is the definition.
 */
export function mixingIntegral<N>(arithmetic: Arithmetic<N>, x: N): { J: N; xSlope: N } {
  const { of, plus, minus, times, over, ln, exp } = arithmetic;
  const lnX = ln(x);
  const bent = times(of('0.0120'), exp(times(of('0.528'), lnX)));
  const term = times(of('4.581'), exp(minus(times(of('-0.7237'), lnX), bent)));
  const denominator = plus(of(4), term);
  const J = over(x, denominator);
  const steepness = times(term, plus(of('0.7237'), times(of('0.528'), bent)));
  return { J, xSlope: times(J, plus(of(1), over(steepness, denominator))) };
}

/** ᴱθ of two ions of one sign and unlike charge, kg/mol, and its derivative to I. */
export interface ElectrostaticMixing<N> {
  readonly theta: N;
  readonly slope: N;
}

/**
 * ᴱθ and ᴱθ′ of ions of charges of one sign at I > 0 (Pitzer 1975), with x_ij = 6 z_i z_j A_φ √I:
 *
 *     ᴱθ_ij = z_i z_j/(4 I) (J(x_ij) − ½ J(x_ii) − ½ J(x_jj))
 *     ᴱθ′_ij = −ᴱθ_ij/I + z_i z_j/(8 I²) (x_ij J′(x_ij) − ½ x_ii J′(x_ii) − ½ x_jj J′(x_jj))
 */
export function electrostaticMixing<N>(
  arithmetic: Arithmetic<N>,
  Aphi: N,
  ionicStrength: N,
): (first: number, second: number) => ElectrostaticMixing<N> {
  const { of, minus, times, over, sqrt } = arithmetic;
  const unit = times(of(6), times(Aphi, sqrt(ionicStrength)));
  const half = of('0.5');
  const known = new Map<number, { J: N; xSlope: N }>();
  const integral = (product: number) => {
    const found = known.get(product) ?? mixingIntegral(arithmetic, times(of(product), unit));
    known.set(product, found);
    return found;
  };
  return (first, second) => {
    const mixed = integral(first * second);
    const ends = [integral(first ** 2), integral(second ** 2)];
    const excess = (part: 'J' | 'xSlope') =>
      ends.reduce((rest, end) => minus(rest, times(half, end[part])), mixed[part]);
    const overI = over(of(first * second), times(of(4), ionicStrength));
    const theta = times(overI, excess('J'));
    const bending = times(times(half, overI), excess('xSlope'));
    return { theta, slope: over(minus(bending, theta), ionicStrength) };
  };
}
