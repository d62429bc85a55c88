import type { DrawnCurve } from './drawn-curve';
import type { Reading } from './follow-curve';

/** The read-out with every digit, as lines of cells parted by tabs: a spreadsheet takes it. */
export function readOutText({ formulas, curve }: DrawnCurve, reading: Reading): string {
  const rows = [
    ['pH', '', reading.pH],
    ['form', 'charge', 'fraction'],
    ...reading.fractions.map((fraction, index) => [
      formulas[index] ?? '',
      String(curve.charges[index]),
      fraction,
    ]),
    ['mean charge', '', reading.meanCharge],
  ];
  return rows.map((row) => row.join('\t')).join('\n');
}
