import { spawnSync } from 'node:child_process';
import path from 'node:path';
import { fractionRows } from '../../server/chem';
import { measure } from './measure';

const digits = 34;
const system = { fullyProtonatedCharge: 0, pKa: ['2.148', '7.198', '12.35'] };
const points = { kind: 'grid', from: '0', step: '0.01', count: 1401 } as const;

interface Theirs {
  readonly way: string;
  readonly milliseconds: number;
  readonly atSeven: readonly string[];
}

/** What mpmath takes in a process of its own; undefined where Python or mpmath is missing. */
function theirs(rounds: number): Theirs | undefined {
  const file = path.join(__dirname, 'mpmath-curve.py');
  const { status, stdout } = spawnSync('python3', [file, String(rounds)], { encoding: 'utf8' });
  return status === 0 ? (JSON.parse(stdout) as Theirs) : undefined;
}

/** The triprotic curve’s fractions beside the fastest of a few ways with mpmath. */
export function besideMpmath(rounds: number) {
  const mpmath = theirs(rounds);
  if (!mpmath) {
    const title = 'triprotic curve beside mpmath: not compared, python3-mpmath is not installed';
    return { title, timings: [], ratios: [] };
  }
  const ours = fractionRows(system, points, digits)[700]?.map(Number);
  if (JSON.stringify(ours) !== JSON.stringify(mpmath.atSeven.map(Number))) {
    throw new Error('The engine and mpmath differ at pH 7.');
  }
  const timings = [
    { name: `mpmath, ${mpmath.way}`, milliseconds: mpmath.milliseconds },
    ...measure(
      [
        {
          name: 'engine, fractions',
          repeats: 10,
          run: () => fractionRows(system, points, digits),
        },
      ],
      rounds,
    ),
  ];
  const engine = timings[1]?.milliseconds ?? NaN;
  return {
    title: 'triprotic curve beside mpmath, 1,401 points, 34 digits',
    timings,
    ratios: [{ name: 'mpmath / engine', ratio: mpmath.milliseconds / engine }],
  };
}
