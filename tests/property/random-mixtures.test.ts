import fc from 'fast-check';
import { equilibrium } from '../../server/chem';
import { randomMixtures } from './random-mixture';

/** Repeats the run: the mixtures follow from it. */
const seed = 20_260_801;
const count = 10_000;

/**
 * Evaluations of the charge balance for the last digits of an answer. Two or three roots of Newton's
 * method are the rule; a number that is next to a tie takes eight times the digits, one step of the
 * activity coefficients for about every six of them, and some four evaluations a step.
 */
const mostIterations = 300;

describe('ten thousand mixtures as nobody would weigh them in', () => {
  const tally = new Map<string, number>();
  let most = 0;

  test('each has an answer of finite numbers in a bounded number of steps, or a reason why not', () => {
    for (const { balance, digits } of fc.sample(randomMixtures, { seed, numRuns: count })) {
      const found = equilibrium(balance);
      const answer = found.ok ? found.inDigits(digits) : found;
      const outcome = answer.ok ? 'answered' : answer.reason;
      const of = `${balance.activity.model}: ${outcome}`;
      tally.set(of, (tally.get(of) ?? 0) + 1);
      if (!answer.ok) {
        expect(['no-ionic-strength', 'no-convergence']).toContain(answer.reason);
        continue;
      }
      most = Math.max(most, answer.numbers.iterations);
      if (/NaN|Infinity|undefined|null/.test(JSON.stringify(answer))) {
        throw new Error(`Not a number: ${JSON.stringify({ balance, digits, answer })}`);
      }
      if (answer.numbers.iterations > mostIterations) {
        throw new Error(
          `${answer.numbers.iterations} steps: ${JSON.stringify({ balance, digits })}`,
        );
      }
    }
    const rows = [...tally].toSorted(([a], [b]) => a.localeCompare(b));
    process.stdout.write(
      `${count} mixtures, seed ${seed}; at most ${most} evaluations\n` +
        rows.map(([of, times]) => `  ${of} ${times}\n`).join(''),
    );
    // Only the limiting law, asked far beyond its range, has compositions without an answer.
    for (const [of] of rows) expect(of).toMatch(/: answered$|^debye-huckel: no-ionic-strength$/);
  });
});
