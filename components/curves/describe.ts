import { spokenFormula } from '../ui/formula-parts';
import { spokenNumber, numberParts } from '../ui/number';
import type { DrawnCurve } from './drawn-curve';
import type { Reading } from './follow-curve';
import type { FigureExtras } from './figure-extras';
import { capacityAt } from './capacity';
import type { Layer } from './curves-state';
import { totalInWords } from './total-in-words';
import { shownCapacity, shownCharge, shownFraction, shownPH } from './rounded';

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

/** The figure in words with what its layers show beside the fractions. */
export function describeFigure(
  drawn: DrawnCurve,
  reading: Reading,
  layers: readonly Layer[],
  { capacity, isoelectricPoint, beside }: FigureExtras,
): string {
  const parts = [describeCurve(drawn, reading)];
  if (layers.includes('capacity') && capacity) {
    const peaks = capacity.maxima
      .filter(({ pH }) => pH >= drawn.range[0] && pH <= drawn.range[1])
      .map(({ pH, value }) => `${said(shownCapacity(value))} at pH ${said(pH.toFixed(2))}`);
    const at = `Buffer capacity at ${totalInWords(capacity.total)} mmol/L`;
    parts.push(
      `${at} is ${said(shownCapacity(capacityAt(capacity, reading)))} mmol/L per pH` +
        (peaks.length === 0 ? ', without a maximum.' : `; its maxima: ${peaks.join(', ')}.`),
    );
  }
  if (layers.includes('isoelectric-point') && isoelectricPoint !== undefined) {
    parts.push(`Isoelectric point: pH ${said(shownPH(isoelectricPoint))}.`);
  }
  if (beside.length > 0) {
    parts.push(`Compared with: ${beside.map(({ name }) => said(name)).join('; ')}.`);
  }
  return parts.join(' ');
}
