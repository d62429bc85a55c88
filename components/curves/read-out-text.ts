import { capacityAt } from './capacity';
import { conditionsText } from './conditions-of';
import type { Layer } from './curves-state';
import type { DrawnCurve } from './drawn-curve';
import type { FigureExtras } from './figure-extras';
import type { Reading } from './follow-curve';
import { totalInWords } from './total-in-words';

/** The read-out with every digit, as lines of cells parted by tabs: a spreadsheet takes it. */
export function readOutText(
  drawn: DrawnCurve,
  reading: Reading,
  shown: readonly Layer[],
  { capacity, isoelectricPoint }: FigureExtras,
): string {
  const { formulas, curve } = drawn;
  const rows = [
    ['pH', '', reading.pH],
    ['conditions', '', conditionsText(drawn)],
    ['form', 'charge', 'fraction'],
    ...reading.fractions.map((fraction, index) => [
      formulas[index] ?? '',
      String(curve.charges[index]),
      fraction,
    ]),
    ['mean charge', '', reading.meanCharge],
  ];
  if (shown.includes('capacity') && capacity) {
    const value = capacityAt(capacity, reading).toPrecision(6);
    rows.push([`capacity at ${totalInWords(capacity.total)} mmol/L`, 'mmol/L per pH', value]);
  }
  if (shown.includes('isoelectric-point') && isoelectricPoint !== undefined) {
    rows.push(['isoelectric point', '', isoelectricPoint]);
  }
  return rows.map((row) => row.join('\t')).join('\n');
}
