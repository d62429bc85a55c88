import { spokenFormula } from '../ui/formula-parts';
import { spokenNumber, numberParts } from '../ui/number';
import type { DrawnCurve } from './drawn-curve';
import type { Reading } from './follow-curve';
import { shownCharge, shownFraction } from './rounded';

/** A number as it should be said. */
const said = (text: string) => {
  const parts = numberParts(text);
  return parts ? spokenNumber(parts) : text;
};

const form = (drawn: DrawnCurve, index: number) => spokenFormula(drawn.formulas[index] ?? '');

/** The reading in one short sentence. */
export function describeReading(drawn: DrawnCurve, reading: Reading): string {
  const fraction = reading.fractions[reading.predominant] ?? '0';
  return (
    `pH ${said(reading.pH)}: ${form(drawn, reading.predominant)} predominates, ` +
    `fraction ${said(shownFraction(fraction))}, mean charge ${said(shownCharge(reading.meanCharge))}`
  );
}

/** The figure in words: what it shows, over which range, and what it says. */
export function describeCurve(drawn: DrawnCurve, reading: Reading): string {
  const { answer, range, formulas, stair, meetings } = drawn;
  const steps = [
    form(drawn, stair[0]?.index ?? 0),
    ...meetings.map(({ text, after }) => `from pH ${said(text)} ${form(drawn, after)}`),
  ];
  return (
    `Fractions of the ${formulas.length} forms of ${answer.name ?? 'the system'} ` +
    `over pH ${said(String(range[0]))} to ${range[1]}. ` +
    `Predominant: ${steps.join(', ')}. ${describeReading(drawn, reading)}.`
  );
}
