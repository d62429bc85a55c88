import { fractionPoints, fractionRows } from '../../server/chem';
import { measure } from './measure';
import { textbookOf } from './textbook';

const digits = 34;
const system = { fullyProtonatedCharge: 0, pKa: ['2.148', '7.198', '12.35'] };
const step = '0.01';
const count = 1401;
const points = { kind: 'grid', from: '0', step, count } as const;

/**
 * The engine's answer must be the textbook's before either is timed. At 34 digits the textbook's
 * last digits are wrong (its sums are rounded, its exponents magnify), so it is computed with 30
 * digits more and rounded; every 20th point is compared, with ratios and charges.
 */
function refuseDifferences() {
  const textbook = textbookOf(digits + 30, system.pKa);
  const rows = fractionRows(system, points, digits);
  const full = fractionPoints(system, points, digits);
  textbook.grid(step, count).forEach((pH, i) => {
    if (i % 20 !== 0) return;
    const fractions = textbook.literal(pH);
    const written = fractions.map((fraction) => fraction.toPrecision(digits));
    const expected = {
      pH: pH.toFixed(2),
      fractions: written,
      neighbourRatios: textbook.ratios(pH).map((ratio) => ratio.toPrecision(digits)),
      meanCharge: textbook
        .meanCharge(fractions, 0)
        .toFixed(digits)
        .replace(/^-(?=[0.]*$)/, ''),
    };
    const { predominant: _, ...got } = full[i] ?? { predominant: 0 };
    const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);
    if (!same(got, expected) || !same(rows[i], written)) {
      throw new Error(`The engine and the textbook differ at pH ${pH.toFixed(2)}.`);
    }
  });
}

/** Triprotic curve, pH 0…14 by 0.01, 34 digits: textbook code against the engine. */
export function triproticCurve(rounds: number) {
  refuseDifferences();
  const textbook = textbookOf(digits, system.pKa);
  const grid = textbook.grid(step, count);
  const everything = (pH: (typeof grid)[number]) => {
    const fractions = textbook.literal(pH);
    return [
      ...fractions,
      ...textbook.ratios(pH),
      textbook.meanCharge(fractions, system.fullyProtonatedCharge),
    ].map(String);
  };
  const textbookFractions = 'textbook, fractions';
  const textbookAll = 'textbook, fractions, ratios, charge';
  const sharedFractions = 'textbook with each power once a point, fractions';
  const ourFractions = 'engine, fractions';
  const ourAll = 'engine, fractions, ratios, charge';
  const timings = measure(
    [
      {
        name: textbookFractions,
        repeats: 1,
        run: () => grid.map((pH) => textbook.literal(pH).map(String)),
      },
      { name: textbookAll, repeats: 1, run: () => grid.map(everything) },
      {
        name: sharedFractions,
        repeats: 1,
        run: () => grid.map((pH) => textbook.shared(pH).map(String)),
      },
      { name: ourFractions, repeats: 10, run: () => fractionRows(system, points, digits) },
      { name: ourAll, repeats: 10, run: () => fractionPoints(system, points, digits) },
    ],
    rounds,
  );
  const time = (name: string) =>
    timings.find((timing) => timing.name === name)?.milliseconds ?? NaN;
  return {
    title: 'triprotic curve, 1,401 points, 34 digits',
    timings,
    ratios: [
      { name: 'fractions: textbook / engine', ratio: time(textbookFractions) / time(ourFractions) },
      { name: 'all: textbook / engine', ratio: time(textbookAll) / time(ourAll) },
      {
        name: 'fractions: each power once a point / engine',
        ratio: time(sharedFractions) / time(ourFractions),
      },
    ],
  };
}
