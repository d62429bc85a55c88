/** One way of doing a job, as timed. */
export interface Contender {
  readonly name: string;
  readonly run: () => unknown;
  /** Runs a round; more for the fast, so that each round lasts long enough to time. */
  readonly repeats: number;
}

/** Median processor time of one run, in milliseconds. */
export interface Timing {
  readonly name: string;
  readonly milliseconds: number;
}

const median = (values: readonly number[]): number => {
  const sorted = values.toSorted((a, b) => a - b);
  const middle = sorted.length >> 1;
  const upper = sorted[middle] ?? NaN;
  return sorted.length % 2 === 1 ? upper : (upper + (sorted[middle - 1] ?? NaN)) / 2;
};

/** Processor time of this process, all its threads: other programs do not count. */
const timeOf = ({ run, repeats }: Contender) => {
  const start = process.cpuUsage();
  for (let i = 0; i < repeats; i++) run();
  const { user, system } = process.cpuUsage(start);
  return (user + system) / 1000 / repeats;
};

/**
 * Times contenders in interleaved rounds after one round of warming up, so that whatever else the
 * machine does meanwhile falls on all of them alike; the median of the rounds counts.
 */
export function measure(contenders: readonly Contender[], rounds: number): Timing[] {
  contenders.forEach(timeOf);
  const times = contenders.map((): number[] => []);
  for (let round = 0; round < rounds; round++) {
    contenders.forEach((contender, i) => times[i]?.push(timeOf(contender)));
  }
  return contenders.map(({ name }, i) => ({ name, milliseconds: median(times[i] ?? []) }));
}
