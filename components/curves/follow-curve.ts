import type { FractionsAnswer } from '../../shared/fractions';

/** A curve as it is drawn: the answer's decimals as numbers, forms by index. */
export interface Curve {
  readonly pH: readonly number[];
  /** fractions[j][i]: form j at pH[i]. */
  readonly fractions: readonly (readonly number[])[];
  readonly charges: readonly number[];
  readonly meanCharge: readonly number[];
}

/** What is present at one pH, in decimals as the API writes them. */
export interface Reading {
  readonly pH: string;
  readonly fractions: readonly string[];
  readonly neighbourRatios: readonly string[];
  readonly meanCharge: string;
  readonly predominant: number;
  /** True once the answer for this very pH is here, false while it is followed from the curve. */
  readonly exact: boolean;
}

export const curveOf = ({ points, species }: FractionsAnswer): Curve => ({
  pH: points.map((point) => Number(point.pH)),
  fractions: species.map(({ index }) => points.map((point) => Number(point.fractions[index]))),
  charges: species.map(({ charge }) => charge),
  meanCharge: points.map((point) => Number(point.meanCharge)),
});

const followedDigits = 6;

/**
 * The reading at a pH from the nearest point of the fetched curve, so that it follows the cursor at
 * once. Not an interpolation: between two pH values d apart the amount of form j relative to form 0
 * changes by exactly 10^(j·d), so the curve's own digits carry over.
 */
export function followCurve(answer: FractionsAnswer, pH: string): Reading | undefined {
  const { points, species } = answer;
  const target = Number(pH);
  const from = Number(points[0]?.pH);
  const step = Number(points[1]?.pH) - from || 1;
  const nearest =
    points[Math.min(points.length - 1, Math.max(0, Math.round((target - from) / step)))];
  if (!nearest) return undefined;
  const moved = target - Number(nearest.pH);
  const shift = (protonsLost: number) => protonsLost - nearest.predominant;
  const amounts = nearest.fractions.map((alpha, j) => Number(alpha) * 10 ** (shift(j) * moved));
  const sum = amounts.reduce((total, amount) => total + amount, 0);
  const fractions = amounts.map((amount) => amount / sum);
  const ratioShift = 10 ** moved;
  const meanCharge = species.reduce(
    (total, { charge }, j) => total + charge * (fractions[j] ?? 0),
    0,
  );
  return {
    pH,
    fractions: fractions.map((alpha) => alpha.toPrecision(followedDigits)),
    neighbourRatios: nearest.neighbourRatios.map((ratio) =>
      (Number(ratio) * ratioShift).toPrecision(followedDigits),
    ),
    meanCharge: meanCharge.toFixed(followedDigits),
    predominant: fractions.indexOf(Math.max(...fractions)),
    exact: false,
  };
}

/** The reading at the one pH that an answer was asked for. */
export function exactReading({ points }: FractionsAnswer): Reading | undefined {
  const point = points[0];
  return point && { ...point, exact: true };
}
