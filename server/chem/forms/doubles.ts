/**
 * A system in double precision, to find the neighbourhood of an answer. Terms are kept as natural
 * logarithms, so that no number of protons and no pH over- or underflows.
 */
export interface DoubleSystem {
  /** Sums S_j·ln 10 of the first j constants, j = 0…n. */
  readonly lnSums: readonly number[];
}

/** ln 10, in doubles. */
export const lnOfTen = Math.LN10;

export function doubleSystem(pKa: readonly number[]): DoubleSystem {
  const lnSums = [0];
  for (const constant of pKa) lnSums.push((lnSums.at(-1) ?? 0) + constant * lnOfTen);
  return { lnSums };
}

/** ln of the terms u^j·10^(−S_j) of all species. */
export const lnTerms = ({ lnSums }: DoubleSystem, lnU: number): number[] =>
  lnSums.map((sum, j) => j * lnU - sum);

/**
 * Digits that the zeros after the point of a pH near 0 take from its significant ones: its error is
 * absolute. At most 40.
 */
export const lostNearZero = (lnU: number): number =>
  Math.min(40, Math.max(0, Math.ceil(-Math.log10(Math.abs(lnU) / lnOfTen + 1e-40))));

/** What part of their sum each of some terms is, from their natural logarithms. */
export function sharesOfTerms(terms: readonly number[]): number[] {
  const most = Math.max(...terms);
  const weights = terms.map((term) => Math.exp(term - most));
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  return weights.map((weight) => weight / total);
}

/** Fractions of all species at ln u = pH·ln 10. */
export const doubleFractions = (system: DoubleSystem, lnU: number): number[] =>
  sharesOfTerms(lnTerms(system, lnU));

/** Moments Σ (j − about)^k α_j, k = 1, 2, 3, of the protons lost. */
export function moments(fractions: readonly number[], about: number): [number, number, number] {
  const sums: [number, number, number] = [0, 0, 0];
  fractions.forEach((fraction, j) => {
    const off = j - about;
    sums[0] += off * fraction;
    sums[1] += off * off * fraction;
    sums[2] += off * off * off * fraction;
  });
  return sums;
}

/**
 * The root of a function that falls with x, between two x at which its sign differs: bisection,
 * sped up by Newton steps that stay inside and at least halve the bracket in two. Ends with
 * neighbouring doubles at the latest.
 */
export function fallingRoot(
  at: (x: number) => { value: number; slope: number },
  from: number,
  to: number,
  start = (from + to) / 2,
): number {
  let low = from;
  let high = to;
  let x = start;
  for (let i = 0; i < 200; i++) {
    const { value, slope } = at(x);
    if (value === 0) return x;
    if (value > 0) low = x;
    else high = x;
    const newton = x - value / slope;
    const inside = newton > low && newton < high;
    // Every third step halves, so that a slope that misleads costs two steps at most.
    const next = inside && i % 3 !== 2 ? newton : (low + high) / 2;
    if (next === x || Math.abs(next - x) <= 2e-16 * Math.max(1, Math.abs(x))) return next;
    x = next;
  }
  return x;
}
