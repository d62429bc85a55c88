import type { Reading } from './follow-curve';

/** The two forms on either side of the cursor, and the amount of `over` per `under`. */
export interface NeighbourRatio {
  readonly over: number;
  readonly under: number;
  readonly ratio: string;
}

/**
 * The predominant form against its commoner neighbour, as amount of the less protonated over the
 * more protonated: what a buffer is made of at this pH.
 */
export function neighbourRatio({
  fractions,
  neighbourRatios,
  predominant,
}: Reading): NeighbourRatio | undefined {
  const share = (index: number) => Number(fractions[index] ?? -1);
  const neighbour =
    share(predominant + 1) > share(predominant - 1) ? predominant + 1 : predominant - 1;
  const under = Math.min(predominant, neighbour);
  const ratio = neighbourRatios[under];
  return ratio === undefined ? undefined : { over: under + 1, under, ratio };
}
